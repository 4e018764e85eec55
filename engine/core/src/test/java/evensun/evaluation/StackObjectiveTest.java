package evensun.evaluation;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import evensun.scenario.Place;
import evensun.scenario.SearchSpec.LimitSpec;
import evensun.search.problem.Objective;
import evensun.search.problem.Variable;
import evensun.search.problem.Verdict;
import java.util.List;
import java.util.OptionalDouble;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;

class StackObjectiveTest {

  private static Aim aim(Quantity quantity, Model model) {
    return GaugeAim.of(quantity, "", List.of(), List.of(), false, model, null);
  }

  private static LimitSpec limit(String quantity, List<String> of, double least, double most) {
    return new LimitSpec(
        quantity,
        of,
        Double.isNaN(least) ? OptionalDouble.empty() : OptionalDouble.of(least),
        Double.isNaN(most) ? OptionalDouble.empty() : OptionalDouble.of(most),
        Place.of("test"));
  }

  private static List<Limit> limits(Model model, LimitSpec... specs) {
    return Stream.of(specs).flatMap(spec -> Limit.of(spec, model, null).stream()).toList();
  }

  private static StackObjective objective(Model model, Quantity quantity) {
    Parameter upper = Parameter.of("upper.thicknessNm", model.stack()).orElseThrow();
    return new StackObjective(
        model,
        List.of(upper),
        List.of(new Variable(upper.key(), "nm", 0, 2000, 0, 300)),
        aim(quantity, model));
  }

  @Test
  void theMatchedCurrentIsTheSmallerOne() {
    try (Model model = Cells.model(Cells.twoCells(300, 900), new BeerLambertSolver());
        Bench bench = model.newBench();
        Objective.Worker worker = objective(model, Quantity.MATCHED_CURRENT).newWorker()) {
      double[] currents = new double[2];
      bench.set(Parameter.of("upper.thicknessNm", model.stack()).orElseThrow(), 500);
      bench.currents(currents);
      Verdict verdict = worker.judge(new double[] {500});
      assertThat(verdict.aims()).containsExactly(Math.min(currents[0], currents[1]));
    }
  }

  @Test
  void theVerdictDependsOnTheValuesAlone() {
    try (Model model = Cells.model(Cells.twoCells(300, 900), new BeerLambertSolver());
        Objective.Worker worker = objective(model, Quantity.CURRENT_SUM).newWorker()) {
      Verdict first = worker.judge(new double[] {100});
      worker.judge(new double[] {1500});
      assertThat(worker.judge(new double[] {100})).isEqualTo(first);
    }
  }

  @Test
  void aDesignThatFailsCarriesItsReason() {
    BeerLambertSolver solver = new BeerLambertSolver();
    solver.refuseAboveNm = 1000;
    try (Model model = Cells.model(Cells.twoCells(300, 900), solver);
        Objective.Worker worker = objective(model, Quantity.MATCHED_CURRENT).newWorker()) {
      assertThat(worker.judge(new double[] {1500}).failure())
          .isEqualTo("too thick for this solver");
      assertThat(worker.judge(new double[] {500}).isFailure()).isFalse();
    }
  }

  @Test
  void aBandgapIsSetOnItsLayerAlone() {
    String yaml =
        Cells.twoCells(300, 900)
            .replace("name: upper, material: grey", "name: upper, material: edge, bandgapEv: 1.2")
            .replace("name: lower, material: grey", "name: lower, material: edge");
    try (Model model = Cells.model(yaml, new BeerLambertSolver());
        Bench bench = model.newBench()) {
      Parameter upper = Parameter.of("upper.bandgapEv", model.stack()).orElseThrow();
      Parameter lower = Parameter.of("lower.bandgapEv", model.stack()).orElseThrow();
      assertThat(upper.drawn()).isEqualTo(1.2);
      assertThat(lower.drawn()).isEqualTo(1.5); // the material's default
      bench.set(upper, 1.8);
      assertThat(bench.design().k[upper.index()][0]).isEqualTo(1.8 / 100);
      assertThat(bench.design().k[lower.index()][0]).isEqualTo(1.5 / 100);
    }
  }

  // By hand: k of the alloy is its gap over 100, and its gap 1.2 + 0.6 x + 0.2 x² eV.
  @Test
  void aCompositionMovesTheBandgapOfItsLayer() {
    Model model =
        Cells.model(
            Cells.twoCells(100, 100)
                .replace(
                    "name: upper, material: grey",
                    "name: upper, material: alloy, compositionFraction: 0.5"),
            new BeerLambertSolver());
    Parameter share = Parameter.of("upper.compositionFraction", model.stack()).orElseThrow();
    Bench bench = model.newBench();
    assertThat(bench.design().k[share.index()][0]).isCloseTo(0.0155, within(1e-12));
    bench.set(share, 1);
    assertThat(bench.design().k[share.index()][0]).isCloseTo(0.02, within(1e-12));
    assertThat(bench.get(share)).isCloseTo(1, within(1e-12));
  }

