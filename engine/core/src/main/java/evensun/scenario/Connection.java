package evensun.scenario;

/** How the subcells are connected. */
public enum Connection {
  /** One current through all subcells. */
  SERIES,
  /** Each subcell at its own maximum-power point. */
  INDEPENDENT,
  /** One voltage across all subcells. */
  PARALLEL
}
