package evensun.evaluation;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import evensun.light.Constants;
import evensun.light.Spectra;
import evensun.light.Spectrum;
import evensun.material.MaterialLibrary;
import evensun.scenario.Source;
import evensun.scenario.reader.ScenarioReader;
import evensun.stack.StackResolver;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Currents of a step absorber: what the light carries above the gap, whatever the grid. */
class StepAbsorberTest {

  private static final Spectrum GLOBAL = Spectra.named("AM1.5G");

  private static Bench bench(double stepNm, double thicknessNm) {
    String yaml =
        """
        evensun: 1
        title: One step
        light: {spectrum: AM1.5G}
        grid: {fromNm: 300, toNm: 1200, stepNm: %s}
        stack:
          - {medium: air}
          - {name: step, material: ideal-absorber, bandgapEv: 1.4, thicknessNm: %s, coherence: incoherent}
          - {name: rear, material: air}
        subcells:
          - {name: only, absorbers: [step]}
        """
            .formatted(stepNm, thicknessNm);
    var scenario = ScenarioReader.read(new Source("step.yaml", Path.of("."), yaml));
    var stack =
        StackResolver.resolve(
            scenario, (name, place) -> MaterialLibrary.builtIn().find(name).orElseThrow(), GLOBAL);
    return Cells.model(stack, new BeerLambertSolver()).newBench();
  }

  private static double current(Bench bench) {
    double[] current = new double[1];
    bench.currents(current);
    return current[0];
  }

  private static Parameter parameter(String key, Bench bench) {
    return Parameter.of(key, bench.model().stack()).orElseThrow();
  }

  private static double above(double gapEv) {
    return GLOBAL.photonCurrentMaPerCm2(300, Constants.HC_EV_NM / gapEv);
  }

  // Closed form: an opaque step takes all photons above its gap (one pass without reflection).
  @ParameterizedTest
  @ValueSource(doubles = {1, 5, 10, 20, 50})
  void anOpaqueStepTakesEveryPhotonAboveItsGapWhateverTheStepOfTheGrid(double stepNm) {
    Bench bench = bench(stepNm, 20000);
    Parameter gap = parameter("step.bandgapEv", bench);
    for (double gapEv = 1.1; gapEv < 2.2; gapEv += 0.0137) {
      bench.set(gap, gapEv);
      assertThat(current(bench)).as("gap %s eV", gapEv).isCloseTo(above(gapEv), within(1e-9));
    }
  }

  // Closed form: of every photon above the gap a thin step takes 1 − exp(−αd), α = 1e5 per cm;
  // also after the thickness was changed, and on a bench that took the design over.
  @Test
  void aThinStepTakesItsShareOfThem() {
    Bench bench = bench(10, 900);
    bench.set(parameter("step.bandgapEv", bench), 1.51);
    bench.set(parameter("step.thicknessNm", bench), 100);
    double share = 1 - Math.exp(-1);
    assertThat(current(bench)).isCloseTo(share * above(1.51), within(1e-9));
    Bench other = bench.model().newBench();
    other.copyFrom(bench);
    assertThat(current(other)).isEqualTo(current(bench));
  }

  // A law: the slope of the current by the gap is that of the light above it, also across the edges
  // of bins, where a grid of 20 nm would show jumps of up to a milliampere.
  @Test
  void theCurrentIsSmoothInTheGap() {
    Bench bench = bench(20, 20000);
    Parameter gap = parameter("step.bandgapEv", bench);
    double before = Double.NaN;
    for (double gapEv = 1.3; gapEv < 1.7; gapEv += 1e-4) {
      bench.set(gap, gapEv);
      double now = current(bench);
      if (!Double.isNaN(before)) {
        assertThat(before - now).isBetween(0.0, 0.02);
      }
      before = now;
    }
  }
}
