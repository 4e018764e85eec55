package evensun.search;

import static evensun.search.Problem.box;
import static evensun.search.Problem.variable;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import evensun.search.problem.Objective;
import evensun.search.problem.Variable;
import evensun.search.problem.Verdict;
import evensun.search.proof.Exhaustive;
import evensun.search.proof.ExhaustiveOutcome;
import evensun.search.proof.Freedom;
import evensun.search.proof.Proof;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Witness of the optima: an exhaustive fine grid, or the closed form stated beside each. */
class KnownOptimaTest {

  private static SearchOutcome run(Objective objective, long seed) {
    SearchSettings settings = SearchSettings.of(seed, objective.variables().size());
    return new Search(objective, settings, SearchListener.NONE, () -> false).run();
  }

  private static void reachesTheGridFromTenSeeds(Objective objective, long points) {
    Exhaustive exhaustive = new Exhaustive(objective, 2, () -> false);
    ExhaustiveOutcome grid = exhaustive.run(exhaustive.points(points));
    assertThat(grid.complete()).isTrue();
    for (int seed = 1; seed <= 10; seed++) {
      SearchOutcome outcome = run(objective, seed);
      assertThat(outcome.best().aim())
          .as("seed " + seed)
          .isGreaterThanOrEqualTo(grid.bestOnGrid().aim() - 1e-9)
          .isGreaterThan(grid.best().aim() - 0.001);
    }
  }

  @ParameterizedTest
  @ValueSource(ints = {2, 3})
  void reachesTheBestOfAGridWithDerivatives(int films) {
    reachesTheGridFromTenSeeds(new Interference(films, true), films == 2 ? 40_000 : 120_000);
  }

  @Test
  void reachesTheBestOfAGridWithout() {
    reachesTheGridFromTenSeeds(new Interference(2, false), 40_000);
  }

  /** Closed form: rises with x, so x = 2 on its bound; the other is at its hill, y = 0.25. */
  @Test
  void reachesABound() {
    Problem slope =
        Problem.of(
            x -> x[0] - (x[1] - 0.25) * (x[1] - 0.25), variable("x", 0, 2), variable("y", -1, 1));
    SearchOutcome outcome = run(slope, 1);
    assertThat(outcome.best().values().get(0)).isEqualTo(2);
    assertThat(outcome.best().values().get(1)).isCloseTo(0.25, within(1e-4));
    Freedom x = new Proof(slope, 2, 20_000, () -> false).freedoms(outcome.best(), 0.01).get(0);
    // The slope is one per unit; of a loss of 0.01 the range is 0.01 long, up to bisection.
    assertThat(x.bound()).isEqualTo("high");
    assertThat(x.highIsBound()).isTrue();
    assertThat(x.lowIsBound()).isFalse();
    assertThat(x.gainPerUnit()).isCloseTo(1, within(0.01));
    assertThat(x.low()).isBetween(1.99, 1.9999);
  }

  /** Closed form: equal hills at (±1, ±1, ±1) of height 0, nothing higher. */
  @Test
  void listsEqualOptima() {
    Problem twins =
        Problem.of(x -> -(x[0] * x[0] - 1) * (x[0] * x[0] - 1) - x[1] * x[1], box(2, -2, 2));
    for (int seed = 1; seed <= 10; seed++) {
      SearchOutcome outcome = run(twins, seed);
      assertThat(outcome.best().aim()).isCloseTo(0, within(1e-6));
      assertThat(outcome.optima().stream().filter(c -> c.aim() > -1e-4).map(c -> c.values().get(0)))
          .anyMatch(x -> Math.abs(x - 1) < 0.01)
          .anyMatch(x -> Math.abs(x + 1) < 0.01);
    }
  }

  /** Closed form: f = min(x, 2 − x) − (y − x)² is 1 at (1, 1) and loses 0.1 at x = 0.9 and 1.1. */
  @Test
  void measuresTheEquallyGoodRange() {
    Objective ridge = new Ridge();
    SearchOutcome outcome = run(ridge, 4);
    assertThat(outcome.best().aim()).isCloseTo(1, within(1e-6));
    Freedom x = new Proof(ridge, 1, 20_000, () -> false).freedoms(outcome.best(), 0.1).get(0);
    assertThat(x.low()).isCloseTo(0.9, within(2e-3)).isGreaterThanOrEqualTo(0.9);
    assertThat(x.high()).isCloseTo(1.1, within(2e-3)).isLessThanOrEqualTo(1.1);
    assertThat(x.bound()).isEmpty();
    assertThat(new Proof(ridge, 3, 20_000, () -> false).freedoms(outcome.best(), 0.1).get(0))
        .isEqualTo(x);
  }

  private static final class Ridge implements Objective {
    @Override
    public List<Variable> variables() {
      return List.of(variable("x", 0, 3), variable("y", 0, 3));
    }

    @Override
    public List<String> aims() {
      return List.of("ridge");
    }

    @Override
    public Worker newWorker() {
      return new Worker() {
        @Override
        public Verdict judge(double[] v) {
          double off = (v[1] - v[0]) * (v[1] - v[0]);
          return Verdict.of(Math.min(v[0], 2 - v[0]) - off, 0);
        }

        @Override
        public int partCount() {
          return 2;
        }

        @Override
        public boolean parts(double[] v, double[] parts, double[][] gradient) {
          double off = v[1] - v[0];
          parts[0] = v[0] - off * off;
          parts[1] = 2 - v[0] - off * off;
          gradient[0][0] = 1 + 2 * off;
          gradient[1][0] = -1 + 2 * off;
          gradient[0][1] = -2 * off;
          gradient[1][1] = -2 * off;
          return true;
        }
      };
    }
  }

  @Test
  void aGridOfFiveVariablesIsRefused() {
    Problem five = Problem.of(TestFunctions::ackley, box(5, -1, 1));
    assertThatThrownBy(() -> new Exhaustive(five, 1, () -> false))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessageContaining("at most 4");
  }

  @Test
  void aGridTakesEveryStepAndNoMore() {
    Problem stepped =
        Problem.of(
            x -> -Math.abs(x[0] - 47) - Math.abs(x[1] - 0.3),
            new Variable("a", "nm", 40, 52, 5, 40),
            variable("b", 0, 1));
    Exhaustive exhaustive = new Exhaustive(stepped, 1, () -> false);
    assertThat(exhaustive.points(100)).containsExactly(3, 33);
    assertThat(exhaustive.run(List.of(3, 11)).bestOnGrid().values()).containsExactly(45.0, 0.3);
  }
}
