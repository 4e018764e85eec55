package evensun.scenario.reader;

import evensun.scenario.Connection;
import evensun.scenario.Place;
import evensun.scenario.Scenario;
import evensun.scenario.Source;
import evensun.scenario.SubcellSpec;
import evensun.scenario.tree.Fields;
import evensun.scenario.tree.Node;
import evensun.scenario.tree.Node.Scalar;
import evensun.scenario.tree.Shown;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/** Binds the whole file, section by section. */
final class RootBinder {

  /** Every section, in the order in which people write them. */
  static final List<String> KEYS =
      List.of(
          "evensun",
          "title",
          "light",
          "grid",
          "materials",
          "stack",
          "subcells",
          "connection",
          "device",
          "solver",
          "search",
          "measured");

  private static final int LONGEST_TITLE = 200;

  private RootBinder() {}

  static Scenario bind(Source source, Fields root) {
    root.know(KEYS.toArray(String[]::new));
    version(root);
    StackBinder.Stack stack = StackBinder.bind(root);
    List<SubcellSpec> subcells = SubcellBinder.bind(root, stack);
    Scenario scenario =
        new Scenario(
            source,
            title(root),
            LightBinder.bind(root),
            GridBinder.bind(root),
            MaterialBinder.bind(root),
            stack.incident(),
            stack.layers(),
            stack.exit(),
            subcells,
            connection(root, subcells),
            DeviceBinder.bind(root),
            SolverBinder.bind(root),
            SearchBinder.bind(root, stack, subcells),
            MeasuredBinder.bind(root, subcells));
    root.finish();
    return scenario;
  }

  private static void version(Fields root) {
    root.require("evensun", "the version of the format; the file starts with evensun: 1");
    Optional<Node> version = root.node("evensun");
    if (version.isPresent()
        && !(version.get() instanceof Scalar s && s.text().equals("1") && !s.quoted())) {
      root.fault(
          root.place("evensun"),
          "evensun must be 1, the version of the format this program reads, but was "
              + version.get().described());
    }
  }

  private static String title(Fields root) {
    String title = root.requiredText("title", "a line that says what the scenario is").orElse("");
    Place place = root.place("title");
    int length = title.codePointCount(0, title.length());
    if (length > LONGEST_TITLE) {
      root.fault(
          place, "title must have at most " + LONGEST_TITLE + " characters but has " + length);
    } else if (title.codePoints().anyMatch(Shown::isDisturbing)) {
      root.fault(
          place,
          "title must be one line without control or direction characters but was "
              + Shown.quoted(title));
    }
    return title;
  }

  /** A silent default would decide a design, so it must be written once there is a choice. */
  private static Connection connection(Fields root, List<SubcellSpec> subcells) {
    Map<String, Connection> choices = new LinkedHashMap<>();
    choices.put("series", Connection.SERIES);
    choices.put("independent", Connection.INDEPENDENT);
    choices.put("parallel", Connection.PARALLEL);
    if (subcells.size() > 1) {
      root.require(
          "connection",
          "series (two terminals, one current), independent (each subcell has its own terminals)"
              + " or parallel (one voltage)");
    }
    return root.choice("connection", choices).orElse(Connection.SERIES);
  }
}
