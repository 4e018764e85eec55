package evensun.search;

import static evensun.search.Problem.box;
import static org.assertj.core.api.Assertions.assertThat;

import evensun.search.problem.FailureRecord;
import evensun.search.problem.Verdict;
import org.junit.jupiter.api.Test;

class FailuresTest {

  private static SearchOutcome run(Problem problem) {
    return new Search(problem, SearchSettings.of(5, 2), SearchListener.NONE, () -> false).run();
  }

  /** Throws on one side, returns NaN on another; the optimum of what is left is known: (1, 1). */
  private static Verdict brittle(double[] x) {
    if (x[0] > 1.5) {
      throw new IllegalStateException("ledger broken: layer at " + x[0]);
    }
    if (x[1] > 1.5) {
      return Verdict.of(Double.NaN, 0);
    }
    return Verdict.of(-Math.abs(x[0] - 1) - Math.abs(x[1] - 1), 0);
  }

  @Test
  void costsADesignItsFitnessAndIsCounted() {
    SearchOutcome outcome = run(Problem.judged(FailuresTest::brittle, box(2, -2, 2)));
    assertThat(outcome.best().values()).allSatisfy(v -> assertThat(v).isBetween(0.99, 1.01));
    assertThat(outcome.failures())
        .extracting(FailureRecord::kind)
        .containsExactlyInAnyOrder("ledger broken", "not a number");
    assertThat(outcome.failureCount())
        .isEqualTo(outcome.failures().stream().mapToInt(FailureRecord::count).sum())
        .isPositive();
    FailureRecord broken =
        outcome.failures().stream().filter(f -> f.kind().equals("ledger broken")).findAny().get();
    assertThat(broken.first().values().get(0)).isGreaterThan(1.5);
    assertThat(broken.first().verdict().failure())
        .isEqualTo("ledger broken: layer at " + broken.first().values().get(0));
  }

  @Test
  void tooManyStopTheSearchWithEverythingKept() {
    SearchOutcome outcome =
        run(
            Problem.judged(
                x -> x[0] > -1.2 ? Verdict.failed("no solution") : Verdict.of(x[0], 0),
                box(2, -2, 2)));
    assertThat(outcome.stop()).isEqualTo(StopReason.FAILURES);
    assertThat(outcome.best()).isNotNull();
    assertThat(outcome.failureCount()).isGreaterThan(outcome.evaluations() / 2);
  }

  @Test
  void withoutAnyDesignThereIsNoBest() {
    SearchOutcome outcome = run(Problem.judged(x -> Verdict.failed("dead"), box(2, 0, 1)));
    assertThat(outcome.best()).isNull();
    assertThat(outcome.stop()).isEqualTo(StopReason.FAILURES);
  }
}
