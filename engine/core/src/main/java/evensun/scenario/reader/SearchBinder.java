package evensun.scenario.reader;

import evensun.scenario.SearchSpec;
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
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Collectors;

/** Binds {@code search}. */
final class SearchBinder {

  /** Aims by the name they are written with. */
  static final List<String> AIMS = List.of("matched-current", "current-sum", "efficiency");

  private SearchBinder() {}

  static Optional<SearchSpec> bind(Fields root, StackBinder.Stack stack) {
    Optional<Fields> search = root.section("search");
    if (search.isEmpty()) {
      return Optional.empty();
    }
    Fields fields = search.get();
    List<VarySpec> vary = vary(fields, stack);
    SearchSpec spec =
        new SearchSpec(
            vary,
            fields.choice("aim", aims()).orElse(usualAim(vary)),
            fields.whole("seed", 0, Long.MAX_VALUE).orElse(1),
            fields.count("evaluations", 1),
            fields.place());
    fields.finish();
    return Optional.of(spec);
  }

  /** Matched current cannot decide a bandgap, efficiency can. */
  private static String usualAim(List<VarySpec> vary) {
    boolean gap = vary.stream().anyMatch(v -> v.key().endsWith(".bandgapEv"));
    return gap ? "efficiency" : AIMS.get(0);
  }

  private static List<VarySpec> vary(Fields search, StackBinder.Stack stack) {
    search.require("vary", "what may vary, such as perovskite.thicknessNm: [200, 1000]");
    Optional<Mapping> vary = search.mapping("vary");
    if (vary.isEmpty()) {
      return List.of();
    }
    Fields fields = new Fields("search.vary", vary.get(), search.faults());
    if (vary.get().entries().isEmpty()) {
      fields.fault(fields.place(), "must name at least one quantity");
    }
    List<VarySpec> specs = new ArrayList<>();
    for (String key : fields.keys()) {
      Entry entry = entry(vary.get(), key);
      VaryKeys.interval(fields, entry, stack)
          .flatMap(in -> range(fields, entry, in))
          .ifPresent(specs::add);
    }
    return specs;
  }

  private static Entry entry(Mapping vary, String key) {
    return vary.entries().stream().filter(e -> e.key().equals(key)).findFirst().orElseThrow();
  }

  private static Optional<VarySpec> range(Fields fields, Entry entry, Interval in) {
    String key = Shown.plain(entry.key());
    if (entry.value() instanceof Broken) {
      return Optional.empty();
    }
    if (!(entry.value() instanceof Sequence sequence) || sequence.items().size() != 2) {
      fields.fault(entry.value().place(), key + " must be [low, high]" + butWas(entry.value()));
      return Optional.empty();
    }
    String label = fields.who() + ": " + key;
    double low = Values.number(label, sequence.items().get(0), in, fields.faults());
    double high = Values.number(label, sequence.items().get(1), in, fields.faults());
    if (low > high) {
      fields.fault(
          entry.value().place(),
          key
              + " must have low at most high but was ["
              + Shown.number(low)
              + ", "
              + Shown.number(high)
              + "]; swap them");
    }
    return low <= high
        ? Optional.of(new VarySpec(entry.key(), low, high, entry.keyPlace()))
        : Optional.empty();
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

  private static Map<String, String> aims() {
    Map<String, String> aims = new LinkedHashMap<>();
    AIMS.forEach(a -> aims.put(a, a));
    return aims;
  }
}
