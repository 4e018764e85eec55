package evensun.report.figure;

/** The commands of an SVG path, to a tenth of a px: letters and numbers, and nothing else. */
public final class Path {

  private static final double FARTHEST_PX = 1e6;

  private final StringBuilder text = new StringBuilder();

  /** Moves to a point. */
  public Path move(double x, double y) {
    return add('M', x, y);
  }

  /** Draws a line to a point. */
  public Path line(double x, double y) {
    return add('L', x, y);
  }

  /** Closes the outline. */
  public Path close() {
    text.append('Z');
    return this;
  }

  private Path add(char command, double x, double y) {
    text.append(command);
    append(text, x);
    text.append(' ');
    append(text, y);
    return this;
  }

  /** Whether nothing was drawn. */
  public boolean isEmpty() {
    return text.length() == 0;
  }

  @Override
  public String toString() {
    return text.toString();
  }

  /** A coordinate, to a tenth of a px. */
  public static String number(double value) {
    StringBuilder text = new StringBuilder(8);
    append(text, value);
    return text.toString();
  }

  private static void append(StringBuilder text, double value) {
    long tenths = Math.round(Math.max(-FARTHEST_PX, Math.min(FARTHEST_PX, value)) * 10);
    if (tenths < 0) {
      text.append('-');
      tenths = -tenths;
    }
    text.append(tenths / 10);
    int rest = (int) (tenths % 10);
    if (rest != 0) {
      text.append('.').append((char) ('0' + rest));
    }
  }
}
