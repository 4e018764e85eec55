package evensun.report.section;

import evensun.report.chart.Chart;
import evensun.report.chart.Series;
import evensun.report.page.Block.Plot;
import evensun.report.page.Table;
import evensun.report.page.Table.Column;
import evensun.report.text.Numbers;
import java.util.ArrayList;
import java.util.List;

/** The table behind a chart. */
final class Tables {

  private static final int MOST_ROWS = 200;

  private Tables() {}

  /** A chart with its table. */
  static Plot plot(Chart chart) {
    return new Plot(chart, behind(chart));
  }

  /** The numbers of a chart; of very long ones every so many rows, which the caption says. */
  static Table behind(Chart chart) {
    int points = chart.xs().size();
    int every = (points + MOST_ROWS - 1) / MOST_ROWS;
    List<Column> columns = new ArrayList<>();
    columns.add(Column.numbers(chart.x().label(), chart.x().unit()));
    for (Series series : chart.series()) {
      columns.add(Column.numbers(series.label(), chart.y().unit()));
    }
    List<List<String>> rows = new ArrayList<>();
    for (int i = 0; i < points; i += Math.max(1, every)) {
      rows.add(row(chart, i));
    }
    String caption =
        every > 1
            ? chart.title() + " (every " + every + "th of " + points + " rows; the CSV holds all)"
            : chart.title();
    return new Table("table-" + chart.id(), caption, columns, rows, 0);
  }

  private static List<String> row(Chart chart, int i) {
    boolean share = chart.y().min() == 0 && chart.y().max() == 1;
    List<String> row = new ArrayList<>();
    row.add(Numbers.significant(chart.xs().get(i), 6));
    for (Series series : chart.series()) {
      Double value = series.values().get(i);
      row.add(value == null ? "" : cell(value, share));
    }
    return row;
  }

  /** A share of one to four decimals; anything else to four digits where these say nothing. */
  private static String cell(double value, boolean share) {
    return !share && (Math.abs(value) >= 1000 || value != 0 && Math.abs(value) < 1e-4)
        ? Numbers.significant(value, 4)
        : Numbers.fixed(value, 4);
  }
}
