package evensun.report.figure;

import evensun.report.figure.Shape.Anchor;
import evensun.report.text.Clip;
import evensun.report.text.Numbers;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

/**
 * From the available current, loss by loss, down to what the subcells share.
 *
 * @param budget the light, split
 */
public record Waterfall(Budget budget) implements Figure.Sketch {

  private static final double ROW = 25;
  private static final double BAR = 17;
  private static final double VALUE = 58;
  private static final int MOST_LOSSES = 14;

  private record Row(String label, String look, double from, double to, String value) {}

  @Override
  public Drawing draw(double widthPx) {
    Canvas canvas = new Canvas(widthPx);
    double left = widthPx > 600 ? 232 : 128;
    double pxPerMa = (widthPx - left - VALUE) / budget.incidentMaPerCm2();
    List<Row> rows = rows();
    for (int i = 0; i < rows.size(); i++) {
      row(canvas, rows, i, left, pxPerMa, widthPx);
    }
    return canvas.drawing(rows.size() * ROW + 4);
  }

  private static void row(
      Canvas canvas, List<Row> rows, int i, double left, double pxPerMa, double widthPx) {
    Row row = rows.get(i);
    double y = 2 + i * ROW;
    double x = left + Math.min(row.from(), row.to()) * pxPerMa;
    double wide = Math.abs(row.to() - row.from()) * pxPerMa;
    String label = Clip.to(row.label(), left > 200 ? 34 : 18);
    canvas.label(left - 10, y + BAR - 4, label, Anchor.END, "part-name");
    canvas.box(x, y, Math.max(wide, 1), BAR, row.look(), row.label() + " " + row.value());
    if (i + 1 < rows.size()) {
      double end = left + row.to() * pxPerMa;
      canvas.stroke(end, y, end, y + ROW + BAR, "leader");
    }
    canvas.label(widthPx, y + BAR - 4, row.value(), Anchor.END, "part-value");
  }

  private List<Row> rows() {
    List<Row> rows = new ArrayList<>();
    double at = budget.incidentMaPerCm2();
    rows.add(new Row("available", "fill-available", 0, at, Numbers.fixed(at, 2)));
    for (Share loss : grouped()) {
      double next = at - loss.maPerCm2();
      String value = Numbers.fixed(-loss.maPerCm2(), 2);
      rows.add(new Row(loss.label(), "fill-" + loss.role(), at, next, value));
      at = next;
    }
    for (Share share : budget.shares()) {
      if (share.collected()) {
        double next = at - share.maPerCm2();
        String value = Numbers.fixed(share.maPerCm2(), 2);
        rows.add(new Row(share.label(), "fill-" + share.role(), at, next, value));
        at = next;
      }
    }
    return rows;
  }

  /** Losses in the light's order; where there are very many, the smallest as one. */
  private List<Share> grouped() {
    List<Share> losses = budget.losses();
    if (losses.size() <= MOST_LOSSES) {
      return losses;
    }
    List<Share> largest =
        losses.stream()
            .sorted(Comparator.comparingDouble(Share::maPerCm2).reversed())
            .limit(MOST_LOSSES - 1)
            .toList();
    List<Share> shown = new ArrayList<>(losses.stream().filter(largest::contains).toList());
    List<Share> rest = losses.stream().filter(loss -> !largest.contains(loss)).toList();
    double sum = rest.stream().mapToDouble(Share::maPerCm2).sum();
    shown.add(new Share(rest.size() + " smaller losses", "parasitic", sum));
    return shown;
  }
}
