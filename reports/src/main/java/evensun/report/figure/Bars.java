package evensun.report.figure;

import evensun.report.figure.Shape.Anchor;
import evensun.report.text.Clip;
import java.util.List;

/**
 * Named values as bars to either side of zero.
 *
 * @param rows one bar each
 */
public record Bars(List<Row> rows) implements Figure.Sketch {

  /**
   * A bar.
   *
   * @param label what it stands for
   * @param value its length
   * @param text its value as shown
   */
  public record Row(String label, double value, String text) {}

  private static final double ROW = 26;
  private static final double BAR = 14;

  /** Copies the rows. */
  public Bars {
    rows = List.copyOf(rows);
  }

  @Override
  public Drawing draw(double widthPx) {
    Canvas canvas = new Canvas(widthPx);
    boolean wide = widthPx > 600;
    double left = wide ? 280 : 138;
    double right = widthPx - (wide ? 170 : 84);
    double low = Math.min(0, rows.stream().mapToDouble(Row::value).min().orElse(0));
    double high = Math.max(0, rows.stream().mapToDouble(Row::value).max().orElse(0));
    double pxPerUnit = high > low ? (right - left) / (high - low) : 0;
    double zero = left - low * pxPerUnit;
    for (int i = 0; i < rows.size(); i++) {
      Row row = rows.get(i);
      double y = 4 + i * ROW;
      double x = zero + Math.min(0, row.value()) * pxPerUnit;
      String look = row.value() < 0 ? "fill-down" : "fill-up";
      canvas.label(
          left - 12, y + 12, Clip.to(row.label(), wide ? 40 : 19), Anchor.END, "part-name");
      canvas.box(x, y, Math.max(1, Math.abs(row.value()) * pxPerUnit), BAR, look, "");
      canvas.label(widthPx, y + 12, row.text(), Anchor.END, "part-value");
    }
    canvas.stroke(zero, 0, zero, rows.size() * ROW, "axis");
    return canvas.drawing(rows.size() * ROW + 4);
  }
}
