package evensun.evaluation;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import evensun.device.DeviceModel;
import evensun.device.DeviceOptics;
import evensun.device.DeviceParameters;
import evensun.device.PairingChoice;
import evensun.device.SubcellParameters;
import evensun.result.Electrical;
import evensun.result.Outcome;
import evensun.scenario.Connection;
import evensun.search.problem.Objective;
import evensun.search.problem.Variable;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class EfficiencyAimTest {

  private static final String TANDEM =
      """
      evensun: 1
      title: Two soft edges
      light: {spectrum: AM1.5G}
      grid: {fromNm: 300, toNm: 1300, stepNm: 10}
      stack:
        - {medium: air}
        - {name: veil, material: grey, thicknessNm: 30}
        - {name: upper, material: tail, bandgapEv: 1.7, thicknessNm: 400, coherence: incoherent}
        - {name: spacer, material: clear, thicknessNm: 50}
        - {name: lower, material: tail, bandgapEv: 1.3, thicknessNm: 900, coherence: incoherent}
        - {name: back, material: clear}
      subcells:
        - {name: top, absorbers: [upper]}
        - {name: bottom, absorbers: [lower]}
      connection: series
      search:
        vary:
          veil.thicknessNm: [0, 100]
          upper.thicknessNm: [100, 900]
          spacer.thicknessNm: {sameAs: veil.thicknessNm, ratio: 2}
      """;

  private static final List<String> KEYS =
      List.of(
          "veil.thicknessNm",
          "upper.thicknessNm",
          "lower.thicknessNm",
          "upper.bandgapEv",
          "lower.bandgapEv");
  private static final double[][] DESIGNS = {
    {30, 400, 900, 1.7, 1.3}, {5, 250, 1500, 1.62, 1.25}, {80, 800, 600, 1.8, 1.35}
  };

  private static DeviceModel device(double upperEv, double lowerEv) {
    return DeviceModel.of(
        List.of(
            SubcellParameters.ideal("top", upperEv).withRecombination(0.01, 1.5),
            SubcellParameters.ideal("bottom", lowerEv).withRecombination(0.02, 1).withShunt(5000)),
        DeviceParameters.of(Connection.SERIES).withSeriesResistance(2),
        Cells.flatSpectrum());
  }

  private static Aim aim(Model model, boolean reciprocal) {
    DeviceModel device = device(1.7, 1.3);
    return reciprocal
        ? EfficiencyAim.fromReciprocity(device, model)
        : EfficiencyAim.fromStepEdges(device);
  }

  private static List<Parameter> parameters(Model model) {
    return KEYS.stream().map(key -> Parameter.of(key, model.stack()).orElseThrow()).toList();
  }

  /** Witness: the device solved from every spectrum, as a report does it. */
  @ParameterizedTest
  @ValueSource(booleans = {true, false})
  void ranksDesignsByWhatTheReportSays(boolean reciprocal) {
    try (Model model = Cells.model(TANDEM, new BeerLambertSolver())) {
      Aim aim = aim(model, reciprocal);
      Bench bench = model.newBench(aim.lightSums());
      for (double[] design : DESIGNS) {
        for (int v = 0; v < design.length; v++) {
          bench.set(parameters(model).get(v), design[v]);
        }
        Outcome outcome = Outcomes.of(bench, List.of());
        Electrical reported =
            device(design[3], design[4])
                .analyse(
                    DeviceOptics.of(outcome.spectral(), outcome.subcells()),
                    new PairingChoice(reciprocal, List.of()))
                .electrical();
        assertThat(reported.efficiencyPercent()).isGreaterThan(5);
        assertThat(aim.value(new Reading(bench).take()))
            .isCloseTo(reported.efficiencyPercent(), within(1e-9));
      }
    }
  }

  /** Guards the test above: were the pairings alike, it could not tell them apart. */
  @Test
  void thePairingsDiffer() {
    try (Model model = Cells.model(TANDEM, new BeerLambertSolver())) {
      Aim reciprocal = aim(model, true);
      Bench bench = model.newBench(reciprocal.lightSums());
      Reading reading = new Reading(bench).take();
      double difference = reciprocal.value(reading) - aim(model, false).value(reading);
      assertThat(Math.abs(difference)).isGreaterThan(0.05);
    }
  }

  /** Witness: differences of the verdicts, Richardson-extrapolated. */
  @ParameterizedTest
  @ValueSource(booleans = {true, false})
  void itsDerivativesAreThoseOfItsValues(boolean reciprocal) {
    try (Model model = Cells.model(TANDEM, new BeerLambertSolver());
        Objective.Worker worker = objective(model, aim(model, reciprocal)).newWorker()) {
      assertThat(worker.partCount()).isEqualTo(1);
      for (double[] design : DESIGNS) {
        double[] part = new double[1];
        double[][] gradient = new double[1][design.length];
        assertThat(worker.parts(design, part, gradient)).isTrue();
        assertThat(part[0]).isEqualTo(worker.judge(design).aims().get(0));
        for (int v = 0; v < design.length; v++) {
          double step = v < 3 ? 1 : 1e-3;
          double slope =
              (4 * slope(worker, design, v, step / 2) - slope(worker, design, v, step)) / 3;
          assertThat(gradient[0][v] * step)
              .as("%s at %s", KEYS.get(v), design[1])
              .isCloseTo(slope * step, within(2e-6 + 1e-3 * Math.abs(slope * step)));
        }
      }
    }
  }

  private static double slope(Objective.Worker worker, double[] design, int v, double step) {
    double[] up = design.clone();
    double[] down = design.clone();
    up[v] += step;
    down[v] -= step;
    return (worker.judge(up).aims().get(0) - worker.judge(down).aims().get(0)) / (2 * step);
  }

  private static StackObjective objective(Model model, Aim aim) {
    List<Parameter> parameters = parameters(model);
    List<Variable> variables =
        parameters.stream()
            .map(p -> new Variable(p.key(), p.unit(), 0, 2000, 0, p.drawn()))
            .toList();
    return new StackObjective(model, parameters, variables, aim);
  }
}
