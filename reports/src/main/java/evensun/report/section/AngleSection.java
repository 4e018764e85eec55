package evensun.report.section;

import evensun.report.chart.Axis;
import evensun.report.chart.Chart;
import evensun.report.chart.Kind;
import evensun.report.chart.Series;
import evensun.report.figure.Share;
import evensun.report.page.Block;
import evensun.report.page.Section;
import evensun.report.text.Numbers;
import evensun.result.Angular;
import evensun.result.Outcome.SubcellOutcome;
import evensun.result.RunResult;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** Currents against the angle of incidence. */
public final class AngleSection {

  private static final double LOW_SUN_DEG = 60;

  private AngleSection() {}

  /** The section; absent without more than one angle. */
  public static Optional<Section> of(RunResult result) {
    Angular angular = result.angular();
    if (angular == null || angular.angleDeg().size() < 2) {
      return Optional.empty();
    }
    List<Series> series = new ArrayList<>();
    List<SubcellOutcome> subcells = result.found().subcells();
    for (int i = 0; i < subcells.size(); i++) {
      List<Double> values = angular.subcellMaPerCm2().get(subcells.get(i).name());
      if (values != null) {
        series.add(Series.of(subcells.get(i).name(), Share.subcellRole(i), values));
      }
    }
    series.add(Series.of("reflected", "muted", angular.reflectedMaPerCm2()).asDashed());
    Block block = Tables.plot(chart(angular, series));
    return Optional.of(new Section("angle", "Angle", heading(angular), List.of(block)));
  }

  private static Chart chart(Angular angular, List<Series> series) {
    double high = 0;
    for (Series row : series) {
      for (Double value : row.values()) {
        high = Math.max(high, value == null ? 0 : value);
      }
    }
    List<Double> angles = angular.angleDeg();
    return new Chart(
        "angle",
        Kind.LINES,
        "Currents against the angle of incidence, the irradiance on the cell plane kept",
        Axis.linear("angle of incidence", "°", angles.get(0), angles.get(angles.size() - 1)),
        Axis.covering("current", Numbers.MA, 0, high),
        angles,
        series,
        List.of());
  }

  /** How the weakest subcell changes from the first angle to that nearest to a low sun. */
  private static String heading(Angular angular) {
    int low = 0;
    for (int i = 1; i < angular.angleDeg().size(); i++) {
      low = distance(angular, i) < distance(angular, low) ? i : low;
    }
    double first = weakest(angular, 0);
    double then = weakest(angular, low);
    return "At "
        + degrees(angular, low)
        + " the weakest subcell passes "
        + Numbers.ma(then)
        + ", "
        + Numbers.fixed(Math.abs(then - first) / Math.max(first, 1e-12) * 100, 1)
        + "\u00a0% "
        + (then < first ? "less" : "more")
        + " than at "
        + degrees(angular, 0);
  }

  private static double distance(Angular angular, int index) {
    return Math.abs(angular.angleDeg().get(index) - LOW_SUN_DEG);
  }

  private static String degrees(Angular angular, int index) {
    return Numbers.trimmed(angular.angleDeg().get(index), 1) + "°";
  }

  private static double weakest(Angular angular, int index) {
    return angular.subcellMaPerCm2().values().stream()
        .mapToDouble(values -> values.get(index))
        .min()
        .orElse(0);
  }
}
