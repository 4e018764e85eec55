package evensun.report.section;

import evensun.report.chart.Axis;
import evensun.report.chart.Chart;
import evensun.report.chart.Kind;
import evensun.report.chart.Series;
import evensun.report.figure.Budget;
import evensun.report.figure.Figure;
import evensun.report.figure.RayPicture;
import evensun.report.figure.Share;
import evensun.report.page.Block;
import evensun.report.page.Section;
import evensun.report.page.Table;
import evensun.report.text.Numbers;
import evensun.result.Outcome;
import evensun.result.Outcome.Losses;
import evensun.result.Outcome.StackEntry;
import evensun.result.Outcome.SubcellOutcome;
import evensun.result.RunResult;
import evensun.result.Textured;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.jspecify.annotations.Nullable;

/** What shaping and scattering at boundaries does: the design beside its flat twin, and rays. */
public final class TextureSection {

  private static final String LIMITS =
      "Rays follow geometrical optics between the films. On features of a few micrometres that"
          + " errs by more than the statistical errors given here, which come from the number of"
          + " rays alone.";

  private TextureSection() {}

  /** The section; absent where every boundary is flat. */
  public static Optional<Section> of(RunResult result) {
    Textured textured = result.textured();
    if (textured == null) {
      return Optional.empty();
    }
    List<Block> blocks = new ArrayList<>();
    blocks.add(new Block.Prose(LIMITS));
    if (textured.section() != null) {
      picture(result, textured.section(), blocks);
    }
    Optional<Budget> shaped = Budget.of(result.found());
    Optional<Budget> flat = Budget.of(textured.flat());
    if (shaped.isPresent() && flat.isPresent()) {
      blocks.add(new Block.Grid(ledger(result, textured, shaped.get(), flat.get()), false));
    }
    reflectance(result.found(), textured.flat(), blocks);
    films(result.found(), blocks);
    return Optional.of(new Section("texture", "Texture", heading(shaped, flat), blocks));
  }

  private static String heading(Optional<Budget> shaped, Optional<Budget> flat) {
    if (shaped.isEmpty() || flat.isEmpty()) {
      return "The same stack with flat boundaries";
    }
    double gain = shaped.get().collectedMaPerCm2() - flat.get().collectedMaPerCm2();
    return "Against flat boundaries the subcells together "
        + (gain < 0 ? "lose " : "gain ")
        + Numbers.ma(Math.abs(gain));
  }

  private static void picture(RunResult result, Textured.Section section, List<Block> blocks) {
    String what =
        "A section through the boundaries with rays of "
            + Numbers.quantity(section.wavelengthNm(), "nm")
            + " from above; the width of a ray is what is left of its light."
            + (RayPicture.isBroken(section) ? " Thick layers are cut short with a break." : "");
    blocks.add(
        new Block.Picture(
            "fig-rays", Figure.of(new RayPicture(section, roles(result.found())), what), what));
  }

  /** Media of subcells in the colours they have everywhere. */
  private static Map<String, String> roles(Outcome outcome) {
    List<String> subcells = outcome.subcells().stream().map(SubcellOutcome::name).toList();
    Map<String, String> roles = new HashMap<>();
    for (StackEntry entry : outcome.stack()) {
      if (entry.subcell() != null) {
        roles.put(entry.name(), Share.subcellRole(subcells.indexOf(entry.subcell())));
      } else if (entry.role().equals("layer")) {
        roles.put(entry.name(), Share.parasiticRole(0));
      }
    }
    return roles;
  }

  private static Table ledger(RunResult result, Textured textured, Budget shaped, Budget flat) {
    Table.Builder table =
        new Table.Builder(
                "table-flat-twin",
                "The same films at the same thickness on flat boundaries, by "
                    + String.join(" and ", textured.flatSolvers()))
            .words("where the light ends")
            .numbers("flat", Numbers.MA)
            .numbers("as designed", Numbers.MA)
            .numbers("±", Numbers.MA)
            .numbers("change", Numbers.MA);
    for (Share share : shaped.shares()) {
      table.row(row(share.label(), flat.of(share.label()), share));
      if (share.role().equals("reflected")) {
        parts(result.found().losses(), table);
      }
    }
    Share total = new Share("total", "", shaped.totalMaPerCm2());
    return table.row(row("total", flat.totalMaPerCm2(), total)).build(1);
  }

  private static void parts(@Nullable Losses losses, Table.Builder table) {
    Double never = losses == null ? null : losses.neverEnteredMaPerCm2();
    if (losses == null || never == null) {
      return;
    }
    double back = losses.reflectedMaPerCm2() - never;
    table.row("of that never entered a thick absorber", "", Numbers.fixed(never, 3), "", "");
    table.row("of that came back out", "", Numbers.fixed(back, 3), "", "");
  }

  private static List<String> row(String label, double flat, Share shaped) {
    return List.of(
        label,
        Numbers.fixed(flat, 3),
        Numbers.fixed(shaped.maPerCm2(), 3),
        Numbers.standardError(shaped.standardErrorMaPerCm2()),
        Numbers.signed(shaped.maPerCm2() - flat, 3));
  }

  private static void reflectance(Outcome shaped, Outcome flat, List<Block> blocks) {
    List<Double> nm = shaped.spectral().wavelengthNm();
    if (nm.size() < 2) {
      return;
    }
    List<Series> series = new ArrayList<>();
    series.add(Series.of("as designed", "ink", shaped.spectral().reflectance()));
    series.add(Series.of("flat", "reflected", flat.spectral().reflectance()).asDashed());
    List<Double> never = shaped.spectral().neverEntered();
    if (never != null) {
      series.add(Series.of("never entered", "sub1", never));
    }
    blocks.add(
        Tables.plot(
            new Chart(
                "flat-twin",
                Kind.LINES,
                "Reflectance as designed, and with flat boundaries (dashed)",
                Axis.linear("wavelength", "nm", nm.get(0), nm.get(nm.size() - 1)),
                Axis.linear("reflectance", "", 0, highest(series)),
                nm,
                series,
                List.of())));
  }

  /** A round number above every value. */
  private static double highest(List<Series> series) {
    double most =
        series.stream()
            .flatMap(s -> s.values().stream())
            .mapToDouble(v -> v == null ? 0 : v)
            .max()
            .orElse(1);
    return Math.min(1, Math.ceil(most * 10) / 10);
  }

  private static void films(Outcome outcome, List<Block> blocks) {
    Table.Builder table =
        new Table.Builder("table-facet-films", "Thickness of the films on facets")
            .words("film")
            .numbers("along the facet normal", "nm")
            .numbers("along the substrate normal", "nm");
    int rows = 0;
    for (StackEntry entry : outcome.stack()) {
      Double along = entry.alongSubstrateNormalNm();
      Double nm = entry.thicknessNm();
      if (along != null && nm != null) {
        table.row(entry.name(), Numbers.fixed(nm, 1), Numbers.fixed(along, 1));
        rows++;
      }
    }
    if (rows > 0) {
      blocks.add(new Block.Grid(table.build(), false));
    }
  }
}
