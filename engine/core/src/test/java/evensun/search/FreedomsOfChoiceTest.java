package evensun.search;

import static evensun.search.Problem.variable;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import evensun.search.problem.Candidate;
import evensun.search.problem.Objective;
import evensun.search.problem.Variable;
import evensun.search.problem.Verdict;
import evensun.search.proof.Proof;
import evensun.search.proof.StepCost;
import java.util.List;
import org.junit.jupiter.api.Test;

/** Steps, choices, limits and ties. */
class FreedomsOfChoiceTest {

  private static SearchOutcome run(Objective objective, long seed) {
    SearchSettings settings = SearchSettings.of(seed, objective.variables().size());
    return new Search(objective, settings, SearchListener.NONE, () -> false).run();
  }

  /** Closed form: the hill is at (61.2, 0.33); the nearest steps are 60 and 0.3. */
  @Test
  void valuesStandOnStepsExactly() {
    Problem stepped =
        Problem.of(
            x -> -Math.pow((x[0] - 61.2) / 50, 2) - Math.pow(x[1] - 0.33, 2),
            new Variable("a", "nm", 40, 120, 5, 40),
            new Variable("b", "", 0, 0.95, 0.1, 0));
    for (int seed = 1; seed <= 5; seed++) {
      SearchOutcome outcome = run(stepped, seed);
      assertThat(outcome.best().values()).containsExactly(60.0, 0.3);
      assertThat(outcome.optima())
          .allSatisfy(
              c -> {
                assertThat(c.values().get(0) % 5).isZero();
                assertThat(c.values().get(1) * 10 % 1).isCloseTo(0, within(1e-12));
              });
    }
  }

  /** Closed form: the hill of height 0 at (61.2, 0.33) loses (1.2/50)² + 0.03² at the steps. */
  @Test
  void stepsHaveTheirCost() {
    Problem stepped =
        Problem.of(
            x -> -Math.pow((x[0] - 61.2) / 50, 2) - Math.pow(x[1] - 0.33, 2),
            new Variable("a", "nm", 40, 120, 5, 40),
            new Variable("b", "", 0, 0.95, 0.1, 0));
    Candidate best = run(stepped, 1).best();
    assertThat(StepCost.of(stepped, best, 2, 2000, () -> false).getAsDouble())
        .isCloseTo(1.2 * 1.2 / 2500 + 0.03 * 0.03, within(1e-7));
    assertThat(StepCost.of(limited(8), best, 2, 2000, () -> false)).isEmpty(); // no steps
  }

  /** Closed form: a narrow valley along a + b = 100 on steps of 7; the pair must move together. */
  @Test
  void stepsMoveInPairs() {
    Problem valley =
        Problem.of(
            x -> -10 * Math.pow(x[0] + x[1] - 98, 2) - Math.abs(x[0] - 28),
            new Variable("a", "nm", 0, 98, 7, 0),
            new Variable("b", "nm", 0, 98, 7, 0));
    assertThat(run(valley, 3).best().values()).containsExactly(28.0, 70.0);
  }

  /** Closed form: of three materials the second is best, and best at 70. */
  @Test
  void choosesBetweenAlternatives() {
    double[] height = {1, 3, 2};
    double[] place = {20, 70, 50};
    Problem choice =
        Problem.of(
            x -> height[(int) x[0]] - Math.pow((x[1] - place[(int) x[0]]) / 100, 2),
            Variable.choice("layer.material", List.of("one", "two", "three"), 0),
            variable("layer.thicknessNm", 0, 100));
    for (int seed = 1; seed <= 5; seed++) {
      SearchOutcome outcome = run(choice, seed);
      assertThat(outcome.best().values().get(0)).isEqualTo(1);
      assertThat(outcome.best().values().get(1)).isCloseTo(70, within(0.01));
      assertThat(outcome.optima()).extracting(c -> c.values().get(0)).contains(0.0, 2.0);
    }
  }

  /**
   * Closed form: the alternatives reach 1, 3 and 2, each at its own place; a design known to be on
   * another hill counts where it is better than what a climb from the best one reaches.
   */
  @Test
  void everyAlternativeIsTriedWithAllElseChosenAnew() {
    double[] height = {1, 3, 2};
    double[] place = {35, 70, 50};
    Problem choice =
        Problem.of(
            x -> height[(int) x[0]] - Math.pow((x[1] - place[(int) x[0]]) / 100, 2),
            Variable.choice("layer.material", List.of("one", "two", "three"), 0),
            variable("layer.thicknessNm", 0, 100));
    Candidate best = Candidate.of(new double[] {1, 70}, Verdict.of(3, 0));
    Candidate other = Candidate.of(new double[] {2, 40}, Verdict.of(7, 0));
    Proof proof = new Proof(choice, 2, 3000, () -> false);
    List<List<Double>> none = proof.alternatives(best, List.of());
    assertThat(none.get(0).get(0)).isCloseTo(1, within(1e-6));
    assertThat(none.get(0).get(1)).isEqualTo(3);
    assertThat(none.get(0).get(2)).isCloseTo(2, within(1e-6));
    assertThat(none.get(1)).isEmpty();
    assertThat(proof.alternatives(best, List.of(other)).get(0).get(2)).isEqualTo(7);
  }

  /** Closed form: the hill of −(x−3)² − (y−3)² under x + y ≤ 4 is at (2, 2). */
  @Test
  void keepsAnActiveLimit() {
    Candidate best = run(limited(4), 1).best();
    assertThat(best.verdict().violation()).isZero();
    assertThat(best.verdict().slacks().get(0)).isCloseTo(0, within(1e-3));
    assertThat(best.values()).allSatisfy(v -> assertThat(v).isCloseTo(2, within(0.02)));
    assertThat(best.aim()).isCloseTo(-2, within(2e-3));
  }

  /** Closed form: under x + y ≤ 8 the limit leaves the hill alone. */
  @Test
  void aSlackLimitChangesNothing() {
    Candidate best = run(limited(8), 1).best();
    assertThat(best.verdict().slacks().get(0)).isCloseTo(2, within(1e-2));
    assertThat(best.aim()).isCloseTo(0, within(1e-6));
  }

  private static Problem limited(double most) {
    return Problem.judged(
            x ->
                Verdict.under(
                    List.of(most - x[0] - x[1]),
                    List.of(-Math.pow(x[0] - 3, 2) - Math.pow(x[1] - 3, 2)),
                    0),
            variable("x", 0, 5),
            variable("y", 0, 5))
        .withLimits("x + y <= " + most);
  }

  /**
   * Closed form: where no design keeps the limit, the one that breaks it least is at the origin.
   */
  @Test
  void anImpossibleLimitIsBrokenLeast() {
    SearchOutcome outcome = run(limited(-1), 1);
    assertThat(outcome.best().isFeasible()).isFalse();
    assertThat(outcome.best().verdict().violation()).isCloseTo(1, within(1e-6));
  }

  /**
   * Closed form: −(x − y)² is 0 all along x = y; within 0.01 of it the tie-break y is largest at y
   * = 2, x within 0.1 of it.
   */
  @Test
  void theTieBreakDecidesAmongEqualAims() {
    Problem ridge =
        Problem.judged(
                x -> Verdict.of(-(x[0] - x[1]) * (x[0] - x[1]), x[1]),
                variable("x", 0, 1.5),
                variable("y", 0, 2))
            .withTieResolution(0.01);
    Candidate best = run(ridge, 2).best();
    assertThat(best.values().get(1)).isCloseTo(1.6, within(2e-3));
    assertThat(best.aim()).isGreaterThanOrEqualTo(-0.01 - 1e-6);
  }
}
