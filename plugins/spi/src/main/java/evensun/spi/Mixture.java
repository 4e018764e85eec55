package evensun.spi;

import java.util.HashSet;
import java.util.List;
import java.util.OptionalDouble;
import java.util.Set;

/**
 * A layer that is a fine mixture of several materials: a filled scaffold, a nanocomposite, a porous
 * film (one component is then what fills the pores).
 *
 * <p>The layer's own {@link Design#material} is ignored; every component names a row of {@link
 * Design#n} and {@link Design#k}.
 *
 * <p>Absorptance is answered by component: a solver that takes mixtures lists {@code new Channel(l,
 * component.name())} for every component of layer {@code l}, in the order of {@link #components},
 * and no channel {@code Channel.of(l)}; the absorptance of the whole layer is their sum.
 *
 * <p>Fractions: a component whose fraction is moved by a search has it from its knob. The
 * components with a fixed fraction share what is left in proportion to their fixed fractions, so
 * the sum is one in every design; where the moved fractions alone exceed one, the design cannot be
 * evaluated.
 *
 * @param rule the mixing rule
 * @param components at least two, with different names
 * @param host index in {@code components} of the host of {@link MixingRule#MAXWELL_GARNETT}, −1 for
 *     every other rule
 * @param depolarisationFactor along the field, in (0, 1): 1/3 for spheres; only {@link
 *     MixingRule#BRUGGEMAN} takes another value
 * @param featureSizeNm size of grains or pores in nm, greater than 0, or empty when unknown
 */
public record Mixture(
    MixingRule rule,
    List<Component> components,
    int host,
    double depolarisationFactor,
    OptionalDouble featureSizeNm)
    implements Feature {

  /** The kind of this feature. */
  public static final String KIND = "mixture";

  /** The depolarisation factor of a sphere. */
  public static final double SPHERE = 1.0 / 3;

  /** How far fixed fractions may miss a sum of one. */
  private static final double SUM_TOLERANCE = 1e-9;

  /**
   * Checks the parts.
   *
   * @throws IllegalArgumentException naming the component, the rule and the value
   */
  public Mixture {
    components = List.copyOf(components);
    require(components.size() >= 2, "a mixture must have at least two components");
    requireDifferentNames(components);
    requireFractions(components);
    boolean hosted = rule == MixingRule.MAXWELL_GARNETT;
    require(
        hosted ? host >= 0 && host < components.size() : host == -1,
        "host must be "
            + (hosted ? "a component" : "-1 for rule " + rule.id())
            + " but was "
            + host);
    require(
        depolarisationFactor > 0 && depolarisationFactor < 1,
        "depolarisationFactor must be in (0, 1) but was " + depolarisationFactor);
    require(
        rule == MixingRule.BRUGGEMAN || depolarisationFactor == SPHERE,
        "depolarisationFactor must be 1/3 for rule " + rule.id());
    require(
        featureSizeNm.isEmpty() || featureSizeNm.getAsDouble() > 0,
        "featureSizeNm must be greater than 0 but was " + featureSizeNm);
  }

  /** A Bruggeman mixture of spheres. */
  public static Mixture bruggeman(List<Component> components) {
    return new Mixture(MixingRule.BRUGGEMAN, components, -1, SPHERE, OptionalDouble.empty());
  }

  @Override
  public String kind() {
    return KIND;
  }

  @Override
  public List<Knob> knobs() {
    return components.stream().flatMap(c -> c.fraction().knob().stream()).toList();
  }

  /**
   * The volume fractions of a design; allocates nothing.
   *
   * @param design the candidate
   * @param into [component] out: fractions of sum 1
   * @throws EvaluationFailed where a moved fraction leaves [0, 1], or all together exceed 1
   */
  public void fractions(Design design, double[] into) {
    double moved = 0;
    double fixed = 0;
    for (int c = 0; c < into.length; c++) {
      Parameter fraction = components.get(c).fraction();
      into[c] = fraction.in(design);
      if (!(into[c] >= 0 && into[c] <= 1)) {
        throw new EvaluationFailed(
            "the fraction of "
                + components.get(c).name()
                + " must be in [0, 1] but was "
                + into[c]);
      }
      moved += fraction.knob().isPresent() ? into[c] : 0;
      fixed += fraction.knob().isPresent() ? 0 : into[c];
    }
    if (moved > 1 + SUM_TOLERANCE) {
      throw new EvaluationFailed(
          "the fractions that vary must not exceed 1 together but sum to " + moved);
    }
    double scale = Math.max(0, 1 - moved) / fixed;
    for (int c = 0; c < into.length; c++) {
      into[c] *= components.get(c).fraction().knob().isPresent() ? 1 : scale;
    }
  }

  private static void requireDifferentNames(List<Component> components) {
    Set<String> names = new HashSet<>();
    for (Component component : components) {
      require(names.add(component.name()), "two components are named " + component.name());
    }
  }

  private static void requireFractions(List<Component> components) {
    double sum = 0;
    boolean moved = false;
    double fixed = 0;
    for (Component component : components) {
      double fraction = component.fraction().value();
      sum += fraction;
      if (component.fraction().knob().isPresent()) {
        moved = true;
      } else {
        fixed += fraction;
      }
    }
    require(
        Math.abs(sum - 1) <= SUM_TOLERANCE,
        "the fractions as drawn must sum to 1 but sum to " + sum);
    require(
        !moved || fixed > 0, "one component at least must have a fixed fraction greater than 0");
  }

  private static void require(boolean condition, String message) {
    if (!condition) {
      throw new IllegalArgumentException(message);
    }
  }

  /**
   * One component.
   *
   * @param name unique in the mixture; {@code layer/name} in scenarios and results
   * @param material row of {@link Design#n} and {@link Design#k}
   * @param fraction volume fraction in [0, 1]
   */
  public record Component(String name, int material, Parameter fraction) {

    public Component {
      require(!name.isEmpty(), "a component must have a name");
      require(material >= 0, "component " + name + ": material must be at least 0");
      require(
          fraction.value() >= 0 && fraction.value() <= 1,
          "component " + name + ": fraction must be in [0, 1] but was " + fraction.value());
    }

    /** A component whose fraction no search moves. */
    public static Component fixed(String name, int material, double fraction) {
      return new Component(name, material, Parameter.fixed(fraction));
    }
  }
}
