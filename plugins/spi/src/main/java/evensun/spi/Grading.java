package evensun.spi;

import java.util.OptionalDouble;

/**
 * A layer that changes from one material at its upper face to another at its lower face.
 *
 * <p>The layer's own {@link Design#material} is ignored. Absorptance is answered by end: a solver
 * that takes gradings lists {@code new Channel(l, upper.name())} and {@code new Channel(l,
 * lower.name())} for layer {@code l}, in this order, and no channel {@code Channel.of(l)}; the
 * absorptance of the whole layer is their sum.
 *
 * @param upper what it is at a share of 0
 * @param lower what it is at a share of 1
 * @param profile share of {@code lower} through the thickness
 * @param rule how the two mix at one depth: {@link MixingRule#REFRACTIVE_INDEX} for a profile of
 *     the index, another for one of the composition; {@link MixingRule#MAXWELL_GARNETT} takes
 *     {@code upper} as host
 * @param tolerance largest change of R and of any absorptance, at any wavelength, that finer slices
 *     may still make, in (0, 0.1]
 * @param featureSizeNm lateral size of what is mixed, the pitch of a moth-eye, in nm, greater than
 *     0, or empty when unknown or for an alloy
 */
public record Grading(
    End upper,
    End lower,
    Profile profile,
    MixingRule rule,
    double tolerance,
    OptionalDouble featureSizeNm)
    implements Feature {

  /** The kind of this feature. */
  public static final String KIND = "grading";

  /** Tolerance when a scenario sets none. */
  public static final double DEFAULT_TOLERANCE = 1e-4;

  /**
   * Checks the parts.
   *
   * @throws IllegalArgumentException naming the component, the rule and the value
   */
  public Grading {
    require(!upper.name().equals(lower.name()), "both ends are named " + upper.name());
    require(
        tolerance > 0 && tolerance <= 0.1, "tolerance must be in (0, 0.1] but was " + tolerance);
    require(
        featureSizeNm.isEmpty() || featureSizeNm.getAsDouble() > 0,
        "featureSizeNm must be greater than 0 but was " + featureSizeNm);
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

  /**
   * One end of a grading.
   *
   * @param name unique in the layer; {@code layer/name} in scenarios and results
   * @param material row of {@link Design#n} and {@link Design#k}
   */
  public record End(String name, int material) {

    public End {
      require(!name.isEmpty(), "an end of a grading must have a name");
      require(material >= 0, "end " + name + ": material must be at least 0");
    }
  }
}
