package evensun.report.text;

/** Text as a string of a style sheet, every character escaped so that none can end it. */
public final class CssText {

  private static final int MOST_LETTERS = 90;

  private CssText() {}

  /** A quoted string, shortened to one line of a footer. */
  public static String quoted(String text) {
    StringBuilder css = new StringBuilder("'");
    Clip.to(Plain.line(text), MOST_LETTERS)
        .codePoints()
        .forEach(c -> css.append('\\').append(Integer.toHexString(c)).append(' '));
    return css.append('\'').toString();
  }
}
