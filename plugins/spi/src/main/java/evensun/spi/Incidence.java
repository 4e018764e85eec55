package evensun.spi;

/**
 * A direction and polarisation of light.
 *
 * @param angleDeg angle to the normal in degrees, in [0, 90), inside the medium of that side
 * @param polarisation polarisation
 * @param side from which side it comes
 */
public record Incidence(double angleDeg, Polarisation polarisation, Side side) {

  public Incidence {
    if (!(angleDeg >= 0 && angleDeg < 90)) {
      throw new IllegalArgumentException("angleDeg must be in [0, 90) but was " + angleDeg);
    }
  }

  /** Unpolarised light from the front along the normal. */
  public static Incidence normal() {
    return new Incidence(0, Polarisation.UNPOLARISED, Side.FRONT);
  }
}
