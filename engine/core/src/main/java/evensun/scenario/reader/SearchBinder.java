package evensun.scenario.reader;

import evensun.scenario.SearchSpec;
import evensun.scenario.SearchSpec.VarySpec;
import evensun.scenario.SubcellSpec;
import evensun.scenario.tree.Fields;
import evensun.scenario.tree.Interval;
import java.util.List;
import java.util.Optional;

/** Binds {@code search}. */
final class SearchBinder {

  private static final Interval TIME = Interval.above(0, 1e7, "s");

  private SearchBinder() {}

  static Optional<SearchSpec> bind(
      Fields root, StackBinder.Stack stack, List<SubcellSpec> subcells) {
    Optional<Fields> search = root.section("search");
    if (search.isEmpty()) {
      return Optional.empty();
    }
    Fields fields = search.get();
    QuantityBinder quantities = new QuantityBinder(stack, subcells);
    VaryBinder.Varied varied = VaryBinder.bind(fields, stack);
    List<VarySpec> vary = varied.ranges();
    SearchSpec spec =
        new SearchSpec(
            vary,
            varied.choices(),
            LimitBinder.bind(fields, quantities),
            new AimBinder(fields, quantities).bind(usualAim(vary)),
            fields.whole("seed", 0, Long.MAX_VALUE).orElse(1),
            fields.count("evaluations", 1),
            fields.number("timeSeconds", TIME),
            fields.place());
    fields.finish();
    return Optional.of(spec.on(stack.layers()));
  }

  /** Matched current cannot decide a bandgap, efficiency can. */
  private static String usualAim(List<VarySpec> vary) {
    boolean gap =
        vary.stream()
            .anyMatch(v -> GapBinder.KEYS.stream().anyMatch(k -> v.key().endsWith("." + k)));
    return gap ? "efficiency" : "matched-current";
  }
}
