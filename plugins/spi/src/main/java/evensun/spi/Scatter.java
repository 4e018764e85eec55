package evensun.spi;

/**
 * A boundary between two thick media that scatters what it reflects and transmits. Where it stands,
 * and which boundary it means, is as for {@link Texture}; how much is reflected, transmitted and
 * absorbed is that of the flat boundary at the angle of arrival.
 *
 * @param specularFraction share that keeps the direction of a flat boundary, in [0, 1]
 * @param cosinePower m of the scattered share: radiance per projected solid angle follows
 *     cos^(m−1)θ, so that intensity follows cos^m θ; 1 is Lambertian; in [0.1, 1000]
 * @param face which face of the layer is meant
 */
public record Scatter(double specularFraction, double cosinePower, Side face) implements Feature {

  /** The kind of this feature. */
  public static final String KIND = "scatter";

  /**
   * Checks the numbers.
   *
   * @throws IllegalArgumentException naming the component, the rule and the value
   */
  public Scatter {
    require(
        specularFraction >= 0 && specularFraction <= 1,
        "specularFraction must be in [0, 1] but was " + specularFraction);
    require(
        cosinePower >= 0.1 && cosinePower <= 1000,
        "cosinePower must be in [0.1, 1000] but was " + cosinePower);
  }

  @Override
  public String kind() {
    return KIND;
  }

  private static void require(boolean condition, String message) {
    if (!condition) {
      throw new IllegalArgumentException(message);
    }
  }
}
