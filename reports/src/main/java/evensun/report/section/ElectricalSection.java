package evensun.report.section;

import evensun.report.chart.Axis;
import evensun.report.chart.Chart;
import evensun.report.chart.Kind;
import evensun.report.chart.Mark;
import evensun.report.chart.Series;
import evensun.report.page.Block;
import evensun.report.page.Section;
import evensun.report.page.Table;
import evensun.report.text.Numbers;
import evensun.result.Electrical;
import evensun.result.Electrical.CurvePoint;
import evensun.result.Electrical.LadderStep;
import evensun.result.Electrical.MismatchPoint;
import evensun.result.Electrical.SubcellElectrical;
import evensun.result.Outcome;
import evensun.result.RunResult;
import java.util.ArrayList;
import java.util.List;
import java.util.Objects;
import java.util.Optional;
import org.jspecify.annotations.Nullable;

/** The electrical side: J–V, what mismatch costs, from the limit to the device. */
public final class ElectricalSection {

  private ElectricalSection() {}

  /** The section; absent without an electrical model. */
  public static Optional<Section> of(RunResult result) {
    Electrical electrical = result.found().electrical();
    if (electrical == null) {
      return Optional.empty();
    }
    List<Block> blocks = new ArrayList<>();
    blocks.add(
        new Block.Prose(
            "Cell temperature "
                + Numbers.withUnit(Numbers.trimmed(electrical.temperatureK(), 2), "K")
                + "; "
                + electrical.pairing()
                + "."));
    if (electrical.curve().size() > 1) {
      blocks.add(Tables.plot(curve(electrical, drawn(result))));
    }
    blocks.add(new Block.Grid(subcells(electrical), false));
    if (electrical.mismatchCost().size() > 1) {
      blocks.add(Tables.plot(mismatch(result, electrical)));
    }
    if (electrical.ladder().size() > 1) {
      blocks.add(new Block.Grid(ladder(electrical), false));
    }
    return Optional.of(new Section("electrical", "Power", heading(electrical), blocks));
  }

  private static @Nullable Electrical drawn(RunResult result) {
    Outcome drawn = result.asDrawn();
    return drawn == null ? null : drawn.electrical();
  }

  private static String heading(Electrical electrical) {
    String efficiency = Numbers.quantity(electrical.efficiencyPercent(), "%");
    double lost = electrical.independentEfficiencyPercent() - electrical.efficiencyPercent();
    if (electrical.connection().equals("independent")) {
      return "Efficiency " + efficiency + ", each subcell at its own maximum power";
    }
    String cost = lost < 0.005 ? "nothing" : Numbers.fixed(lost, 2) + " points";
    return "Efficiency "
        + efficiency
        + "; the "
        + electrical.connection()
        + " connection costs "
        + cost
        + " against independent subcells";
  }

  private static Chart curve(Electrical found, @Nullable Electrical drawn) {
    List<Double> volts = found.curve().stream().map(CurvePoint::voltageV).toList();
    List<Series> series = new ArrayList<>();
    series.add(
        Series.of(
            "found", "ink", found.curve().stream().map(CurvePoint::currentMaPerCm2).toList()));
    if (drawn != null && drawn.curve().size() > 1) {
      series.add(new Series("as drawn", "muted", true, along(volts, drawn.curve())));
    }
    double top =
        series.stream()
            .flatMap(s -> s.values().stream())
            .filter(Objects::nonNull)
            .mapToDouble(Double::doubleValue)
            .max()
            .orElse(1);
    Axis x = Axis.linear("voltage", "V", 0, volts.get(volts.size() - 1));
    Axis y = Axis.covering("current", Numbers.MA, 0, top * 1.03);
    return new Chart("jv", Kind.LINES, curveTitle(found), x, y, volts, series, List.of());
  }

  /** A curve read off at other voltages, linearly between its points; null beyond its ends. */
  private static List<@Nullable Double> along(List<Double> volts, List<CurvePoint> curve) {
    List<@Nullable Double> values = new ArrayList<>();
    for (double volt : volts) {
      values.add(at(volt, curve));
    }
    return values;
  }

