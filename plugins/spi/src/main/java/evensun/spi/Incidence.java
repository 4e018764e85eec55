package evensun.spi;

/**
 * A direction and polarisation of light.
 *
 * @param angleDeg angle to the normal in degrees, in [0, 90), inside the medium of that side; 0 for
 *     diffuse light
 * @param polarisation polarisation
 * @param side from which side it comes
 * @param diffuse whether light comes from every direction of the half space alike (Lambertian:
 *     intensity follows cos θ); only for solvers that say so in their {@link Traits}
 */
public record Incidence(double angleDeg, Polarisation polarisation, Side side, boolean diffuse) {

  public Incidence {
    if (!(angleDeg >= 0 && angleDeg < 90)) {
      throw new IllegalArgumentException("angleDeg must be in [0, 90) but was " + angleDeg);
    }
    if (diffuse && angleDeg != 0) {
      throw new IllegalArgumentException(
          "angleDeg must be 0 for diffuse light but was " + angleDeg);
    }
  }

  /** Light from one direction. */
  public Incidence(double angleDeg, Polarisation polarisation, Side side) {
    this(angleDeg, polarisation, side, false);
  }

  /** Unpolarised light from the front along the normal. */
  public static Incidence normal() {
    return new Incidence(0, Polarisation.UNPOLARISED, Side.FRONT);
  }
}
