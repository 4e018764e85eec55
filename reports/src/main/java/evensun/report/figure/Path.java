package evensun.report.figure;

/** Writes the commands of an SVG path, to a tenth of a px. */
public final class Path {

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
    text.append(command).append(number(x)).append(' ').append(number(y));
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
    long tenths = Math.round(value * 10);
    String sign = tenths < 0 ? "-" : "";
    long whole = Math.abs(tenths) / 10;
    long rest = Math.abs(tenths) % 10;
    return rest == 0 ? sign + whole : sign + whole + "." + rest;
  }
}