  private static @Nullable Double at(double volt, List<CurvePoint> curve) {
    for (int i = 1; i < curve.size(); i++) {
      CurvePoint a = curve.get(i - 1);
      CurvePoint b = curve.get(i);
      if (a.voltageV() <= volt && volt <= b.voltageV() && a.voltageV() < b.voltageV()) {
        double part = (volt - a.voltageV()) / (b.voltageV() - a.voltageV());
        return a.currentMaPerCm2() + part * (b.currentMaPerCm2() - a.currentMaPerCm2());
      }
    }
    return null;
  }

  private static String curveTitle(Electrical e) {
    StringBuilder text = new StringBuilder("Current against voltage");
    if (e.vocV() != null && e.jscMaPerCm2() != null && e.fillFactor() != null) {
      text.append(": open circuit ")
          .append(Numbers.withUnit(Numbers.fixed(e.vocV(), 3), "V"))
          .append(", short circuit ")
          .append(Numbers.ma(e.jscMaPerCm2()))
          .append(", fill factor ")
          .append(Numbers.fixed(e.fillFactor(), 3));
    }
    return text.toString();
  }

  private static Table subcells(Electrical electrical) {
    Table.Builder table =
        new Table.Builder("table-electrical", "Each subcell at the device's maximum power")
            .words("subcell")
            .numbers("bandgap", "eV")
            .numbers("saturation current", Numbers.MA)
            .numbers("external radiative efficiency", "")
            .numbers("ideality", "")
            .numbers("open circuit", "V")
            .numbers("operating voltage", "V")
            .numbers("operating current", Numbers.MA)
            .numbers("gain per mA cm⁻²", "%");
    for (SubcellElectrical s : electrical.subcells()) {
      Double gain = s.efficiencyGainPerMaPerCm2();
      table.row(
          s.name(),
          Numbers.fixed(s.bandgapEv(), 3),
          Numbers.significant(s.saturationMaPerCm2(), 3),
          Numbers.significant(s.externalRadiativeEfficiency(), 3),
          Numbers.trimmed(s.idealityFactor(), 2),
          Numbers.fixed(s.vocV(), 3),
          Numbers.fixed(s.operatingVoltageV(), 3),
          Numbers.fixed(s.operatingMaPerCm2(), 2),
          gain == null ? "" : Numbers.signed(gain, 2));
    }
    return table.build();
  }

  private static Chart mismatch(RunResult result, Electrical electrical) {
    List<MismatchPoint> points = electrical.mismatchCost();
    List<Double> xs = points.stream().map(MismatchPoint::differenceMaPerCm2).toList();
    List<Double> ys = points.stream().map(MismatchPoint::efficiencyPercent).toList();
    double low = ys.stream().mapToDouble(Double::doubleValue).min().orElse(0);
    double high = ys.stream().mapToDouble(Double::doubleValue).max().orElse(1);
    double margin = Math.max(0.05, (high - low) * 0.1);
    Axis x =
        Axis.linear("first minus second subcell", Numbers.MA, xs.get(0), xs.get(xs.size() - 1));
    Axis y = Axis.covering("efficiency", "%", low, high + margin);
    return new Chart(
        "mismatch",
        Kind.LINES,
        "What mismatch costs: between balance and the worst shown, "
            + Numbers.fixed(high - low, 2)
            + " points",
        x,
        y,
        xs,
        List.of(Series.of("efficiency", "ink", ys)),
        here(result));
  }

  private static List<Mark> here(RunResult result) {
    var subcells = result.found().subcells();
    if (subcells.size() < 2) {
      return List.of();
    }
    Double first = subcells.get(0).photocurrentMaPerCm2();
    Double second = subcells.get(1).photocurrentMaPerCm2();
    return first == null || second == null
        ? List.of()
        : List.of(new Mark(first - second, "this design"));
  }

  private static Table ladder(Electrical electrical) {
    Table.Builder table =
        new Table.Builder("table-ladder", "From the detailed-balance limit to the device")
            .words("step")
            .numbers("efficiency", "%")
            .numbers("as current", Numbers.MA);
    double sum = 0;
    for (int i = 0; i < electrical.ladder().size(); i++) {
      LadderStep step = electrical.ladder().get(i);
      sum += step.efficiencyPercent();
      table.row(
          step.label(),
          i == 0
              ? Numbers.fixed(step.efficiencyPercent(), 2)
              : Numbers.signed(step.efficiencyPercent(), 2),
          step.maPerCm2() == null ? "" : Numbers.signed(step.maPerCm2(), 2));
    }
    table.row("device", Numbers.fixed(sum, 2), "");
    return table.build(1);
  }
}
