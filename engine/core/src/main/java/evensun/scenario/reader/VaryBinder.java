package evensun.scenario.reader;

import evensun.scenario.SearchSpec.ChoiceSpec;
import evensun.scenario.SearchSpec.VarySpec;
import evensun.scenario.tree.Fields;
import evensun.scenario.tree.Interval;
import evensun.scenario.tree.Node;
import evensun.scenario.tree.Node.Broken;
import evensun.scenario.tree.Node.Entry;
import evensun.scenario.tree.Node.Mapping;
import evensun.scenario.tree.Node.Sequence;
import evensun.scenario.tree.Shown;
import evensun.scenario.tree.Values;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Collectors;

/** Binds {@code search.vary}: ranges, ranges on steps, and ties to another quantity. */
final class VaryBinder {

  private static final Interval RATIO = Interval.above(0, 1000, "");

  private final Fields fields;
  private final Mapping vary;
  private final StackBinder.Stack stack;

  private VaryBinder(Fields fields, Mapping vary, StackBinder.Stack stack) {
    this.fields = fields;
    this.vary = vary;
    this.stack = stack;
  }

  /** What varies: numbers in a range, and choices between alternatives. */
  record Varied(List<VarySpec> ranges, List<ChoiceSpec> choices) {}

  static Varied bind(Fields search, StackBinder.Stack stack) {
    search.require("vary", "what may vary, such as perovskite.thicknessNm: [200, 1000]");
    Optional<Mapping> vary = search.mapping("vary");
    if (vary.isEmpty()) {
      return new Varied(List.of(), List.of());
    }
    Fields fields = new Fields("search.vary", vary.get(), search.faults());
    VaryBinder binder = new VaryBinder(fields, vary.get(), stack);
    ChoiceBinder choices = new ChoiceBinder(fields, stack);
    return new Varied(binder.specs(choices), choices.bound());
  }

  private List<VarySpec> specs(ChoiceBinder choices) {
    if (vary.entries().isEmpty()) {
      fields.fault(fields.place(), "must name at least one quantity");
    }
    List<VarySpec> specs = new ArrayList<>();
    Map<String, Interval> intervals = new HashMap<>();
    for (String key : fields.keys()) {
      Entry entry = entry(key);
      if (ChoiceBinder.isChoice(key)) {
        choices.bind(entry);
        continue;
      }
      Optional<Interval> in = VaryKeys.interval(fields, entry, stack);
      in.ifPresent(interval -> intervals.put(key, interval));
      in.flatMap(interval -> spec(entry, interval)).ifPresent(specs::add);
    }
    checkTies(specs, intervals);
    return specs;
  }

  private Entry entry(String key) {
    return vary.entries().stream().filter(e -> e.key().equals(key)).findFirst().orElseThrow();
  }

  private Optional<VarySpec> spec(Entry entry, Interval in) {
    if (entry.value() instanceof Broken) {
      return Optional.empty();
    }
    if (entry.value() instanceof Mapping mapping) {
      return ofMapping(entry, mapping, in);
    }
    if (entry.value() instanceof Sequence sequence && sequence.items().size() == 2) {
      String label = fields.who() + ": " + Shown.plain(entry.key());
      double low = Values.number(label, sequence.items().get(0), in, fields.faults());
      double high = Values.number(label, sequence.items().get(1), in, fields.faults());
      return range(entry, low, high, 0);
    }
    fields.fault(
        entry.value().place(),
        Shown.plain(entry.key())
            + " must be [low, high], {low, high, step} or {sameAs: KEY}"
            + butWas(entry.value()));
    return Optional.empty();
  }

  private Optional<VarySpec> ofMapping(Entry entry, Mapping mapping, Interval in) {
    String key = Shown.plain(entry.key());
    Fields own = new Fields(fields.who() + ": " + key, mapping, fields.faults());
    return own.has("sameAs") || own.has("ratio") ? tie(entry, own) : stepped(entry, own, in);
  }

  private Optional<VarySpec> tie(Entry entry, Fields own) {
    Optional<String> leader = own.requiredText("sameAs", "the key of the quantity it follows");
    double ratio = own.number("ratio", RATIO).orElse(1);
    own.finish();
    return leader.map(name -> new VarySpec(entry.key(), 0, 0, 0, name, ratio, entry.keyPlace()));
  }

  private Optional<VarySpec> stepped(Entry entry, Fields own, Interval in) {
    double low = own.requiredNumber("low", in);
    double high = own.requiredNumber("high", in);
    Interval steps = Interval.above(0, Math.max(1, in.high()), in.unit());
    double step = own.number("step", steps).orElse(0);
    own.finish();
    if (step > high - low && low < high) {
      own.fault(
          own.place("step"),
          "step must be at most high − low, "
              + Shown.number(high - low)
              + ", but was "
              + Shown.number(step));
      return Optional.empty();
    }
    return range(entry, low, high, step);
  }

  private Optional<VarySpec> range(Entry entry, double low, double high, double step) {
    if (low > high) {
      fields.fault(
          entry.value().place(),
          Shown.plain(entry.key())
              + " must have low at most high but was ["
              + Shown.number(low)
              + ", "
              + Shown.number(high)
              + "]; swap them");
    }
    return low <= high && !Double.isNaN(step)
        ? Optional.of(new VarySpec(entry.key(), low, high, step, "", 1, entry.keyPlace()))
        : Optional.empty();
  }

  /** A tie leads to a quantity of the same kind that varies by itself, and stays in range. */
  private void checkTies(List<VarySpec> specs, Map<String, Interval> intervals) {
    for (VarySpec spec : specs) {
      if (spec.isTied()) {
        String complaint = complaint(spec, specs, intervals.get(spec.key()));
        if (!complaint.isEmpty()) {
          fields.fault(spec.place(), Shown.plain(spec.key()) + ": sameAs " + complaint);
        }
      }
    }
  }

  private String complaint(VarySpec tied, List<VarySpec> specs, Interval in) {
    String leader = Shown.plain(tied.sameAs());
    Optional<VarySpec> found =
        specs.stream().filter(s -> s.key().equals(tied.sameAs())).findFirst();
    if (found.isEmpty()) {
      return fields.has(tied.sameAs()) ? "" : "must name a key of search.vary but was " + leader;
    }
    if (found.get().isTied()) {
      return "must name a quantity that varies by itself, but " + leader + " follows another";
    }
    return quantity(tied.key()).equals(quantity(tied.sameAs()))
        ? outside(tied, found.get(), in)
        : "must name a quantity of the same kind but was " + leader;
  }

  private static String outside(VarySpec tied, VarySpec leader, Interval in) {
    double low = tied.ratio() * leader.low();
    double high = tied.ratio() * leader.high();
    return in.contains(low) && in.contains(high)
        ? ""
        : "leads out of "
            + in
            + ": "
            + Shown.number(tied.ratio())
            + " times "
            + Shown.plain(leader.key())
            + " runs from "
            + Shown.number(low)
            + " to "
            + Shown.number(high)
            + "; narrow that range or change the ratio";
  }

  private static String quantity(String key) {
    return key.substring(key.lastIndexOf('.') + 1);
  }

  private static String butWas(Node value) {
    if (!(value instanceof Sequence sequence)) {
      return " but was " + value.described();
    }
    String items =
        sequence.items().stream().limit(5).map(Node::described).collect(Collectors.joining(", "));
    String comma = sequence.items().size() > 2 ? "; a decimal number has a point, not a comma" : "";
    return " but was [" + items + "]" + comma;
  }
}
