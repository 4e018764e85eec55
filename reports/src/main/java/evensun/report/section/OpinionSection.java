package evensun.report.section;

import evensun.report.page.Block;
import evensun.report.page.Section;
import evensun.report.page.Table;
import evensun.report.text.Numbers;
import evensun.result.Opinion;
import evensun.result.RunResult;
import evensun.result.SearchRecord;
import java.util.List;
import java.util.Objects;
import java.util.Optional;

/** The found design evaluated in other ways: an error budget. */
public final class OpinionSection {

  private static final double LEAST_SHOWN = 1e-3;

  private OpinionSection() {}

  /** The section; absent without a second opinion. */
  public static Optional<Section> of(RunResult result) {
    List<Opinion> opinions = Objects.requireNonNullElse(result.secondOpinion(), List.<Opinion>of());
    if (opinions.isEmpty()) {
      return Optional.empty();
    }
    SearchRecord search = result.search();
    String unit = search == null ? Numbers.MA : search.aimUnit();
    List<Block> blocks =
        List.of(
            new Block.Prose(
                "The same design, computed in other ways and with other data. Each line changes one"
                    + " thing; the differences say how far the headline depends on it, and nothing"
                    + " about what was not tried."),
            new Block.Grid(table(opinions, unit), false));
    return Optional.of(
        new Section("second-opinion", "Second opinion", heading(opinions, unit), blocks));
  }

  private static String heading(List<Opinion> opinions, String unit) {
    Optional<String> numerics =
        largest(opinions, "numerics")
            .map(
                d ->
                    "Numerics ±"
                        + Numbers.withUnit(
                            Numbers.fixed(Math.max(LEAST_SHOWN, Math.abs(d)), 3), unit));
    Optional<String> material =
        largest(opinions, "material")
            .map(d -> "other material data up to " + Numbers.withUnit(Numbers.signed(d, 2), unit));
    if (numerics.isPresent() && material.isPresent()) {
      return numerics.get() + "; " + material.get();
    }
    return numerics
        .or(() -> material.map(text -> "O" + text.substring(1)))
        .orElse("No other way could be evaluated");
  }

  private static Optional<Double> largest(List<Opinion> opinions, String kind) {
    Double largest = null;
    for (Opinion opinion : opinions) {
      Double difference = opinion.difference();
      boolean larger =
          difference != null && (largest == null || Math.abs(difference) > Math.abs(largest));
      if (opinion.kind().equals(kind) && larger) {
        largest = difference;
      }
    }
    return Optional.ofNullable(largest);
  }

  private static Table table(List<Opinion> opinions, String unit) {
    Table.Builder table =
        new Table.Builder("table-opinions", "The error budget")
            .words("what was done differently")
            .words("tests")
            .numbers("aim then", unit)
            .numbers("difference", unit)
            .words("remark");
    for (Opinion o : opinions) {
      table.row(
          o.what(),
          o.kind().equals("numerics") ? "numerics" : "material data",
          o.aim() == null ? "" : Numbers.fixed(o.aim(), 3),
          o.difference() == null ? "" : Numbers.signed(o.difference(), 4),
          o.note());
    }
    return table.build();
  }
}
