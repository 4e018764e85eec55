package evensun.scenario.reader;

import evensun.scenario.SolverSpec;
import evensun.scenario.tree.Fields;
import evensun.scenario.tree.NameRule;
import evensun.scenario.tree.Values;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;
import java.util.regex.Pattern;

/** Binds {@code solver}. */
final class SolverBinder {

  private static final NameRule ID =
      new NameRule(
          Pattern.compile("[a-z][a-z0-9-]{0,79}"),
          "lower-case letters, digits and -, a letter first");

  private SolverBinder() {}

  static Optional<SolverSpec> bind(Fields root) {
    Optional<Fields> solver = root.section("solver");
    if (solver.isEmpty()) {
      return Optional.empty();
    }
    Fields fields = solver.get();
    Optional<String> id = fields.requiredName("id", "such as transfer-matrix", ID);
    Map<String, String> options = options(fields);
    fields.finish();
    return id.map(i -> new SolverSpec(i, options, fields.place("id")));
  }

  /** The solver knows its options, so their names are checked when it is prepared. */
  private static Map<String, String> options(Fields solver) {
    Map<String, String> options = new LinkedHashMap<>();
    solver
        .section("options")
        .ifPresent(
            fields -> {
              for (String key : fields.keys()) {
                fields
                    .node(key)
                    .flatMap(n -> Values.text("solver.options: " + key, n, solver.faults()))
                    .ifPresent(text -> options.put(key, text));
              }
            });
    return options;
  }
}
