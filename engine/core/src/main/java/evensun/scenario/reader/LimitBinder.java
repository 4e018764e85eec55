package evensun.scenario.reader;

import evensun.scenario.LayerSpec;
import evensun.scenario.SearchSpec.LimitSpec;
import evensun.scenario.tree.Fields;
import evensun.scenario.tree.Interval;
import evensun.scenario.tree.Nearest;
import evensun.scenario.tree.Node;
import evensun.scenario.tree.Node.Mapping;
import evensun.scenario.tree.Shown;
import evensun.scenario.tree.Values;
import java.util.ArrayList;
import java.util.Collection;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;

/** Binds {@code search.limits}. */
final class LimitBinder {

  /** Quantities that can be limited, with what makes sense as a limit. */
  private static final Map<String, Interval> QUANTITIES = quantities();

  private LimitBinder() {}

  private static Map<String, Interval> quantities() {
    Map<String, Interval> quantities = new LinkedHashMap<>();
    quantities.put("mismatchMaPerCm2", Interval.closed(0, 1000, "mA cm⁻²"));
    quantities.put("photocurrentMaPerCm2", Interval.closed(0, 1000, "mA cm⁻²"));
    quantities.put("thicknessNm", Interval.closed(0, 1e9, "nm"));
    quantities.put("bandgapEv", Interval.closed(0, 10, "eV"));
    return quantities;
  }

  static List<LimitSpec> bind(
      Fields search, StackBinder.Stack stack, Collection<String> subcellNames) {
    List<LimitSpec> limits = new ArrayList<>();
    int number = 0;
    for (Node node : search.list("limits")) {
      String who = "search.limits[" + number++ + "]";
      if (node instanceof Mapping mapping) {
        Fields fields = new Fields(who, mapping, search.faults());
        limit(fields, stack, subcellNames).ifPresent(limits::add);
      } else {
        search
            .faults()
            .add(
                node.place(),
                who
                    + " must be such as {quantity: mismatchMaPerCm2, atMost: 0.3} but was "
                    + node.described());
      }
    }
    return limits;
  }

  private static Optional<LimitSpec> limit(
      Fields fields, StackBinder.Stack stack, Collection<String> subcellNames) {
    fields.require("quantity", "one of " + Shown.list(QUANTITIES.keySet()));
    Map<String, String> names = new LinkedHashMap<>();
    QUANTITIES.keySet().forEach(name -> names.put(name, name));
    Optional<String> quantity = fields.choice("quantity", names);
    Interval in = QUANTITIES.getOrDefault(quantity.orElse(""), Interval.closed(-1e9, 1e9, ""));
    OptionalDouble atLeast = fields.number("atLeast", in);
    OptionalDouble atMost = fields.number("atMost", in);
    List<String> of = of(fields, quantity.orElse(""), stack, subcellNames);
    fields.finish();
    checkEnds(fields, atLeast, atMost);
    return quantity.map(name -> new LimitSpec(name, of, atLeast, atMost, fields.place()));
  }

  private static void checkEnds(Fields fields, OptionalDouble atLeast, OptionalDouble atMost) {
    if (atLeast.isEmpty() && atMost.isEmpty()) {
      fields.fault(fields.place(), "needs atLeast or atMost");
    } else if (atLeast.isPresent()
        && atMost.isPresent()
        && atLeast.getAsDouble() > atMost.getAsDouble()) {
      fields.fault(fields.place(), "atLeast must not be larger than atMost");
    }
  }

  private static List<String> of(
      Fields fields, String quantity, StackBinder.Stack stack, Collection<String> subcellNames) {
    List<String> names = new ArrayList<>();
    boolean layers = quantity.equals("thicknessNm");
    Collection<String> known =
        layers ? stack.layers().stream().map(LayerSpec::name).toList() : subcellNames;
    for (Node node : fields.list("of")) {
      Optional<String> name = Values.text(fields.who() + ": of", node, fields.faults());
      name.ifPresent(names::add);
      if (name.isPresent() && !quantity.isEmpty() && !known.contains(name.get())) {
        fields.fault(
            node.place(),
            "of names no "
                + (layers ? "layer with a thickness: " : "subcell: ")
                + Shown.plain(name.get())
                + Nearest.hint(name.get(), known));
      }
    }
    if (quantity.equals("mismatchMaPerCm2") && !names.isEmpty()) {
      fields.fault(fields.place("of"), "of does not go with mismatchMaPerCm2, which is of all");
    }
    return names;
  }
}
