package evensun.run;

import static org.assertj.core.api.Assertions.assertThat;

import evensun.search.problem.Candidate;
import evensun.search.problem.Objective;
import evensun.search.problem.Variable;
import evensun.search.problem.Verdict;
import java.util.List;
import org.junit.jupiter.api.Test;

/** Closed form of the objective: 20 − (x − 3)², highest at 3. */
class ChecksTest {

  private static Verdict hill(double x) {
    return Verdict.of(20 - (x - 3) * (x - 3), 0);
  }

  private static final Objective HILL = hill(0, 0);

  private static Objective hill(int more, long pauseMillis) {
    List<Variable> variables =
        java.util.stream.IntStream.rangeClosed(0, more)
            .mapToObj(i -> new Variable("x" + i, "nm", 0, 10, 0, 1))
            .toList();
    return new Objective() {
      @Override
      public List<Variable> variables() {
        return variables;
      }

      @Override
      public List<String> aims() {
        return List.of("hill");
      }

      @Override
      public Worker newWorker() {
        return values -> {
          pause(pauseMillis);
          return hill(values[0]);
        };
      }
    };
  }

  private static void pause(long millis) {
    try {
      Thread.sleep(millis);
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
    }
  }

  private static Checks check(double found) {
    return check(found, 0);
  }

  private static Checks check(double found, double negligible) {
    Candidate candidate = new Candidate(List.of(found), hill(found));
    return Checks.of(HILL, candidate, false, negligible, 1000, 1, () -> false);
  }

  @Test
  void theBestDesignStandsAgainstTheGrid() {
    Checks checks = check(3);
    assertThat(checks.outcome().complete()).isTrue();
    assertThat(checks.better()).isFalse();
  }

  @Test
  void theGridFindsWhatASearchMissed() {
    Checks checks = check(3.1); // 0.01 of 20 below, more than the tolerance of 0.002
    assertThat(checks.better()).isTrue();
    assertThat(checks.outcome().best().values().get(0))
        .isCloseTo(3, org.assertj.core.api.Assertions.within(1e-3));
    assertThat(check(3.04).better()).isFalse(); // 0.0016 below
    assertThat(check(3.1, 0.007).better()).isTrue(); // together 0.009
    assertThat(check(3.1, 0.009).better()).isFalse(); // together 0.011
  }

  @Test
  void aSlowGridIsNotTriedUnasked() {
    Candidate best = new Candidate(List.of(3.0), hill(3));
    assertThat(Checks.of(hill(0, 1), best, false, 0, 1000, 1, () -> false).outcome()).isNull();
  }

  @Test
  void fiveVariablesAreTooMany() {
    Candidate best = new Candidate(List.of(3.0, 1.0, 1.0, 1.0, 1.0), hill(3));
    assertThat(Checks.of(hill(4, 0), best, false, 0, 1000, 1, () -> false).outcome()).isNull();
  }

  @Test
  void aGridThatIsStoppedProvesNothing() {
    Candidate best = new Candidate(List.of(3.0), hill(3));
    Checks checks = Checks.of(HILL, best, true, 0, 1000, 1, () -> true);
    assertThat(checks.outcome().complete()).isFalse();
    assertThat(checks.better()).isFalse();
  }
}
