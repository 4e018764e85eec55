package evensun.report.chart;

import evensun.report.figure.Drawing;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.IntStream;
import org.jspecify.annotations.Nullable;

/**
 * A chart as data; its table and its two drawings come from it.
 *
 * @param id unique on the page, usable in a link
 * @param kind how the series are shown
 * @param title what it shows, with its finding
 * @param x the x axis
 * @param y the y axis
 * @param xs x of each point
 * @param series the rows
 * @param marks upright lines
 */
public record Chart(
    String id,
    Kind kind,
    String title,
    Axis x,
    Axis y,
    List<Double> xs,
    List<Series> series,
    List<Mark> marks) {

  /** Checks that every series has one value per x. */
  public Chart {
    xs = List.copyOf(xs);
    series = List.copyOf(series);
    marks = List.copyOf(marks);
    for (Series row : series) {
      if (row.values().size() != xs.size()) {
        throw new IllegalArgumentException(
            "chart "
                + id
                + ": series "
                + row.label()
                + " has "
                + row.values().size()
                + " values for "
                + xs.size()
                + " points");
      }
    }
  }

  /** The chart with so many of its points, the first and the last among them. */
  Chart thinned(int points) {
    int last = xs.size() - 1;
    List<Integer> kept =
        IntStream.range(0, points)
            .map(i -> (int) ((long) i * last / (points - 1)))
            .boxed()
            .toList();
    List<Series> rows =
        series.stream()
            .map(s -> new Series(s.label(), s.role(), s.dashed(), pick(s.values(), kept)))
            .toList();
    return new Chart(id, kind, title, x, y, pick(xs, kept), rows, marks);
  }

  private static <T extends @Nullable Object> List<T> pick(List<T> from, List<Integer> kept) {
    List<T> picked = new ArrayList<>(kept.size());
    kept.forEach(i -> picked.add(from.get(i)));
    return picked;
  }

  /** The chart drawn for those without JavaScript and for paper, so many px wide. */
  public Drawing drawing(double widthPx) {
    return new ChartDrawing(this).draw(widthPx);
  }
}
