package evensun.report.section;

import evensun.report.chart.Axis;
import evensun.report.chart.Chart;
import evensun.report.chart.Kind;
import evensun.report.chart.Series;
import evensun.report.figure.Bars;
import evensun.report.figure.Figure;
import evensun.report.figure.Share;
import evensun.report.page.Block;
import evensun.report.page.Section;
import evensun.report.page.Table;
import evensun.report.text.Clip;
import evensun.report.text.Keys;
import evensun.report.text.Numbers;
import evensun.result.Outcome.SubcellOutcome;
import evensun.result.RunResult;
import evensun.result.SearchRecord;
import evensun.result.SearchRecord.VariableRecord;
import evensun.result.Sensitivity;
import evensun.result.WhatIf;
import java.util.ArrayList;
import java.util.List;
import java.util.Objects;
import java.util.Optional;

/** What a small change of each varied quantity does, and the aim across its range. */
public final class SensitivitySection {

  private SensitivitySection() {}

  /** The section; absent without sensitivities and what-if curves. */
  public static Optional<Section> of(RunResult result) {
    List<Sensitivity> rows =
        Objects.requireNonNullElse(result.sensitivities(), List.<Sensitivity>of());
    List<WhatIf> curves = Objects.requireNonNullElse(result.whatIf(), List.<WhatIf>of());
    List<Block> blocks = new ArrayList<>();
    String unit = unit(result);
    if (!rows.isEmpty()) {
      blocks.add(bars(rows, unit));
      blocks.add(new Block.Grid(table(result, rows, unit), false));
    }
    List<Block.StripCurve> strip =
        curves.stream().filter(c -> c.value().size() > 1).map(c -> curve(result, c)).toList();
    if (!strip.isEmpty()) {
      blocks.add(new Block.Subheading("What if one value changes and the others stay"));
      blocks.add(new Block.Strip(strip));
    }
    return blocks.isEmpty()
        ? Optional.empty()
        : Optional.of(new Section("sensitivities", "Sensitivities", heading(rows, unit), blocks));
  }

  private static String unit(RunResult result) {
    SearchRecord search = result.search();
    return search == null ? Numbers.MA : search.aimUnit();
  }

  private static String heading(List<Sensitivity> rows, String unit) {
    if (rows.isEmpty()) {
      return "What a changed value would do";
    }
    Sensitivity most = rows.get(0);
    return "Most sensitive: "
        + Clip.to(Keys.words(most.key()), 60)
        + "; ±"
        + Numbers.quantity(most.tolerance(), most.unit())
        + " costs up to "
        + Numbers.quantity(Math.max(0, -most.toleranceAimChange()), unit);
  }

  private static Block bars(List<Sensitivity> rows, String unit) {
    List<Bars.Row> bars = new ArrayList<>();
    for (Sensitivity s : rows) {
      String label = Keys.words(s.key()) + " ±" + Numbers.quantity(s.tolerance(), s.unit());
      bars.add(
          new Bars.Row(
              label, s.toleranceAimChange(), Numbers.quantity(s.toleranceAimChange(), unit)));
    }
    String what =
        "What the aim loses when one quantity misses by a usual tolerance (5 % of a thickness, 0.01 eV"
            + " of a bandgap), the others kept.";
    return new Block.Picture("fig-sensitivities", Figure.of(new Bars(bars), what), what);
  }

  private static Table table(RunResult result, List<Sensitivity> rows, String unit) {
    List<SubcellOutcome> subcells = result.found().subcells();
    boolean power = rows.stream().anyMatch(s -> s.efficiencyPercent() != null);
    Table.Builder table =
        new Table.Builder("table-sensitivities", "Sensitivities, largest first")
            .words("quantity")
            .words("change")
            .numbers("aim, more", unit)
            .numbers("aim, less", unit)
            .words("tolerance")
            .numbers("aim within it", unit);
    subcells.forEach(subcell -> table.numbers(subcell.name() + ", more", Numbers.MA));
    if (power) {
      table.numbers("efficiency, more", "%");
    }
    for (Sensitivity s : rows) {
      List<String> cells = new ArrayList<>();
      cells.add(Keys.words(s.key()));
      cells.add(Numbers.quantity(s.change(), s.unit()));
      cells.add(Numbers.signed(s.aimChange(), 4));
      cells.add(Numbers.signed(s.aimChangeDown(), 4));
      cells.add("±" + Numbers.quantity(s.tolerance(), s.unit()));
      cells.add(Numbers.signed(s.toleranceAimChange(), 3));
      for (SubcellOutcome subcell : subcells) {
        Double change = s.subcellMaPerCm2().get(subcell.name());
        cells.add(change == null ? "" : Numbers.signed(change, 4));
      }
      if (power) {
        Double change = s.efficiencyPercent();
        cells.add(change == null ? "" : Numbers.signed(change, 4));
      }
      table.row(cells);
    }
    return table.build();
  }

  private static Block.StripCurve curve(RunResult result, WhatIf whatIf) {
    List<Series> series = new ArrayList<>();
    List<SubcellOutcome> subcells = result.found().subcells();
    boolean currents = unit(result).equals(Numbers.MA);
    for (int i = 0; currents && i < subcells.size(); i++) {
      List<Double> values = whatIf.subcellMaPerCm2().get(subcells.get(i).name());
      if (values != null) {
        series.add(Series.of(subcells.get(i).name(), Share.subcellRole(i), values));
      }
    }
    boolean weakest = weakest(result) && series.size() == subcells.size();
    if (!weakest) {
      series.add(Series.of("aim", "ink", whatIf.aim()).asDashed());
    }
    Chart chart =
        new Chart(
            "what-if-" + index(result, whatIf.key()),
            Kind.LINES,
            Keys.words(whatIf.key()),
            Axis.linear(
                Keys.property(whatIf.key()),
                whatIf.unit(),
                whatIf.value().get(0),
                whatIf.value().get(whatIf.value().size() - 1)),
            vertical(series, unit(result)),
            whatIf.value(),
            series,
            List.of());
    int decimals = whatIf.unit().equals("eV") ? 3 : 1;
    return new Block.StripCurve(
        chart, found(result, whatIf), decimals, weakest, Tables.behind(chart));
  }

  /** Whether the aim is the smallest of the subcell currents. */
  private static boolean weakest(RunResult result) {
    SearchRecord search = result.search();
    return search == null || search.aim().equals("matched-current");
  }

  private static int index(RunResult result, String key) {
    List<WhatIf> curves = Objects.requireNonNullElse(result.whatIf(), List.<WhatIf>of());
    for (int i = 0; i < curves.size(); i++) {
      if (curves.get(i).key().equals(key)) {
        return i + 1;
      }
    }
    return 0;
  }

  private static Axis vertical(List<Series> series, String unit) {
    double low = Double.POSITIVE_INFINITY;
    double high = Double.NEGATIVE_INFINITY;
    for (Series row : series) {
      for (Double value : row.values()) {
        if (value != null) {
          low = Math.min(low, value);
          high = Math.max(high, value);
        }
      }
    }
    double margin = Math.max(1e-3, (high - low) * 0.08);
    return Axis.covering(
        unit.equals(Numbers.MA) ? "current" : "aim", unit, low - margin / 2, high + margin / 2);
  }

  private static double found(RunResult result, WhatIf whatIf) {
    SearchRecord search = result.search();
    double middle = whatIf.value().get(whatIf.value().size() / 2);
    return search == null
        ? middle
        : search.variables().stream()
            .filter(v -> v.key().equals(whatIf.key()))
            .mapToDouble(VariableRecord::found)
            .findFirst()
            .orElse(middle);
  }
}
