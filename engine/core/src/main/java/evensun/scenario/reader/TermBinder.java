package evensun.scenario.reader;

import evensun.material.dispersion.Dispersion;
import evensun.material.dispersion.Term;
import evensun.material.dispersion.TermKind;
import evensun.scenario.MaterialSpec;
import evensun.scenario.tree.Fields;
import evensun.scenario.tree.Interval;
import evensun.scenario.tree.Node;
import evensun.scenario.tree.Node.Mapping;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/** Binds a material given by {@code terms} and {@code epsilonInfinity}. */
final class TermBinder {

  private static final Map<String, Interval> RANGES = ranges();

  private TermBinder() {}

  static Optional<MaterialSpec> bind(Fields fields) {
    double infinity = fields.number("epsilonInfinity", Interval.closed(0, 100, "")).orElse(1);
    List<Node> items = fields.list("terms");
    fields.finish();
    List<Term> terms = new ArrayList<>();
    for (Node item : items) {
      term(item, fields).ifPresent(terms::add);
    }
    if (items.isEmpty()) {
      fields.fault(
          fields.place("terms"),
          "terms must name at least one model, such as {model: cauchy, ...}");
    }
    return items.isEmpty() || terms.size() < items.size() || Double.isNaN(infinity)
        ? Optional.empty()
        : Optional.of(
            new MaterialSpec.Model(new Dispersion(infinity, terms), fields.place("terms")));
  }

  private static Optional<Term> term(Node item, Fields material) {
    if (!(item instanceof Mapping mapping)) {
      material.fault(
          item.place(), "terms: an item must be {model: NAME, ...} but was " + item.described());
      return Optional.empty();
    }
    Fields fields = new Fields(material.who() + " term", mapping, material.faults());
    fields.require("model", String.join(", ", models().keySet()));
    Optional<TermKind> kind = fields.choice("model", models());
    if (kind.isEmpty()) {
      // Without the model its parameters cannot be judged: take them as known.
      fields.know(fields.keys().toArray(String[]::new));
      fields.finish();
      return Optional.empty();
    }
    return term(kind.get(), fields);
  }

  private static Optional<Term> term(TermKind kind, Fields fields) {
    double[] values =
        kind.parameters().stream()
            .mapToDouble(key -> fields.requiredNumber(key, RANGES.get(key)))
            .toArray();
    fields.finish();
    for (double value : values) {
      if (Double.isNaN(value)) {
        return Optional.empty();
      }
    }
    try {
      return Optional.of(kind.of(values));
    } catch (IllegalArgumentException e) {
      fields.fault(fields.place(), e.getMessage());
      return Optional.empty();
    }
  }

  /** Widest range of each parameter over the models; a model may narrow it. */
  private static Map<String, Interval> ranges() {
    Map<String, Interval> ranges = new LinkedHashMap<>();
    ranges.put("refractiveIndex", Interval.closed(0.01, 20, ""));
    ranges.put("extinctionCoefficient", Interval.closed(0, 20, ""));
    ranges.put("indexAtLongWavelength", Interval.closed(0.5, 10, ""));
    ranges.put("dispersionUm2", Interval.closed(-10, 10, "µm²"));
    ranges.put("dispersionUm4", Interval.closed(-10, 10, "µm⁴"));
    ranges.put("strength", Interval.closed(0, 1000, ""));
    ranges.put("resonanceNm", Interval.closed(0, 1e6, "nm"));
    ranges.put("plasmaEnergyEv", Interval.closed(0, 50, "eV"));
    ranges.put("dampingEv", Interval.closed(1e-4, 10, "eV"));
    ranges.put("peakEv", Interval.closed(1e-3, 100, "eV"));
    ranges.put("broadeningEv", Interval.closed(1e-4, 50, "eV"));
    ranges.put("strengthEv", Interval.closed(0, 10000, "eV"));
    ranges.put("gapEv", Interval.closed(0, 50, "eV"));
    ranges.put("indexAtHighEnergy", Interval.closed(0.1, 10, ""));
    return ranges;
  }

  private static Map<String, TermKind> models() {
    Map<String, TermKind> models = new LinkedHashMap<>();
    for (TermKind kind : TermKind.values()) {
      models.put(kind.key(), kind);
    }
    return models;
  }
}
