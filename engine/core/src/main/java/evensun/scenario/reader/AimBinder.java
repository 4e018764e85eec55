package evensun.scenario.reader;

import evensun.scenario.SearchSpec.AimSpec;
import evensun.scenario.tree.Fields;
import evensun.scenario.tree.Interval;
import evensun.scenario.tree.Node;
import evensun.scenario.tree.Node.Entry;
import evensun.scenario.tree.Node.Mapping;
import evensun.scenario.tree.Node.Scalar;
import evensun.scenario.tree.Node.Sequence;
import evensun.scenario.tree.Shown;
import evensun.scenario.tree.Values;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/** Binds {@code search.aim}: one aim, or two or three for a front. */
final class AimBinder {

  /** The quantity of each aim that has a name of its own. */
  private static final Map<String, String> NAMED = named();

  private static final int MOST = 3;
  private static final Interval WEIGHT = Interval.above(0, 1000, "");
  private static final String LARGEST = "largest";
  private static final String SMALLEST = "smallest";

  private final Fields search;
  private final QuantityBinder quantities;

  AimBinder(Fields search, QuantityBinder quantities) {
    this.search = search;
    this.quantities = quantities;
  }

  private static Map<String, String> named() {
    Map<String, String> named = new LinkedHashMap<>();
    named.put("matched-current", "matchedCurrentMaPerCm2");
    named.put("current-sum", "currentSumMaPerCm2");
    named.put("efficiency", "efficiencyPercent");
    return named;
  }

  /**
   * The aims.
   *
   * @param usual name of the aim when the scenario names none
   */
  List<AimSpec> bind(String usual) {
    Optional<Node> node = search.node("aim");
    if (node.isEmpty()) {
      return List.of(of(usual, search));
    }
    if (node.get() instanceof Sequence sequence) {
      return several(sequence);
    }
    return aim("search: aim", node.get()).stream().toList();
  }

  private static AimSpec of(String name, Fields search) {
    return new AimSpec(name, NAMED.get(name), List.of(), List.of(), false, search.place());
  }

  private List<AimSpec> several(Sequence sequence) {
    int count = sequence.items().size();
    if (count < 1 || count > MOST) {
      search.fault(
          sequence.place(), "aim takes one aim or a list of two or three, but has " + count);
      return List.of();
    }
    List<AimSpec> aims = new ArrayList<>();
    for (int i = 0; i < count; i++) {
      aim("search.aim[" + i + "]", sequence.items().get(i)).ifPresent(aims::add);
    }
    for (int i = 0; i < aims.size(); i++) {
      checkNew(aims.get(i), aims.subList(0, i));
    }
    return aims;
  }

  private void checkNew(AimSpec aim, List<AimSpec> before) {
    boolean again =
        before.stream()
            .anyMatch(b -> b.quantity().equals(aim.quantity()) && b.of().equals(aim.of()));
    if (again) {
      search.fault(aim.place(), "aim names " + aim.quantity() + " twice");
    }
  }

  private Optional<AimSpec> aim(String who, Node node) {
    if (node instanceof Mapping mapping) {
      return quantity(new Fields(who, mapping, search.faults()));
    }
    if (!(node instanceof Scalar)) {
      search
          .faults()
          .add(
              node.place(),
              who
                  + " must be one of "
                  + Shown.list(NAMED.keySet())
                  + " or such as {smallest: thicknessNm, of: [perovskite]} but was "
                  + node.described());
      return Optional.empty();
    }
    Map<String, String> names = new LinkedHashMap<>();
    NAMED.keySet().forEach(name -> names.put(name, name));
    return Values.choice(who, node, names, search.faults())
        .map(name -> new AimSpec(name, NAMED.get(name), List.of(), List.of(), false, node.place()));
  }

  private Optional<AimSpec> quantity(Fields fields) {
    fields.know(LARGEST, SMALLEST, "of", "weights");
    boolean smallest = fields.has(SMALLEST);
    if (smallest == fields.has(LARGEST)) {
      fields.fault(fields.place(), "needs either largest or smallest, with the name of a quantity");
      return Optional.empty();
    }
    Optional<String> quantity =
        fields.choice(smallest ? SMALLEST : LARGEST, QuantityBinder.names());
    List<String> of = new ArrayList<>(quantities.of(fields, quantity.orElse("")));
    List<Double> weights = weights(fields, quantity.orElse(""), of);
    fields.finish();
    return quantity.map(name -> new AimSpec("", name, of, weights, smallest, fields.place()));
  }

  /** Weights name their subcells themselves. */
  private List<Double> weights(Fields fields, String quantity, List<String> of) {
    Optional<Mapping> mapping = fields.mapping("weights");
    if (mapping.isEmpty()) {
      return List.of();
    }
    if (!quantity.equals("currentSumMaPerCm2") || fields.has("of")) {
      fields.fault(
          fields.place("weights"), "weights go with currentSumMaPerCm2 alone, in place of of");
      return List.of();
    }
    List<Double> weights = new ArrayList<>();
    String label = fields.who() + ": weights: ";
    for (Entry entry : mapping.get().entries()) {
      if (quantities.isKnown(fields, quantity, entry.key(), entry.value())) {
        of.add(entry.key());
        weights.add(
            Values.number(
                label + Shown.plain(entry.key()), entry.value(), WEIGHT, fields.faults()));
      }
    }
    return weights;
  }
}