  @Test
  void keysThatNameNothingAreNoParameters() {
    try (Model model = Cells.model(Cells.twoCells(300, 900), new BeerLambertSolver())) {
      assertThat(Parameter.of("nowhere.thicknessNm", model.stack())).isEmpty();
      assertThat(Parameter.of("upper.bandgapEv", model.stack())).isEmpty(); // grey has none
      assertThat(Parameter.of("upper", model.stack())).isEmpty();
    }
  }

  /** Witness: the currents and thicknesses that the bench itself has for the same values. */
  @Test
  void limitsTellHowFarADesignIsFromThem() {
    try (Model model = Cells.model(Cells.twoCells(300, 900), new BeerLambertSolver());
        Bench bench = model.newBench()) {
      Parameter upper = Parameter.of("upper.thicknessNm", model.stack()).orElseThrow();
      bench.set(upper, 500);
      double[] currents = new double[2];
      bench.currents(currents);
      double mismatch = Math.abs(currents[0] - currents[1]);
      List<Limit> limits =
          limits(
              model,
              limit("mismatchMaPerCm2", List.of(), Double.NaN, 2),
              limit("thicknessNm", List.of("upper", "lower"), Double.NaN, 1000),
              limit("photocurrentMaPerCm2", List.of("bottom"), 1, Double.NaN));
      StackObjective objective =
          new StackObjective(
              model,
              List.of(upper),
              List.of(new Variable(upper.key(), "nm", 0, 2000, 0, 300)),
              List.of(aim(Quantity.MATCHED_CURRENT, model)),
              limits);
      assertThat(objective.limits())
          .containsExactly(
              "mismatchMaPerCm2 ≤ 2 mA cm⁻²",
              "thicknessNm of upper, lower ≤ 1000 nm",
              "photocurrentMaPerCm2 of bottom ≥ 1 mA cm⁻²");
      try (Objective.Worker worker = objective.newWorker()) {
        Verdict verdict = worker.judge(new double[] {500});
        assertThat(verdict.slacks())
            .containsExactly((2 - mismatch) / 2, (1000 - 1400) / 1000.0, currents[1] - 1);
        assertThat(verdict.violation()).isGreaterThanOrEqualTo(0.4);
      }
    }
  }

  /** Witness: the ledger of the same design, made of its whole spectra. */
  @Test
  void lightThatIsLostCanBeAimedAtAndLimited() {
    String yaml =
        Cells.twoCells(300, 900)
            .replace("name: spacer, material: clear", "name: spacer, material: grey");
    try (Model model = Cells.model(yaml, new BeerLambertSolver());
        Bench bench = model.newBench()) {
      Parameter upper = Parameter.of("upper.thicknessNm", model.stack()).orElseThrow();
      Aim parasitic =
          GaugeAim.of(Quantity.PARASITIC, "", List.of("spacer"), List.of(), true, model, null);
      StackObjective objective =
          new StackObjective(
              model,
              List.of(upper),
              List.of(new Variable(upper.key(), "nm", 0, 2000, 0, 300)),
              List.of(aim(Quantity.CURRENT_SUM, model), parasitic),
              limits(
                  model,
                  limit("transmittedMaPerCm2", List.of(), Double.NaN, 10),
                  limit("reflectedMaPerCm2", List.of(), Double.NaN, 1)));
      bench.set(upper, 500);
      var outcome = Outcomes.of(bench, List.of());
      try (Objective.Worker worker = objective.newWorker()) {
        Verdict verdict = worker.judge(new double[] {500});
        assertThat(objective.aims())
            .containsExactly("currentSumMaPerCm2", "spacer.parasiticMaPerCm2");
        assertThat(verdict.aims().get(0))
            .isCloseTo(
                outcome.subcells().stream().mapToDouble(c -> c.photocurrentMaPerCm2()).sum(),
                within(1e-9));
        assertThat(verdict.aims().get(1))
            .isNegative()
            .isCloseTo(-outcome.losses().parasitic().get(0).maPerCm2(), within(1e-9));
        assertThat(verdict.slacks().get(0))
            .isCloseTo(1 - outcome.losses().transmittedMaPerCm2() / 10, within(1e-9));
        // Beer and Lambert know no reflection.
        assertThat(verdict.slacks().get(1)).isCloseTo(1, within(1e-9));
      }
    }
  }

  /** Witness: setting both layers by hand. */
  @Test
  void aTiedLayerFollows() {
    String yaml =
        Cells.twoCells(300, 900)
            + """
            search:
              vary:
                upper.thicknessNm: [0, 500]
                lower.thicknessNm: {sameAs: upper.thicknessNm, ratio: 2}
            """;
    try (Model tied = Cells.model(yaml, new BeerLambertSolver());
        Model plain = Cells.model(Cells.twoCells(300, 900), new BeerLambertSolver());
        Bench bench = plain.newBench();
        Objective.Worker worker = objective(tied, Quantity.MATCHED_CURRENT).newWorker()) {
      bench.set(Parameter.of("upper.thicknessNm", plain.stack()).orElseThrow(), 200);
      bench.set(Parameter.of("lower.thicknessNm", plain.stack()).orElseThrow(), 400);
      double[] currents = new double[2];
      bench.currents(currents);
      assertThat(worker.judge(new double[] {200}).aims())
          .containsExactly(Math.min(currents[0], currents[1]));
    }
  }
}
