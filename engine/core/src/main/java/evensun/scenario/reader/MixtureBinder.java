package evensun.scenario.reader;

import evensun.scenario.FeatureSpec.ComponentSpec;
import evensun.scenario.FeatureSpec.MixtureSpec;
import evensun.scenario.GapChoice;
import evensun.scenario.tree.Fields;
import evensun.scenario.tree.Interval;
import evensun.scenario.tree.NameRule;
import evensun.scenario.tree.Nearest;
import evensun.scenario.tree.Node.Entry;
import evensun.scenario.tree.Node.Mapping;
import evensun.scenario.tree.Shown;
import evensun.spi.MixingRule;
import evensun.spi.Mixture;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/** Binds {@code mixture}: components with fractions, or a material with pores. */
final class MixtureBinder {

  static final Interval FRACTION = Interval.closed(0, 1, "");

  /** Word for the material of the medium that the light comes from. */
  static final String AMBIENT = "ambient";

  private static final Interval FACTOR = new Interval(0, 1, true, true, "");
  private static final double SUM_TOLERANCE = 1e-6;

  private final Fields layer;
  private final Fields fields;

  private final String material;
  private final GapChoice gap;

  private MixtureBinder(Fields layer, Fields fields, String material, GapChoice gap) {
    this.layer = layer;
    this.fields = fields;
    this.material = material;
    this.gap = gap;
  }

  /** Whether the mixture of a layer lists components, so that the layer has no material. */
  static boolean namesMaterials(Fields layer) {
    return layer.has("mixture")
        && layer
            .node("mixture")
            .filter(Mapping.class::isInstance)
            .map(n -> ((Mapping) n).entries().stream().noneMatch(e -> e.key().equals("porosity")))
            .orElse(true);
  }

  static Optional<MixtureSpec> bind(Fields layer, String material, GapChoice gap) {
    return layer
        .section("mixture")
        .flatMap(fields -> new MixtureBinder(layer, fields, material, gap).mixture());
  }

  private Optional<MixtureSpec> mixture() {
    MixingRule rule = fields.choice("rule", FeatureBinder.rules()).orElse(MixingRule.BRUGGEMAN);
    boolean porous = fields.has("porosity");
    int before = fields.faults().count();
    List<ComponentSpec> components = porous ? porous() : components();
    String host = host(rule, components);
    double factor = depolarisationFactor(rule);
    OptionalDouble size = fields.number("featureSizeNm", FeatureBinder.FEATURE_SIZE);
    fields.finish();
    return fields.faults().count() > before
        ? Optional.empty()
        : Optional.of(
            new MixtureSpec(rule, components, host, factor, size, porous, fields.place()));
  }

  private List<ComponentSpec> porous() {
    double porosity = fields.requiredNumber("porosity", FRACTION);
    FeatureBinder.refuse(fields, "components", "and porosity exclude each other");
    String pores =
        fields.node("pores").isEmpty()
            ? "air"
            : fields.requiredName("pores", "a material", NameRule.MATERIAL).orElse("");
    return List.of(
        new ComponentSpec("solid", material, gap, 1 - porosity, layer.place("material")),
        new ComponentSpec("pores", pores, GapChoice.NONE, porosity, fields.place("porosity")));
  }

  private List<ComponentSpec> components() {
    FeatureBinder.refuse(fields, "pores", "goes with porosity");
    for (String key : FeatureBinder.MATERIAL_KEYS) {
      FeatureBinder.refuse(layer, key, "goes into the components of the mixture");
    }
    fields.require("components", "at least two, such as {absorber: {material: …, fraction: 0.6}}");
    Optional<Mapping> mapping = fields.mapping("components");
    if (mapping.isEmpty()) {
      return List.of();
    }
    Fields list = new Fields(fields.who() + ".components", mapping.get(), fields.faults());
    if (list.keys().size() < 2) {
      list.fault(list.place(), "must name at least two components");
    }
    return withRest(list, read(list, mapping.get()));
  }

  private List<ComponentSpec> read(Fields list, Mapping mapping) {
    List<ComponentSpec> components = new ArrayList<>();
    for (String name : list.keys()) {
      Entry entry =
          mapping.entries().stream().filter(e -> e.key().equals(name)).findFirst().orElseThrow();
      if (!NameRule.ELEMENT.pattern().matcher(name).matches()) {
        list.fault(
            entry.keyPlace(),
            "the name of a component must be "
                + NameRule.ELEMENT.allowed()
                + " but was "
                + Shown.quoted(name));
      }
      component(list, name).ifPresent(components::add);
    }
    return components;
  }

  private Optional<ComponentSpec> component(Fields list, String name) {
    return list.mapping(name).map(mapping -> component(list, name, mapping));
  }

  private ComponentSpec component(Fields list, String name, Mapping mapping) {
    Fields own =
        new Fields(layer.who() + ": component " + Shown.quoted(name), mapping, list.faults());
    ComponentSpec component =
        new ComponentSpec(
            name,
            own.requiredName("material", "the name of a material", NameRule.MATERIAL).orElse(""),
            GapBinder.bind(own),
            own.number("fraction", FRACTION).orElse(REST),
            own.has("fraction") ? own.place("fraction") : own.place());
    own.finish();
    return component;
  }

  /** Stands for a fraction that is not written. */
  private static final double REST = -1;

  private List<ComponentSpec> withRest(Fields list, List<ComponentSpec> components) {
    long unwritten = components.stream().filter(c -> c.fraction() == REST).count();
    double sum = components.stream().mapToDouble(c -> Math.max(0, c.fraction())).sum();
    if (unwritten > 1) {
      list.fault(
          list.place(),
          "only one component may leave its fraction out, as the one that takes the rest, but "
              + unwritten
              + " do");
    } else if (unwritten == 1 ? sum > 1 : Math.abs(sum - 1) > SUM_TOLERANCE) {
      list.fault(list.place(), "the fractions must sum to 1 but sum to " + tidy(sum));
    }
    return components.stream()
        .map(c -> c.fraction() == REST ? withFraction(c, Math.max(0, 1 - sum)) : c)
        .toList();
  }

  private static String tidy(double sum) {
    return Shown.number(Math.rint(sum * 1e9) / 1e9);
  }

  private static ComponentSpec withFraction(ComponentSpec c, double fraction) {
    return new ComponentSpec(c.name(), c.material(), c.gap(), fraction, c.place());
  }

  private String host(MixingRule rule, List<ComponentSpec> components) {
    if (rule != MixingRule.MAXWELL_GARNETT) {
      FeatureBinder.refuse(fields, "host", "goes with rule: maxwell-garnett");
      return "";
    }
    List<String> names = components.stream().map(ComponentSpec::name).toList();
    fields.require("host", "the component that the others are embedded in");
    String host = fields.text("host").orElse("");
    if (!host.isEmpty() && !names.isEmpty() && !names.contains(host)) {
      fields.fault(
          fields.place("host"),
          "host names "
              + Shown.quoted(host)
              + ", but there is no such component"
              + Nearest.hint(host, names));
    }
    return host;
  }

  private double depolarisationFactor(MixingRule rule) {
    if (rule != MixingRule.BRUGGEMAN) {
      FeatureBinder.refuse(fields, "depolarisationFactor", "goes with rule: bruggeman");
      return Mixture.SPHERE;
    }
    return fields.number("depolarisationFactor", FACTOR).orElse(Mixture.SPHERE);
  }
}
