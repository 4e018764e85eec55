package evensun.scenario.reader;

import evensun.scenario.FeatureSpec.ComponentSpec;
import evensun.scenario.FeatureSpec.GradingSpec;
import evensun.scenario.GapChoice;
import evensun.scenario.tree.Fields;
import evensun.scenario.tree.Interval;
import evensun.scenario.tree.NameRule;
import evensun.scenario.tree.Node;
import evensun.scenario.tree.Node.Mapping;
import evensun.scenario.tree.Node.Scalar;
import evensun.scenario.tree.Node.Sequence;
import evensun.scenario.tree.Values;
import evensun.spi.Grading;
import evensun.spi.MixingRule;
import evensun.spi.Profile;
import evensun.spi.Samples;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.DoubleFunction;

/** Binds {@code grading}: two ends and how the layer changes between them. */
final class GradingBinder {

  private static final Interval TOLERANCE = Interval.closed(1e-8, 0.1, "");
  private static final Interval SHARE = Interval.closed(0, 1, "");
  private static final Interval EXPONENT = Interval.above(0, 100, "");
  private static final Interval WIDTH = Interval.closed(1e-3, 1e3, "");
  private static final Interval BASE = Interval.above(0, 1, "");

  /** Round bases that touch on a square lattice. */
  private static final double ROUND_BASE = Math.PI / 4;

  private final Fields layer;
  private final Fields fields;

  private GradingBinder(Fields layer, Fields fields) {
    this.layer = layer;
    this.fields = fields;
  }

  private enum Kind {
    LINEAR,
    POWER,
    TANH,
    TABLE,
    PYRAMID,
    CONE,
    PARABOLOID
  }

  static Optional<GradingSpec> bind(Fields layer) {
    return layer.section("grading").flatMap(fields -> new GradingBinder(layer, fields).grading());
  }

  private Optional<GradingSpec> grading() {
    int before = fields.faults().count();
    for (String key : FeatureBinder.MATERIAL_KEYS) {
      FeatureBinder.refuse(layer, key, "goes into the ends of the grading");
    }
    if (layer.has("coherence")
        && layer.node("coherence").orElseThrow() instanceof Scalar s
        && s.text().equals("incoherent")) {
      layer.fault(layer.place("coherence"), "a graded layer must be coherent; leave coherence out");
    }
    Optional<ComponentSpec> from = end("from", "upper");
    Optional<ComponentSpec> to = end("to", "lower");
    Optional<Profile> profile = profile();
    MixingRule rule = fields.choice("rule", FeatureBinder.rules()).orElse(MixingRule.BRUGGEMAN);
    double tolerance = fields.number("tolerance", TOLERANCE).orElse(Grading.DEFAULT_TOLERANCE);
    OptionalDouble size = fields.number("featureSizeNm", FeatureBinder.FEATURE_SIZE);
    fields.finish();
    return fields.faults().count() > before || from.isEmpty() || to.isEmpty() || profile.isEmpty()
        ? Optional.empty()
        : Optional.of(
            new GradingSpec(
                from.get(), to.get(), profile.get(), rule, tolerance, size, fields.place()));
  }

  /** An end: the name of a material, or a mapping when it has a bandgap to choose. */
  private Optional<ComponentSpec> end(String key, String face) {
    fields.require(key, "the material at the " + face + " face, such as {material: air}");
    Optional<Node> node = fields.node(key);
    if (node.isEmpty()) {
      return Optional.empty();
    }
    if (!(node.get() instanceof Mapping mapping)) {
      return fields
          .requiredName(key, "a material", NameRule.MATERIAL)
          .map(name -> new ComponentSpec(key, name, GapChoice.NONE, 1, node.get().place()));
    }
    Fields own = new Fields(fields.who() + "." + key, mapping, fields.faults());
    Optional<String> material =
        own.requiredName("material", "the name of a material", NameRule.MATERIAL);
    GapChoice gap = GapBinder.bind(own);
    own.finish();
    return material.map(name -> new ComponentSpec(key, name, gap, 1, own.place()));
  }

