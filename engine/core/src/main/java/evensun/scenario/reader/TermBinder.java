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

  private static final Interval ANY = Interval.closed(-1e9, 1e9, "");

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
        kind.parameters().stream().mapToDouble(key -> fields.requiredNumber(key, ANY)).toArray();
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

  private static Map<String, TermKind> models() {
    Map<String, TermKind> models = new LinkedHashMap<>();
    for (TermKind kind : TermKind.values()) {
      models.put(kind.key(), kind);
    }
    return models;
  }
}
