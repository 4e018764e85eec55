package evensun.scenario.reader;

import evensun.scenario.FeatureSpec;
import evensun.scenario.FeatureSpec.RoughnessSpec;
import evensun.scenario.tree.Fields;
import evensun.scenario.tree.Interval;
import evensun.scenario.tree.Shown;
import evensun.spi.MixingRule;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;

/** Binds what is mixed, graded or rough about a layer. */
final class FeatureBinder {

  static final Interval FEATURE_SIZE = Interval.above(0, 1e6, "nm");

  private static final Interval ROUGHNESS = Interval.closed(0, 1e4, "nm");
  private static final Interval CORRELATION_LENGTH = Interval.above(0, 1e7, "nm");

  private FeatureBinder() {}

  /** Keys of a layer that describe features. */
  static final List<String> KEYS =
      List.of("mixture", "grading", "roughnessNm", "correlationLengthNm");

  /**
   * The features of a finite layer.
   *
   * @param layer its keys
   * @param material its own material, empty where the features name the materials
   * @param bandgapEv bandgap of that material, if it is chosen
   */
  static List<FeatureSpec> bind(Fields layer, String material, OptionalDouble bandgapEv) {
    List<FeatureSpec> features = new ArrayList<>();
    if (layer.has("mixture") && layer.has("grading")) {
      layer.know("mixture", "grading");
      layer.fault(
          layer.place("grading"),
          "a layer takes a mixture or a grading, not both; split it into two layers");
    } else {
      MixtureBinder.bind(layer, material, bandgapEv).ifPresent(features::add);
      GradingBinder.bind(layer).ifPresent(features::add);
    }
    roughness(layer).ifPresent(features::add);
    return features;
  }

  /** Whether the features of a layer name its materials, so that it has none of its own. */
  static boolean namesMaterials(Fields layer) {
    return layer.has("grading") || MixtureBinder.namesMaterials(layer);
  }

  /** The roughness of the upper face of a layer, or of the exit medium; 0 is a flat face. */
  static Optional<RoughnessSpec> roughness(Fields layer) {
    OptionalDouble rmsNm = layer.number("roughnessNm", ROUGHNESS);
    OptionalDouble lengthNm = layer.number("correlationLengthNm", CORRELATION_LENGTH);
    if (rmsNm.isPresent() != lengthNm.isPresent()) {
      String missing = rmsNm.isPresent() ? "correlationLengthNm" : "roughnessNm";
      String present = rmsNm.isPresent() ? "roughnessNm" : "correlationLengthNm";
      String what =
          rmsNm.isPresent() ? "lateral correlation length" : "root mean square of the height";
      layer.fault(
          layer.place(present),
          present + " needs " + missing + " beside it, the " + what + " of the face in nm");
      return Optional.empty();
    }
    boolean rough = rmsNm.isPresent() && rmsNm.getAsDouble() != 0;
    return rough
        ? Optional.of(
            new RoughnessSpec(
                rmsNm.getAsDouble(), lengthNm.getAsDouble(), layer.place("roughnessNm")))
        : Optional.empty();
  }

  /** The mixing rules by name. */
  static Map<String, MixingRule> rules() {
    Map<String, MixingRule> rules = new LinkedHashMap<>();
    for (MixingRule rule : MixingRule.values()) {
      rules.put(rule.id(), rule);
    }
    return rules;
  }

  /** Says that a key has no meaning beside another choice. */
  static void refuse(Fields fields, String key, String why) {
    if (fields.has(key)) {
      fields.know(key);
      fields.fault(fields.place(key), Shown.plain(key) + " " + why + "; remove it");
    }
  }
}
