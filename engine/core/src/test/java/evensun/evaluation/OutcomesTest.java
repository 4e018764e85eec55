package evensun.evaluation;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import evensun.light.Constants;
import evensun.result.Outcome;
import evensun.spi.EvaluationFailed;
import java.util.List;
import org.junit.jupiter.api.Test;

class OutcomesTest {

  private static Outcome outcome(String yaml, BeerLambertSolver solver) {
    try (Model model = Cells.model(yaml, solver);
        Bench bench = model.newBench()) {
      return Outcomes.of(bench, List.of());
    }
  }

  /** Closed form of Beer–Lambert: what passes a grey layer at one wavelength. */
  private static double pass(double thicknessNm, double wavelengthNm) {
    return Math.exp(-4 * Math.PI * 0.05 * thicknessNm / wavelengthNm);
  }

  /** q/(hc)·E·(λ₂² − λ₁²)/2: photon current of a flat spectrum between two wavelengths. */
  private static double bin(double fromNm, double toNm) {
    return 0.1 * Cells.FLAT * (toNm * toNm - fromNm * fromNm) / 2 / Constants.HC_EV_NM;
  }

  private static double sum(java.util.function.DoubleUnaryOperator share) {
    double sum = 0;
    for (int nm = 400; nm <= 800; nm += 10) {
      sum += share.applyAsDouble(nm) * bin(Math.max(400, nm - 5), Math.min(800, nm + 5));
    }
    return sum;
  }

  @Test
  void currentsAreTheClosedFormOfBeerAndLambert() {
    Outcome outcome = outcome(Cells.twoCells(300, 900), new BeerLambertSolver());

    double top = sum(nm -> 1 - pass(300, nm));
    double bottom = sum(nm -> pass(300, nm) * (1 - pass(900, nm)));
    assertThat(outcome.subcells().get(0).photocurrentMaPerCm2()).isCloseTo(top, within(1e-9));
    assertThat(outcome.subcells().get(1).photocurrentMaPerCm2()).isCloseTo(bottom, within(1e-9));
    assertThat(outcome.matchedCurrentMaPerCm2()).isCloseTo(Math.min(top, bottom), within(1e-9));
    assertThat(outcome.mismatchMaPerCm2()).isCloseTo(Math.abs(top - bottom), within(1e-9));
    assertThat(outcome.limitingSubcell()).isEqualTo(top < bottom ? "top" : "bottom");
  }

  @Test
  void theLedgerAddsUpToTheIncidentLight() {
    Outcome outcome = outcome(Cells.twoCells(300, 900), new BeerLambertSolver());

    double total =
        outcome.losses().reflectedMaPerCm2()
            + outcome.losses().transmittedMaPerCm2()
            + outcome.losses().parasitic().stream().mapToDouble(p -> p.maPerCm2()).sum()
            + outcome.subcells().stream().mapToDouble(s -> s.photocurrentMaPerCm2()).sum();
    // law of energy conservation
    assertThat(total).isCloseTo(outcome.incidentMaPerCm2(), within(1e-9));
    assertThat(outcome.losses().parasitic()).extracting(p -> p.layer()).containsExactly("spacer");
  }

  @Test
  void anExitMediumThatIsAnAbsorberIsCountedOnce() {
    String yaml = Cells.twoCells(300, 900).replace("absorbers: [lower]", "absorbers: [back]");
    Outcome outcome = outcome(yaml, new BeerLambertSolver());

    double bottom = sum(nm -> pass(300, nm) * pass(900, nm));
    assertThat(outcome.subcells().get(1).photocurrentMaPerCm2()).isCloseTo(bottom, within(1e-9));
    assertThat(outcome.losses().transmittedMaPerCm2()).isZero();
  }

  @Test
  void currentsForASearchEqualThoseOfTheRecord() {
    try (Model model = Cells.model(Cells.twoCells(120, 700), new BeerLambertSolver());
        Bench bench = model.newBench()) {
      double[] currents = new double[2];
      bench.currents(currents);
      Outcome outcome = Outcomes.of(bench, List.of());
      assertThat(currents[0])
          .isCloseTo(outcome.subcells().get(0).photocurrentMaPerCm2(), within(1e-12));
      assertThat(currents[1])
          .isCloseTo(outcome.subcells().get(1).photocurrentMaPerCm2(), within(1e-12));
    }
  }

