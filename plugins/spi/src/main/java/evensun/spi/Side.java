package evensun.spi;

/** From which side the light comes. */
public enum Side {
  /** From the incident medium onto layer 0. */
  FRONT,
  /** From the exit medium onto the last layer. */
  REAR
}
