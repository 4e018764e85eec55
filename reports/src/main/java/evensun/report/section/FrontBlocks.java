package evensun.report.section;

import evensun.report.chart.Axis;
import evensun.report.chart.Chart;
import evensun.report.chart.Kind;
import evensun.report.chart.Series;
import evensun.report.decision.FrontWords;
import evensun.report.page.Block;
import evensun.report.page.Table;
import evensun.report.text.Keys;
import evensun.report.text.Numbers;
import evensun.result.SearchRecord;
import evensun.result.SearchRecord.Front;
import evensun.result.SearchRecord.FrontPoint;
import java.util.ArrayList;
import java.util.List;
import java.util.function.IntPredicate;
import org.jspecify.annotations.Nullable;

/** The designs none of which is better in every aim: the first aim against each of the others. */
final class FrontBlocks {

  private static final double MARGIN = 0.06;

  private final SearchRecord search;
  private final Front front;

  private FrontBlocks(SearchRecord search, Front front) {
    this.search = search;
    this.front = front;
  }

  static List<Block> of(SearchRecord search, Front front) {
    FrontBlocks blocks = new FrontBlocks(search, front);
    List<Block> all = new ArrayList<>();
    FrontWords.of(search).ifPresent(words -> all.add(new Block.Prose(words)));
    for (int aim = 1; aim < front.aims().size(); aim++) {
      Chart chart = blocks.chart(aim);
      all.add(aim == 1 ? new Block.Plot(chart, blocks.table()) : Tables.plot(chart));
    }
    return all;
  }

  private Chart chart(int aim) {
    List<Double> xs = values(aim);
    List<Series> series = new ArrayList<>();
    series.add(points("designs of the front", "muted", i -> i < front.points().size()));
    series.add(points("best compromise", "sub1", i -> i == front.knee()));
    if (front.shown() != front.knee()) {
      series.add(points("reported here", "sub2", i -> i == front.shown()));
    }
    if (front.asDrawn() != null) {
      series.add(points("as drawn", "ink", i -> i == front.points().size()));
    }
    return new Chart(
        aim == 1 ? "front" : "front-" + aim,
        Kind.POINTS,
        "What " + name(0) + " costs in " + name(aim),
        axis(aim, xs),
        axis(0, values(0)),
        xs,
        series,
        List.of());
  }

  private String name(int aim) {
    return Keys.aim(front.aims().get(aim));
  }

  /** One value per design of the front, and the stack as drawn behind them. */
  private List<Double> values(int aim) {
    List<Double> values = new ArrayList<>();
    front.points().forEach(point -> values.add(point.aims().get(aim)));
    if (front.asDrawn() != null) {
      values.add(front.asDrawn().get(aim));
    }
    return values;
  }

  private Series points(String label, String role, IntPredicate belongs) {
    List<Double> all = values(0);
    List<@Nullable Double> row = new ArrayList<>();
    for (int i = 0; i < all.size(); i++) {
      row.add(belongs.test(i) ? all.get(i) : null);
    }
    return new Series(label, role, false, row);
  }

  private Axis axis(int aim, List<Double> values) {
    double low = values.stream().mapToDouble(v -> v).min().orElse(0);
    double high = values.stream().mapToDouble(v -> v).max().orElse(1);
    double margin = Math.max(1e-9, (high - low) * MARGIN);
    String label = name(aim) + ", " + front.wanted().get(aim) + " wanted";
    return Axis.covering(label, front.units().get(aim), low - margin, high + margin);
  }

  private Table table() {
    Table.Builder table =
        new Table.Builder("table-front", "Designs none of which is better in every aim")
            .words("design");
    for (int aim = 0; aim < front.aims().size(); aim++) {
      table.numbers(name(aim), front.units().get(aim));
    }
    List<FrontPoint> points = front.points();
    DesignColumns columns =
        new DesignColumns(
            search,
            points.stream().map(FrontPoint::values).toList(),
            points.stream().map(FrontPoint::choices).toList());
    columns.addTo(table);
    for (int i = 0; i < points.size(); i++) {
      table.row(row(i, points.get(i), columns));
    }
    return table.build();
  }

  private List<String> row(int number, FrontPoint point, DesignColumns columns) {
    List<String> cells = new ArrayList<>();
    cells.add(FrontWords.name(front, number));
    for (int aim = 0; aim < point.aims().size(); aim++) {
      cells.add(Numbers.bare(point.aims().get(aim), front.units().get(aim)));
    }
    cells.addAll(columns.cells(point.values(), point.choices()));
    return cells;
  }
}
