package evensun.finding;

import java.util.List;

/**
 * The text behind the code of a finding.
 *
 * @param code code, kebab-case
 * @param means what was found
 * @param effect what it does to the result
 * @param remedy what to do about it
 */
public record Explanation(String code, String means, String effect, String remedy) {

  private static final List<String> LABELS = List.of("means: ", "effect: ", "do: ");

  public Explanation {
    if (means.isBlank() || effect.isBlank() || remedy.isBlank()) {
      throw new IllegalArgumentException("every part must have a text: " + code);
    }
  }

  /**
   * Reads a text of three lines, {@code means:}, {@code effect:}, {@code do:}.
   *
   * @throws IllegalArgumentException when it has another form
   */
  static Explanation parse(String code, String text) {
    List<String> lines = text.strip().lines().toList();
    if (lines.size() != LABELS.size()) {
      throw new IllegalArgumentException(
          "a text must have three lines but " + code + " has " + lines.size());
    }
    String[] parts = new String[LABELS.size()];
    for (int i = 0; i < parts.length; i++) {
      if (!lines.get(i).startsWith(LABELS.get(i))) {
        throw new IllegalArgumentException(
            "line " + (i + 1) + " of " + code + " must start with " + LABELS.get(i).strip());
      }
      parts[i] = lines.get(i).substring(LABELS.get(i).length()).strip();
    }
    return new Explanation(code, parts[0], parts[1], parts[2]);
  }
}
