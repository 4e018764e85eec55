package evensun.scenario;

/** Where the radiative saturation currents come from. */
public enum Saturation {
  /** Reciprocity where its conditions hold for every subcell, else the step edge. */
  AUTOMATIC,
  /** A step of absorptance one at each bandgap. */
  STEP_EDGE,
  /** Each subcell's own absorptance; falls back to the step edge, and says why. */
  RECIPROCITY
}
