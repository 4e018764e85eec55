package evensun.scenario.tree;

import evensun.scenario.Place;
import java.util.Locale;
import java.util.Optional;
import org.snakeyaml.engine.v2.exceptions.Mark;
import org.snakeyaml.engine.v2.exceptions.MarkedYamlEngineException;
import tools.jackson.core.JacksonException;
import tools.jackson.core.TokenStreamLocation;
import tools.jackson.core.exc.StreamConstraintsException;

/** Says in a user's words what the parsers say in theirs. */
final class SyntaxFaults {

  private SyntaxFaults() {}

  static void report(JacksonException e, String file, String[] lines, Faults faults) {
    if (reportIndents(file, lines, faults)) {
      return;
    }
    if (e instanceof StreamConstraintsException) {
      faults.add(at(e, file), "nested too deeply or too long; no scenario needs that");
      return;
    }
    if (e.getCause() instanceof MarkedYamlEngineException yaml) {
      faults.add(at(yaml, file), yamlMessage(yaml));
      return;
    }
    faults.add(at(e, file), otherMessage(e));
  }

  /** Tabs and odd spaces at the start of a line are invisible, and behind many syntax errors. */
  private static boolean reportIndents(String file, String[] lines, Faults faults) {
    int before = faults.count();
    for (int i = 0; i < lines.length; i++) {
      int odd = oddIndent(lines[i]);
      if (odd >= 0) {
        String what = lines[i].charAt(odd) == '\t' ? "a tab" : "a space that is no plain space";
        faults.add(
            new Place(file, i + 1, odd + 1, ""),
            "the line is indented with " + what + "; YAML takes plain spaces only");
      }
    }
    return faults.count() > before;
  }

  /** Position of the first character of the indent that is no plain space, or -1. */
  private static int oddIndent(String line) {
    for (int i = 0; i < line.length(); i++) {
      char c = line.charAt(i);
      if (c == '\t' || (c != ' ' && Character.isSpaceChar(c))) {
        return line.isBlank() ? -1 : i;
      }
      if (c != ' ') {
        return -1;
      }
    }
    return -1;
  }

  private static String yamlMessage(MarkedYamlEngineException e) {
    String problem = String.valueOf(e.getProblem());
    String context = String.valueOf(e.getContext());
    if (problem.contains("mapping values are not allowed")) {
      return "a colon followed by a space is not expected here; put text that holds \": \" in"
          + " quotes, and align keys that belong together";
    }
    if (problem.contains("TAB")) {
      return "there is a tab between the values; YAML takes spaces only";
    }
    if (context.contains("quoted scalar")) {
      return "the quoted text that starts"
          + line(e.getContextMark())
          + " has no closing quote, or a \\ in it that means nothing (write \\\\)";
    }
    if (context.contains("flow sequence")) {
      return "the list [ … ] that starts" + line(e.getContextMark()) + notClosed("]");
    }
    if (context.contains("flow mapping")) {
      return "the mapping { … } that starts" + line(e.getContextMark()) + notClosed("}");
    }
    if (context.contains("block mapping") || context.contains("block collection")) {
      return "the line does not fit what starts"
          + line(e.getContextMark())
          + "; keys of one mapping and dashes of one list start in the same column";
    }
    if (problem.contains("could not find expected ':'")) {
      return "the key that starts" + line(e.getContextMark()) + " has no colon and value";
    }
    if (problem.contains("that cannot start any token")) {
      return "a value cannot start with this character; put it in quotes";
    }
    if (problem.contains("stream end")) {
      return "the text ends before everything is closed: a bracket or a value is missing";
    }
    return "cannot be read as YAML: " + Shown.plain(problem);
  }

  private static String notClosed(String bracket) {
    return " is not closed with " + bracket + ", or lacks a comma between two of its values";
  }

  private static String line(Optional<Mark> mark) {
    return mark.map(m -> " in line " + (m.getLine() + 1)).orElse(" before");
  }

  private static String otherMessage(JacksonException e) {
    String original = String.valueOf(e.getOriginalMessage());
    if (original.startsWith("Expected a property name")) {
      return "a key must be a single word, not a list or a mapping";
    }
    String first = original.lines().findFirst().orElse("").strip();
    String lower = first.toLowerCase(Locale.ROOT);
    if (lower.contains("end-of-input") || lower.contains("end of input")) {
      return "the text ends before everything is closed: a bracket or a quote is missing";
    }
    return "cannot be read: " + Shown.plain(first);
  }

  private static Place at(MarkedYamlEngineException e, String file) {
    Optional<Mark> mark = e.getProblemMark().or(e::getContextMark);
    return mark.map(m -> new Place(file, m.getLine() + 1, m.getColumn() + 1, ""))
        .orElse(Place.of(file));
  }

  private static Place at(JacksonException e, String file) {
    TokenStreamLocation at = e.getLocation();
    if (at == null || at.getLineNr() < 1) {
      return Place.of(file);
    }
    return new Place(file, at.getLineNr(), Math.max(at.getColumnNr(), 0), "");
  }
}
