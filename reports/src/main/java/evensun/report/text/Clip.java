package evensun.report.text;

import java.util.regex.Pattern;

/** Shortens text that does not fit; the full text stands elsewhere on the page. */
public final class Clip {

  private static final String ELLIPSIS = "…";
  private static final Pattern SPACES = Pattern.compile("\\s+");

  private Clip() {}

  /** At most so many code points, the last an ellipsis where something is left out. */
  public static String to(String text, int codePoints) {
    String oneLine = isOneLine(text) ? text : SPACES.matcher(text).replaceAll(" ").strip();
    if (oneLine.length() <= codePoints
        || oneLine.codePointCount(0, oneLine.length()) <= codePoints) {
      return oneLine;
    }
    int end = oneLine.offsetByCodePoints(0, Math.max(0, codePoints - 1));
    return oneLine.substring(0, end).stripTrailing() + ELLIPSIS;
  }

  /** Whether its only white space is single spaces between words, as is usual. */
  private static boolean isOneLine(String text) {
    boolean space = true;
    for (int i = 0; i < text.length(); i++) {
      char c = text.charAt(i);
      if (c < ' ' || c == ' ' && space) {
        return false;
      }
      space = c == ' ';
    }
    return !space || text.isEmpty();
  }
}
