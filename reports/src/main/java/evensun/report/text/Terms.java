package evensun.report.text;

import evensun.report.text.Glossary.Term;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import org.jspecify.annotations.Nullable;

/** Finds the terms of the glossary in a text, each where it first occurs. */
public final class Terms {

  /** The longest first, so that a term wins over one that it begins with. */
  private static final List<Term> LONGEST_FIRST = longestFirst();

  private Terms() {}

  /**
   * A stretch of a text.
   *
   * @param text the text
   * @param term the term it is, null for plain text
   */
  public record Span(String text, @Nullable Term term) {}

  /** The text in stretches; together they are the text. */
  public static List<Span> mark(String text) {
    List<Span> spans = new ArrayList<>();
    Set<String> seen = new HashSet<>();
    int from = 0;
    int at = 0;
    while (at < text.length()) {
      Term term = isInsideWord(text, at - 1) ? null : termAt(text, at);
      if (term == null) {
        at++;
        continue;
      }
      int end = at + term.name().length();
      if (seen.add(term.id())) {
        plain(text, from, at, spans);
        spans.add(new Span(text.substring(at, end), term));
        from = end;
      }
      at = end;
    }
    plain(text, from, text.length(), spans);
    return spans;
  }

  private static void plain(String text, int from, int to, List<Span> spans) {
    if (to > from) {
      spans.add(new Span(text.substring(from, to), null));
    }
  }

  private static @Nullable Term termAt(String text, int at) {
    for (Term term : LONGEST_FIRST) {
      String name = term.name();
      if (text.regionMatches(true, at, name, 0, name.length())
          && !isInsideWord(text, at + name.length())) {
        return term;
      }
    }
    return null;
  }

  private static boolean isInsideWord(String text, int at) {
    return at >= 0
        && at < text.length()
        && (text.charAt(at) == '-' || Character.isLetter(text.charAt(at)));
  }

  private static List<Term> longestFirst() {
    List<Term> terms = new ArrayList<>(Glossary.all());
    terms.sort(Comparator.comparingInt((Term term) -> term.name().length()).reversed());
    return List.copyOf(terms);
  }
}
