package evensun.report.text;

import evensun.report.text.Glossary.Term;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Collectors;
import org.jspecify.annotations.Nullable;

/** Finds the terms of the glossary in a text, each where it first occurs. */
public final class Terms {

  private static final Pattern ANY =
      Pattern.compile(
          Glossary.all().stream()
              .map(Term::name)
              .sorted(Comparator.comparingInt(String::length).reversed())
              .map(Pattern::quote)
              .collect(Collectors.joining("|", "(?<![\\p{L}-])(?:", ")(?![\\p{L}-])")),
          Pattern.CASE_INSENSITIVE);

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
    Set<Term> seen = new HashSet<>();
    Matcher matcher = ANY.matcher(text);
    int from = 0;
    while (matcher.find()) {
      Term term = named(matcher.group());
      if (seen.add(term)) {
        plain(text, from, matcher.start(), spans);
        spans.add(new Span(matcher.group(), term));
        from = matcher.end();
      }
    }
    plain(text, from, text.length(), spans);
    return spans;
  }

  private static void plain(String text, int from, int to, List<Span> spans) {
    if (to > from) {
      spans.add(new Span(text.substring(from, to), null));
    }
  }

  private static Term named(String name) {
    return Glossary.all().stream()
        .filter(term -> term.name().equalsIgnoreCase(name))
        .findFirst()
        .orElseThrow();
  }
}
