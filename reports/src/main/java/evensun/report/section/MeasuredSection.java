package evensun.report.section;

import evensun.report.chart.Axis;
import evensun.report.chart.Chart;
import evensun.report.chart.Kind;
import evensun.report.chart.Series;
import evensun.report.page.Block;
import evensun.report.page.Section;
import evensun.report.page.Table;
import evensun.report.text.Clip;
import evensun.report.text.Numbers;
import evensun.result.Measured;
import evensun.result.Outcome;
import evensun.result.RunResult;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import org.jspecify.annotations.Nullable;

/** Measured curves over the prediction for the stack as drawn. */
public final class MeasuredSection {

  private MeasuredSection() {}

  /** The section; absent when nothing was measured. */
  public static Optional<Section> of(RunResult result) {
    List<Measured> measured = result.measured();
    if (measured == null || measured.isEmpty()) {
      return Optional.empty();
    }
    Outcome drawn = result.asDrawn() == null ? result.found() : result.asDrawn();
    List<Block> blocks = new ArrayList<>();
    if (drawn.spectral().wavelengthNm().size() > 1) {
      blocks.add(Tables.plot(chart(measured, drawn)));
    }
    blocks.add(new Block.Grid(table(measured), false));
    return Optional.of(new Section("measured", "Measured", heading(measured), blocks));
  }

  private static String heading(List<Measured> measured) {
    Measured worst =
        measured.stream().max(Comparator.comparingDouble(Measured::rmsDifference)).orElseThrow();
    return "Measurement and model of the stack as drawn differ by "
        + (measured.size() > 1 ? "at most " : "")
        + Numbers.fixed(worst.rmsDifference(), 3)
        + " (rms)"
        + (measured.size() > 1 ? ", in " + label(worst) : "");
  }

  private static Chart chart(List<Measured> measured, Outcome drawn) {
    List<Double> nm = drawn.spectral().wavelengthNm();
    List<Series> subcells = Spectra.subcells(drawn);
    List<Series> series = new ArrayList<>();
    for (Measured curve : measured) {
      Series model =
          curve.subcell() == null
              ? Series.of("reflectance", "muted", drawn.spectral().reflectance())
              : subcells.stream()
                  .filter(s -> s.label().equals(curve.subcell()))
                  .findFirst()
                  .orElseThrow();
      series.add(new Series(label(curve) + ", model", model.role(), false, model.values()));
      series.add(new Series(label(curve) + ", measured", model.role(), true, onGrid(curve, nm)));
    }
    return new Chart(
        "measured-curves",
        Kind.LINES,
        "Measured (dashed) over what the model says of the stack as drawn",
        Axis.linear("wavelength", "nm", nm.get(0), nm.get(nm.size() - 1)),
        Axis.linear("share of the incident light", "", 0, 1),
        nm,
        series,
        List.of());
  }

  private static String label(Measured curve) {
    return curve.subcell() == null ? "reflectance" : Clip.to(curve.subcell(), 50);
  }

  /** The measurement at the wavelengths of the model, linear between its points. */
  private static List<@Nullable Double> onGrid(Measured curve, List<Double> nm) {
    List<@Nullable Double> values = new ArrayList<>(nm.size());
    int right = 0;
    for (double at : nm) {
      boolean inside = at >= curve.comparedFromNm() && at <= curve.comparedToNm();
      while (inside && curve.wavelengthNm().get(right) < at) {
        right++;
      }
      values.add(inside ? between(curve, right, at) : null);
    }
    return values;
  }

  private static double between(Measured curve, int right, double at) {
    if (right == 0) {
      return curve.measured().get(0);
    }
    double x0 = curve.wavelengthNm().get(right - 1);
    double x1 = curve.wavelengthNm().get(right);
    double share = (at - x0) / (x1 - x0);
    return curve.measured().get(right - 1) * (1 - share) + curve.measured().get(right) * share;
  }

  private static Table table(List<Measured> measured) {
    Table.Builder table =
        new Table.Builder("table-measured", "Measurement and model over the same wavelengths")
            .words("curve")
            .words("file")
            .words("read as")
            .numbers("from", "nm")
            .numbers("to", "nm")
            .numbers("measured", Numbers.MA)
            .numbers("model", Numbers.MA)
            .numbers("rms difference", "");
    for (Measured curve : measured) {
      table.row(
          label(curve),
          Clip.to(curve.path(), 60),
          curve.readAs(),
          Numbers.trimmed(curve.comparedFromNm(), 1),
          Numbers.trimmed(curve.comparedToNm(), 1),
          current(curve.measuredMaPerCm2()),
          current(curve.predictedMaPerCm2()),
          Numbers.fixed(curve.rmsDifference(), 4));
    }
    return table.build();
  }

  private static String current(@Nullable Double maPerCm2) {
    return maPerCm2 == null ? "" : Numbers.fixed(maPerCm2, 3);
  }
}
