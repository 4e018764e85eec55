package evensun.scenario.tree;

import evensun.scenario.tree.Node.Scalar;
import java.util.Locale;
import java.util.Optional;
import java.util.Set;
import java.util.regex.Pattern;

/**
 * What a name may look like.
 *
 * @param pattern what all of it must match
 * @param allowed the same in words
 */
public record NameRule(Pattern pattern, String allowed) {

  /** Layers and subcells. */
  public static final NameRule ELEMENT =
      new NameRule(
          Pattern.compile("[A-Za-z0-9_-]{1,80}"), "1 to 80 ASCII letters, digits, - and _");

  /** Materials. */
  public static final NameRule MATERIAL =
      new NameRule(
          Pattern.compile("[A-Za-z0-9_.,-]{1,80}"), "1 to 80 ASCII letters, digits, - _ . and ,");

  /** A layer, or a component of a mixed layer. */
  public static final NameRule ABSORBER =
      new NameRule(
          Pattern.compile("[A-Za-z0-9_-]{1,80}(/[A-Za-z0-9_.,-]{1,80})?"),
          "the name of a layer, or layer/component");

  private static final Set<String> WORDS_WITH_A_MEANING =
      Set.of("true", "false", "yes", "no", "on", "off", "y", "n", "null", "~");

  /** Reads a name; empty after a fault. */
  public Optional<String> read(String label, Node node, Faults faults) {
    if (node instanceof Scalar scalar && !scalar.quoted() && !scalar.text().isEmpty()) {
      String meaning = otherMeaning(scalar.text());
      if (!meaning.isEmpty()) {
        faults.add(
            node.place(),
            label
                + " must be a name, but YAML readers take "
                + Shown.plain(scalar.text())
                + " for "
                + meaning
                + "; put it in quotes or choose another name");
        return Optional.empty();
      }
    }
    return Values.text(label, node, faults).filter(name -> fits(label, name, node, faults));
  }

  private boolean fits(String label, String name, Node node, Faults faults) {
    if (pattern.matcher(name).matches()) {
      return true;
    }
    faults.add(node.place(), label + " must be " + allowed + " but was " + Shown.quoted(name));
    return false;
  }

  private static String otherMeaning(String text) {
    if (Numbers.parse(text).isPresent()) {
      return "a number";
    }
    return WORDS_WITH_A_MEANING.contains(text.toLowerCase(Locale.ROOT)) ? "yes, no or nothing" : "";
  }
}
