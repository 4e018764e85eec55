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

  /** How the weakest subcell changes from the first angle to the last. */
  private static String heading(Angular angular) {
    int last = angular.angleDeg().size() - 1;
    double first = weakest(angular, 0);
    double end = weakest(angular, last);
    String angle = Numbers.trimmed(angular.angleDeg().get(last), 1) + "°";
    return "At "
        + angle
        + " the weakest subcell passes "
        + Numbers.ma(end)
        + ", "
        + Numbers.fixed(Math.abs(end - first) / Math.max(first, 1e-12) * 100, 1)
        + " % "
        + (end < first ? "less" : "more")
        + " than at "
        + Numbers.trimmed(angular.angleDeg().get(0), 1)
        + "°";
  }

  private static double weakest(Angular angular, int index) {
    return angular.subcellMaPerCm2().values().stream()
        .mapToDouble(values -> values.get(index))
        .min()
        .orElse(0);
  }
}
