package evensun.scenario.reader;

import evensun.scenario.SearchSpec.LimitSpec;
import evensun.scenario.tree.Fields;
import evensun.scenario.tree.Interval;
import evensun.scenario.tree.Node;
import evensun.scenario.tree.Node.Mapping;
import evensun.scenario.tree.Shown;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;

/** Binds {@code search.limits}. */
final class LimitBinder {

  private LimitBinder() {}

  static List<LimitSpec> bind(Fields search, QuantityBinder quantities) {
    List<LimitSpec> limits = new ArrayList<>();
    int number = 0;
    for (Node node : search.list("limits")) {
      String who = "search.limits[" + number++ + "]";
      if (node instanceof Mapping mapping) {
        Fields fields = new Fields(who, mapping, search.faults());
        limit(fields, quantities).ifPresent(limits::add);
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

  private static Optional<LimitSpec> limit(Fields fields, QuantityBinder quantities) {
    Map<String, String> names = QuantityBinder.names();
    fields.require("quantity", "one of " + Shown.list(names.keySet()));
    Optional<String> quantity = fields.choice("quantity", names);
    Interval in = QuantityBinder.interval(quantity.orElse(""));
    OptionalDouble atLeast = fields.number("atLeast", in);
    OptionalDouble atMost = fields.number("atMost", in);
    List<String> of = quantities.of(fields, quantity.orElse(""));
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
}
