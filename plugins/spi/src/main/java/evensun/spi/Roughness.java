package evensun.spi;

/**
 * A rough face of a layer, by height statistics.
 *
 * <p>Where the correlation length is far below the wavelength in the media, a rough face acts as a
 * thin mixed layer; where it is far above, it scatters. A solver that claims this kind models one
 * of the two, never both; what a layer adds to the current of its neighbours is answered in their
 * channels, so roughness adds no channel. A solver that turns fine roughness into layers hands the
 * coarse kind on, unchanged, to a solver below it that claims the kind.
 *
 * @param rmsNm root mean square of the height about the mean plane, in nm, greater than 0
 * @param correlationLengthNm lateral distance over which heights are alike, in nm, greater than 0
 * @param face {@link Side#FRONT} for the upper face; {@link Side#REAR} for the lower face, which
 *     only the last layer may carry
 */
public record Roughness(double rmsNm, double correlationLengthNm, Side face) implements Feature {

  /** The kind of this feature. */
  public static final String KIND = "roughness";

  /**
   * Checks the numbers.
   *
   * @throws IllegalArgumentException naming the component, the rule and the value
   */
  public Roughness {
    require(rmsNm > 0 && rmsNm <= 1e4, "rmsNm must be in (0, 1e4] nm but was " + rmsNm);
    require(
        correlationLengthNm > 0 && correlationLengthNm <= 1e7,
        "correlationLengthNm must be in (0, 1e7] nm but was " + correlationLengthNm);
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
