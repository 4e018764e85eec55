package evensun.scenario.tree;

import java.util.Collection;
import java.util.Locale;
import java.util.stream.Collectors;

/** How foreign text and numbers are shown inside a message of one line. */
public final class Shown {

  private static final int LONGEST = 60;

  private Shown() {}

  /** Foreign text in quotes: shortened, and with nothing in it that could disturb the line. */
  public static String quoted(String text) {
    return '"' + plain(text) + '"';
  }

  /** Foreign text: shortened, control and direction characters written as escapes. */
  public static String plain(String text) {
    StringBuilder shown = new StringBuilder();
    int[] codePoints = text.codePoints().limit(LONGEST + 1L).toArray();
    for (int i = 0; i < Math.min(LONGEST, codePoints.length); i++) {
      append(shown, codePoints[i]);
    }
    return codePoints.length > LONGEST ? shown + "…" : shown.toString();
  }

  /** Several names, parted by commas. */
  public static String list(Collection<String> names) {
    return names.stream().map(Shown::plain).collect(Collectors.joining(", "));
  }

  /** A number as short as it can be said: {@code 1e7}, {@code 180000}, {@code 0.05}. */
  public static String number(double value) {
    if (value == Math.rint(value) && Math.abs(value) < 1e6) {
      return String.valueOf((long) value);
    }
    return Double.toString(value).replace(".0E", "e").replace("E", "e").toLowerCase(Locale.ROOT);
  }

  /** Whether a character turns, hides or breaks the text around it. */
  public static boolean isDisturbing(int codePoint) {
    return switch (Character.getType(codePoint)) {
      case Character.CONTROL, Character.LINE_SEPARATOR, Character.PARAGRAPH_SEPARATOR -> true;
      case Character.FORMAT -> codePoint != 0x200C && codePoint != 0x200D && !isTag(codePoint);
      case Character.SURROGATE, Character.UNASSIGNED -> true;
      default -> false;
    };
  }

  private static boolean isTag(int codePoint) {
    return codePoint >= 0xE0020 && codePoint <= 0xE007F;
  }

  private static void append(StringBuilder shown, int codePoint) {
    boolean oddSpace = Character.isSpaceChar(codePoint) && codePoint != ' ';
    if (oddSpace || isDisturbing(codePoint)) {
      shown.append(String.format(Locale.ROOT, "\\u%04x", codePoint));
    } else {
      shown.appendCodePoint(codePoint);
    }
  }
}
