package evensun.report.text;

import java.util.regex.Pattern;

/** Text of unknown origin made safe for a terminal or a ticket. */
public final class Plain {

  /** Control characters, and those that turn the direction of what follows. */
  private static final Pattern UNSAFE =
      Pattern.compile("[\\p{Cntrl}\\u200e\\u200f\\u202a-\\u202e\\u2066-\\u2069]+");

  private static final Pattern MARKDOWN = Pattern.compile("([\\\\`*_{}\\[\\]<>#|~!])");

  private Plain() {}

  /** One line without control characters and no-break spaces. */
  public static String line(String text) {
    return UNSAFE.matcher(text).replaceAll(" ").replace('\u00a0', ' ').strip();
  }

  /** One line that Markdown shows as it is. */
  public static String markdown(String text) {
    return MARKDOWN.matcher(line(text)).replaceAll("\\\\$1");
  }
}
