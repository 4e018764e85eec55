package evensun.spi;

/** Polarisation of the incident light; unpolarised is the mean of S and P. */
public enum Polarisation {
  /** Electric field across the plane of incidence. */
  S,
  /** Electric field in the plane of incidence. */
  P,
  /** The mean of both. */
  UNPOLARISED
}
