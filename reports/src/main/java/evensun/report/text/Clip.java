package evensun.report.text;

/** Shortens text that does not fit; the full text stands elsewhere on the page. */
public final class Clip {

  private static final String ELLIPSIS = "…";

  private Clip() {}

  /** At most so many code points, the last an ellipsis where something is left out. */
  public static String to(String text, int codePoints) {
    String oneLine = text.replaceAll("\\s+", " ").strip();
    if (oneLine.codePointCount(0, oneLine.length()) <= codePoints) {
      return oneLine;
    }
    int end = oneLine.offsetByCodePoints(0, Math.max(0, codePoints - 1));
    return oneLine.substring(0, end).stripTrailing() + ELLIPSIS;
  }
}
