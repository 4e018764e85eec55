package evensun.report.section;

import evensun.report.chart.Axis;
import evensun.report.chart.Chart;
import evensun.report.chart.Kind;
import evensun.report.chart.Series;
import evensun.report.figure.Budget;
import evensun.report.figure.Figure;
import evensun.report.figure.LightBar;
import evensun.report.figure.Share;
import evensun.report.figure.Waterfall;
import evensun.report.page.Block;
import evensun.report.page.Section;
import evensun.report.page.Table;
import evensun.report.text.Clip;
import evensun.report.text.Numbers;
import evensun.result.Outcome;
import evensun.result.RunResult;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import org.jspecify.annotations.Nullable;

/** Where every mA cm⁻² goes. */
public final class LightSection {

  private LightSection() {}

  /** The section; absent without spectra and currents. */
  public static Optional<Section> of(RunResult result) {
    Optional<Budget> found = Budget.of(result.found());
    List<Block> blocks = new ArrayList<>();
    found.ifPresent(budget -> currents(result, budget, blocks));
    spectra(result, blocks);
    if (blocks.isEmpty()) {
      return Optional.empty();
    }
    String heading = found.map(LightSection::heading).orElse("Where the light goes");
    return Optional.of(new Section("light", "Light", heading, blocks));
  }

  private static String heading(Budget budget) {
    return budget.losses().stream()
        .max(Comparator.comparingDouble(Share::maPerCm2))
        .map(LightSection::costsMost)
        .orElse("Every photon is collected");
  }

  private static String costsMost(Share loss) {
    String what =
        switch (loss.role()) {
          case "reflected" -> "Reflection";
          case "exit" -> "Light " + Clip.to(loss.label(), 50);
          default -> "Absorption in " + Clip.to(loss.label(), 50);
        };
    return what + " costs most: " + Numbers.ma(loss.maPerCm2());
  }

  private static void currents(RunResult result, Budget found, List<Block> blocks) {
    Outcome asDrawn = result.asDrawn();
    @Nullable Budget drawn = asDrawn == null ? null : Budget.of(asDrawn).orElse(null);
    String bars =
        "The available current, split in the order the light meets the layers"
            + (drawn == null ? "." : ": as drawn above, found below.");
    blocks.add(new Block.Picture("fig-light", Figure.of(new LightBar(drawn, found), bars), bars));
    String steps = "From the available current, loss by loss, to what the subcells share, mA cm⁻².";
    blocks.add(new Block.Picture("fig-waterfall", Figure.of(new Waterfall(found), steps), steps));
    blocks.add(new Block.Grid(ledger(drawn, found), false));
  }

  /** The ledger with its total, in the light's order. */
  private static Table ledger(@Nullable Budget drawn, Budget found) {
    Table.Builder table =
        new Table.Builder("table-ledger", "The ledger: every part of the available current");
    table.words("where the light ends").words("kind");
    if (drawn != null) {
      table.numbers("as drawn", Numbers.MA);
    }
    table.numbers("found", Numbers.MA);
    if (found.isStatistical()) {
      table.numbers("±", Numbers.MA);
    }
    if (drawn != null) {
      table.numbers("change", Numbers.MA);
    }
    table.numbers("of available", "%");
    for (Share share : found.shares()) {
      String kind = share.collected() ? "subcell" : "loss";
      table.row(row(share, kind, drawn == null ? null : drawn.of(share.label()), found));
    }
    Share total = new Share("total", "", found.totalMaPerCm2());
    String available = "available " + Numbers.fixed(found.incidentMaPerCm2(), 3);
    table.row(row(total, available, drawn == null ? null : drawn.totalMaPerCm2(), found));
    return table.build(1);
  }

  private static List<String> row(Share share, String kind, @Nullable Double drawn, Budget budget) {
    List<String> cells = new ArrayList<>(List.of(share.label(), kind));
    if (drawn != null) {
      cells.add(Numbers.fixed(drawn, 3));
    }
    cells.add(Numbers.fixed(share.maPerCm2(), 3));
    if (budget.isStatistical()) {
      cells.add(Numbers.standardError(share.standardErrorMaPerCm2()));
    }
    if (drawn != null) {
      cells.add(Numbers.signed(share.maPerCm2() - drawn, 3));
    }
    cells.add(Numbers.fixed(share.maPerCm2() / budget.incidentMaPerCm2() * 100, 2));
    return cells;
  }

  private static void spectra(RunResult result, List<Block> blocks) {
    Outcome found = result.found();
    List<Double> nm = found.spectral().wavelengthNm();
    if (nm.isEmpty()) {
      return;
    }
    List<Series> all = new ArrayList<>(Spectra.subcells(found));
    all.addAll(Spectra.losses(found));
    Chart chart = chart("spectrum", Kind.STACK, "Where the light goes, by wavelength", nm, all);
    if (nm.size() == 1) {
      blocks.add(new Block.Grid(Tables.behind(chart), false));
      return;
    }
    blocks.add(Tables.plot(chart));
    Outcome drawn = result.asDrawn();
    if (drawn != null && drawn.spectral().wavelengthNm().equals(nm)) {
      List<Series> both = new ArrayList<>(Spectra.subcells(found));
      Spectra.subcells(drawn)
          .forEach(s -> both.add(new Series(s.label() + ", as drawn", s.role(), true, s.values())));
      blocks.add(
          Tables.plot(
              chart(
                  "subcell-spectra",
                  Kind.LINES,
                  "What each subcell absorbs: found, and as drawn (dashed)",
                  nm,
                  both)));
    }
  }

  private static Chart chart(
      String id, Kind kind, String title, List<Double> nm, List<Series> series) {
    Axis x = Axis.linear("wavelength", "nm", nm.get(0), nm.get(nm.size() - 1));
    Axis y = Axis.linear("share of the incident light", "", 0, 1);
    return new Chart(id, kind, title, x, y, nm, series, List.of());
  }
}
