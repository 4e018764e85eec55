package evensun.report.chart;

import evensun.report.figure.Figure;
import java.util.List;

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

  /** The chart drawn for those without JavaScript and for paper. */
  public Figure figure() {
    return Figure.of(new ChartDrawing(this), title);
  }
}
