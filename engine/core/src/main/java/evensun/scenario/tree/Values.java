package evensun.scenario.tree;

import evensun.scenario.tree.Node.Broken;
import evensun.scenario.tree.Node.Scalar;
import java.util.Map;
import java.util.Optional;

/** Reads single values, whether they stand under a key or in a list. */
public final class Values {

  private Values() {}

  /** A number inside an interval, or NaN after a fault. */
  public static double number(String label, Node node, Interval in, Faults faults) {
    if (node instanceof Broken) {
      return Double.NaN;
    }
    String complaint = Numbers.complaint(node, in);
    if (!complaint.isEmpty()) {
      faults.add(node.place(), label + " " + complaint);
      return Double.NaN;
    }
    return Numbers.parse(((Scalar) node).text()).orElseThrow();
  }

  /** A text of one line, at least one character long; empty after a fault. */
  public static Optional<String> text(String label, Node node, Faults faults) {
    if (node instanceof Broken) {
      return Optional.empty();
    }
    if (!(node instanceof Scalar scalar)) {
      faults.add(node.place(), label + " must be a text but was " + node.described());
      return Optional.empty();
    }
    if (scalar.isNothing() || scalar.text().isBlank()) {
      faults.add(node.place(), label + " has no value");
      return Optional.empty();
    }
    return Optional.of(scalar.text().strip());
  }

  /** One of a few words; empty after a fault. */
  public static <T> Optional<T> choice(
      String label, Node node, Map<String, T> choices, Faults faults) {
    Optional<String> text = text(label, node, faults);
    if (text.isPresent() && !choices.containsKey(text.get())) {
      faults.add(
          node.place(),
          label
              + " must be one of "
              + Shown.list(choices.keySet())
              + " but was "
              + node.described()
              + Nearest.of(text.get(), choices.keySet())
                  .map(n -> "; did you mean " + n + "?")
                  .orElse(""));
    }
    return text.map(choices::get);
  }
}
