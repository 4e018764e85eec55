package evensun.scenario;

import evensun.spi.MixingRule;
import evensun.spi.Profile;
import java.util.List;
import java.util.OptionalDouble;

/** What is not flat, uniform and pure about a layer as drawn. */
public sealed interface FeatureSpec
    permits FeatureSpec.MixtureSpec, FeatureSpec.GradingSpec, FaceSpec {

  /** Where it stands. */
  Place place();

  /** What is mixed in here, in the order of the file; empty when nothing is. */
  List<ComponentSpec> components();

  /** This feature with one material replaced by another. */
  FeatureSpec withMaterial(String name, String other);

  /**
   * A material in a mixture, or at one end of a grading.
   *
   * @param name unique in the layer; {@code layer/name} elsewhere
   * @param material material name
   * @param gap how the bandgap of a tunable material is chosen
   * @param fraction volume fraction as drawn, in [0, 1]; 1 at an end of a grading
   * @param place where it stands
   */
  record ComponentSpec(String name, String material, GapChoice gap, double fraction, Place place) {

    ComponentSpec withMaterial(String old, String other) {
      return material.equals(old) ? new ComponentSpec(name, other, gap, fraction, place) : this;
    }
  }

  /**
   * A fine mixture, the same at every depth.
   *
   * @param rule mixing rule
   * @param components at least two, fractions of sum 1
   * @param host name of the host where the rule has one, else empty
   * @param depolarisationFactor in (0, 1), 1/3 for spheres
   * @param featureSizeNm size of grains or pores in nm, where known
   * @param porous whether it was written as a porosity: components {@code solid} and {@code pores}
   * @param place where it stands
   */
  record MixtureSpec(
      MixingRule rule,
      List<ComponentSpec> components,
      String host,
      double depolarisationFactor,
      OptionalDouble featureSizeNm,
      boolean porous,
      Place place)
      implements FeatureSpec {

    public MixtureSpec {
      components = List.copyOf(components);
    }

    @Override
    public MixtureSpec withMaterial(String name, String other) {
      return new MixtureSpec(
          rule,
          components.stream().map(c -> c.withMaterial(name, other)).toList(),
          host,
          depolarisationFactor,
          featureSizeNm,
          porous,
          place);
    }
  }

  /**
   * A change through the thickness, from one material at the upper face to another at the lower.
   *
   * @param from at the upper face, component {@code from}
   * @param to at the lower face, component {@code to}
   * @param profile share of {@code to} against relative depth
   * @param rule how the two mix at one depth
   * @param tolerance largest change of a spectrum that finer slices may still make
   * @param featureSizeNm lateral size of what is mixed in nm, where known
   * @param place where it stands
   */
  record GradingSpec(
      ComponentSpec from,
      ComponentSpec to,
      Profile profile,
      MixingRule rule,
      double tolerance,
      OptionalDouble featureSizeNm,
      Place place)
      implements FeatureSpec {

    @Override
    public List<ComponentSpec> components() {
      return List.of(from, to);
    }

    @Override
    public GradingSpec withMaterial(String name, String other) {
      return new GradingSpec(
          from.withMaterial(name, other),
          to.withMaterial(name, other),
          profile,
          rule,
          tolerance,
          featureSizeNm,
          place);
    }
  }
}