  private Optional<Profile> profile() {
    Map<String, Kind> kinds = new LinkedHashMap<>();
    for (Kind kind : Kind.values()) {
      kinds.put(kind.name().toLowerCase(Locale.ROOT), kind);
    }
    fields.require("profile", "linear, power, tanh, table, pyramid, cone or paraboloid");
    Optional<Kind> kind = fields.choice("profile", kinds);
    kind.ifPresent(this::refuseForeignKeys);
    return kind.flatMap(this::profile);
  }

  private void refuseForeignKeys(Kind kind) {
    boolean tapered = kind == Kind.PYRAMID || kind == Kind.CONE || kind == Kind.PARABOLOID;
    refuseUnless(kind == Kind.POWER, "exponent", "goes with profile: power");
    refuseUnless(kind == Kind.TANH, "centre", "goes with profile: tanh");
    refuseUnless(kind == Kind.TANH, "width", "goes with profile: tanh");
    refuseUnless(kind == Kind.TABLE, "points", "goes with profile: table");
    refuseUnless(tapered, "baseFraction", "goes with profile: pyramid, cone or paraboloid");
  }

  private void refuseUnless(boolean fits, String key, String why) {
    if (!fits) {
      FeatureBinder.refuse(fields, key, why);
    }
  }

  private Optional<Profile> profile(Kind kind) {
    return switch (kind) {
      case LINEAR -> Optional.of(new Profile.Linear());
      case POWER -> checked(fields.requiredNumber("exponent", EXPONENT), Profile.Power::new);
      case TANH -> tanh();
      case TABLE -> table();
      case PYRAMID -> tapered(Profile.Shape.PYRAMID, 1);
      case CONE -> tapered(Profile.Shape.CONE, ROUND_BASE);
      case PARABOLOID -> tapered(Profile.Shape.PARABOLOID, ROUND_BASE);
    };
  }

  private static Optional<Profile> checked(double value, DoubleFunction<Profile> make) {
    return Double.isNaN(value) ? Optional.empty() : Optional.of(make.apply(value));
  }

  private Optional<Profile> tanh() {
    double centre = fields.number("centre", SHARE).orElse(0.5);
    double width = fields.requiredNumber("width", WIDTH);
    return Double.isNaN(centre)
        ? Optional.empty()
        : checked(width, w -> new Profile.Tanh(centre, w));
  }

  private Optional<Profile> tapered(Profile.Shape shape, double usualBase) {
    double base = fields.number("baseFraction", BASE).orElse(usualBase);
    return checked(base, b -> new Profile.MothEye(shape, b));
  }

  private Optional<Profile> table() {
    fields.require("points", "pairs [depth, share of to], such as [[0, 0], [0.3, 0.8], [1, 1]]");
    List<Node> items = fields.list("points");
    double[] depth = new double[items.size()];
    double[] share = new double[items.size()];
    int before = fields.faults().count();
    for (int i = 0; i < items.size(); i++) {
      point(items.get(i), i, depth, share);
    }
    if (fields.faults().count() > before || !fields.has("points")) {
      return Optional.empty();
    }
    if (items.size() < 2 || depth[0] != 0 || depth[depth.length - 1] != 1) {
      fields.fault(
          fields.place("points"), "points must run from depth 0 to depth 1, relative to the layer");
      return Optional.empty();
    }
    return Optional.of(new Profile.Table(Samples.of(depth), Samples.of(share)));
  }

  private void point(Node item, int i, double[] depth, double[] share) {
    if (!(item instanceof Sequence pair) || pair.items().size() != 2) {
      fields.fault(
          item.place(),
          "points entry " + (i + 1) + " must be [depth, share] but was " + item.described());
      return;
    }
    String label = fields.who() + ": points entry " + (i + 1);
    depth[i] = Values.number(label + " depth", pair.items().get(0), SHARE, fields.faults());
    share[i] = Values.number(label + " share", pair.items().get(1), SHARE, fields.faults());
    if (i > 0 && depth[i] <= depth[i - 1]) {
      fields.fault(item.place(), "points entry " + (i + 1) + ": depths must increase");
    }
  }
}
