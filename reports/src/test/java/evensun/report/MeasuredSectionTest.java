package evensun.report;

import static org.assertj.core.api.Assertions.assertThat;

import evensun.report.chart.Series;
import evensun.report.page.Block;
import evensun.report.page.Section;
import evensun.report.section.MeasuredSection;
import evensun.result.Measured;
import evensun.result.RunResult;
import java.util.List;
import org.junit.jupiter.api.Test;

class MeasuredSectionTest {

  @Test
  void withoutMeasurementThereIsNoSection() {
    assertThat(MeasuredSection.of(SampleRuns.assessment())).isEmpty();
  }

  @Test
  void theMeasurementIsDrawnOverTheModelWhereItReaches() {
    RunResult run = SampleRuns.assessment();
    List<Double> nm = run.found().spectral().wavelengthNm();
    double first = nm.get(2);
    double last = nm.get(5);
    Measured curve =
        new Measured(
            null,
            "r.csv",
            "fraction against wavelength in nm",
            List.of(first, last),
            List.of(0.2, 0.4),
            first,
            last,
            0.0123,
            1.25,
            1.5);
    Section section = MeasuredSection.of(withMeasured(run, List.of(curve))).orElseThrow();

    assertThat(section.heading())
        .isEqualTo("Measurement and model of the stack as drawn differ by 0.012 (rms)");
    Series drawn = ((Block.Plot) section.blocks().get(0)).chart().series().get(1);
    assertThat(drawn.values().subList(0, 2)).containsOnlyNulls();
    // Linear between its two points: the closed form of a straight line.
    assertThat(drawn.values().get(2)).isEqualTo(0.2);
    double third = 0.2 + 0.2 * (nm.get(3) - first) / (last - first);
    assertThat(drawn.values().get(3))
        .isEqualTo(third, org.assertj.core.api.Assertions.within(1e-12));
    assertThat(drawn.values().get(6)).isNull();
    assertThat(section.blocks()).hasSize(2);
  }

  /** A run with a measured reflectance and a measured quantum efficiency. */
  static RunResult measured() {
    RunResult run = SampleRuns.assessment();
    List<Double> nm = run.found().spectral().wavelengthNm();
    List<Double> ten = run.found().spectral().reflectance().stream().map(r -> 0.9 * r).toList();
    List<Double> top =
        run.found().spectral().absorptance().get("perovskite").stream().map(a -> 0.95 * a).toList();
    String as = "fraction against wavelength in nm";
    return withMeasured(
        run,
        List.of(
            new Measured(null, "r.csv", as, nm, ten, 300, 1200, 0.02, 3.1, 3.5),
            new Measured("top", "<i>eqe.csv", as, nm, top, 300, 1200, 0.03, 19.4, 20.4)));
  }

  private static RunResult withMeasured(RunResult run, List<Measured> measured) {
    return new RunResult(
        run.formatVersion(),
        run.kind(),
        run.title(),
        run.found(),
        run.asDrawn(),
        run.search(),
        run.materials(),
        run.spectrum(),
        run.depth(),
        run.angular(),
        run.sensitivities(),
        run.whatIf(),
        run.secondOpinion(),
        measured,
        null,
        null,
        run.findings(),
        run.cautions(),
        run.provenance());
  }
}