  @Test
  void balancedSubcellsHaveNoLimitingOne() {
    // found by bisection of the closed form: the lower layer is thick, the upper takes half
    double low = 1;
    double high = 2000;
    for (int i = 0; i < 60; i++) {
      double middle = 0.5 * (low + high);
      double difference =
          sum(nm -> 1 - pass(middle, nm)) - sum(nm -> pass(middle, nm) * (1 - pass(3000, nm)));
      if (difference > 0) {
        high = middle;
      } else {
        low = middle;
      }
    }
    Outcome outcome = outcome(Cells.twoCells(low, 3000), new BeerLambertSolver());
    assertThat(outcome.mismatchMaPerCm2()).isLessThan(Outcome.BALANCED_MA_PER_CM2);
    assertThat(outcome.limitingSubcell()).isNull();
  }

  @Test
  void independentSubcellsHaveNoMatchedCurrent() {
    Outcome outcome =
        outcome(
            Cells.twoCells(300, 900).replace("connection: series", "connection: independent"),
            new BeerLambertSolver());
    assertThat(outcome.matchedCurrentMaPerCm2()).isNull();
    assertThat(outcome.mismatchMaPerCm2()).isNull();
    assertThat(outcome.limitingSubcell()).isNull();
  }

  @Test
  void oneWavelengthGivesSpectraAndNoCurrents() {
    Outcome outcome =
        outcome(
            Cells.twoCells(300, 900).replace("fromNm: 400, toNm: 800", "fromNm: 600, toNm: 600"),
            new BeerLambertSolver());
    assertThat(outcome.incidentMaPerCm2()).isNull();
    assertThat(outcome.losses()).isNull();
    assertThat(outcome.subcells().get(0).photocurrentMaPerCm2()).isNull();
    assertThat(outcome.spectral().absorptance().get("upper").get(0))
        .isCloseTo(1 - pass(300, 600), within(1e-12));
  }

  @Test
  void aSolverThatLosesLightIsRefused() {
    BeerLambertSolver solver = new BeerLambertSolver();
    solver.lost = 1e-6;
    assertThatThrownBy(() -> outcome(Cells.twoCells(300, 900), solver))
        .isInstanceOf(EvaluationFailed.class)
        .hasMessageContaining("400.0 nm")
        .hasMessageContaining("0.999999");
  }

  @Test
  void anErrorIsThatOfTheSumAndNotTheSumOfErrors() {
    BeerLambertSolver solver = new BeerLambertSolver();
    solver.error = 1e-3;
    Outcome outcome = outcome(Cells.twoCells(300, 900), solver);
    // Closed form: independent errors of e per bin make e·√(Σ Φ²) for one layer, √3 for all three
    // that a reflected ray may have missed.
    double one = 1e-3 * Math.sqrt(sumOfSquares());
    assertThat(outcome.subcells().get(0).standardErrorMaPerCm2()).isCloseTo(one, within(1e-12));
    assertThat(outcome.matchedStandardErrorMaPerCm2()).isCloseTo(one, within(1e-12));
    assertThat(outcome.losses().parasitic().get(0).standardErrorMaPerCm2())
        .isCloseTo(one, within(1e-12));
    assertThat(outcome.losses().reflectedStandardErrorMaPerCm2())
        .isCloseTo(Math.sqrt(3) * one, within(1e-12));
    assertThat(outcome.spectral().absorptanceStandardError().get("upper")).containsOnly(1e-3);
  }

  private static double sumOfSquares() {
    double sum = 0;
    for (int nm = 400; nm <= 800; nm += 10) {
      double bin = bin(Math.max(400, nm - 5), Math.min(800, nm + 5));
      sum += bin * bin;
    }
    return sum;
  }

  @Test
  void exactSolversStateNoError() {
    Outcome outcome = outcome(Cells.twoCells(300, 900), new BeerLambertSolver());
    assertThat(outcome.subcells().get(0).standardErrorMaPerCm2()).isNull();
    assertThat(outcome.losses().reflectedStandardErrorMaPerCm2()).isNull();
    assertThat(outcome.losses().neverEnteredMaPerCm2()).isNull();
    assertThat(outcome.spectral().absorptanceStandardError()).isNull();
  }
}
