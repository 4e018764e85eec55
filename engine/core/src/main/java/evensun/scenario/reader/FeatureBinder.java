package evensun.scenario.reader;

import evensun.scenario.FeatureSpec;
import evensun.scenario.GapChoice;
import evensun.scenario.tree.Fields;
import evensun.scenario.tree.Interval;
import evensun.scenario.tree.Shown;
import evensun.spi.MixingRule;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** Binds what is not flat, uniform and pure about a layer. */
final class FeatureBinder {

  static final Interval FEATURE_SIZE = Interval.above(0, 1e6, "nm");

  /** Keys of a layer that speak of its own material. */
  static final List<String> MATERIAL_KEYS = List.of("material", "bandgapEv", "compositionFraction");

  private FeatureBinder() {}

  /**
   * The features of a finite layer.
   *
   * @param layer its keys
   * @param material its own material, empty where the features name the materials
   * @param gap bandgap of that material, if it is chosen
   */
  static List<FeatureSpec> bind(Fields layer, String material, GapChoice gap) {
    List<FeatureSpec> features = new ArrayList<>();
    if (layer.has("mixture") && layer.has("grading")) {
      layer.know("mixture", "grading");
      layer.fault(
          layer.place("grading"),
          "a layer takes a mixture or a grading, not both; split it into two layers");
    } else {
      MixtureBinder.bind(layer, material, gap).ifPresent(features::add);
      GradingBinder.bind(layer).ifPresent(features::add);
    }
    features.addAll(FaceBinder.bind(layer));
    return features;
  }

  /** Whether the features of a layer name its materials, so that it has none of its own. */
  static boolean namesMaterials(Fields layer) {
    return layer.has("grading") || MixtureBinder.namesMaterials(layer);
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
