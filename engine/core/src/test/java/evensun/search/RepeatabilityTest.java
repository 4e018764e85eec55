package evensun.search;

import static evensun.search.Problem.box;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Witness throughout: the same search done in another way must end bit for bit the same. */
class RepeatabilityTest {

  private static final Problem PROBLEM = Problem.of(TestFunctions::rastrigin, box(4, -5.12, 5.12));
  private static final SearchSettings SETTINGS = SearchSettings.of(11, 4);

  private static SearchOutcome run(SearchSettings settings) {
    return new Search(PROBLEM, settings, SearchListener.NONE, () -> false).run();
  }

  @ParameterizedTest
  @ValueSource(ints = {2, 5})
  void threadsChangeNothing(int threads) {
    String alone = SearchStateCodec.write(run(SETTINGS).state());
    assertThat(SearchStateCodec.write(run(SETTINGS.withThreads(threads)).state())).isEqualTo(alone);
  }

  @Test
  void anotherSeedTakesAnotherWay() {
    SearchSettings other = SearchSettings.of(12, 4);
    assertThat(run(other).history()).isNotEqualTo(run(SETTINGS).history());
  }

  @Test
  void resumesAtAnyStepFromItsText() {
    List<String> states = new ArrayList<>();
    SearchOutcome whole = new Search(PROBLEM, SETTINGS, keeping(states), () -> false).run();
    Random random = new Random(3);
    for (int i = 0; i < 10; i++) {
      SearchState saved = SearchStateCodec.read(states.get(random.nextInt(states.size())));
      SearchOutcome resumed =
          new Search(PROBLEM, SETTINGS.withThreads(2), SearchListener.NONE, () -> false)
              .resume(saved);
      assertThat(resumed).isEqualTo(whole);
    }
  }

  private static SearchListener keeping(List<String> states) {
    return new SearchListener() {
      @Override
      public void state(SearchState state) {
        states.add(SearchStateCodec.write(state));
      }
    };
  }

  @Test
  void interruptedInTheMiddleOfAStepItResumesTheSame() {
    SearchOutcome whole = run(SETTINGS);
    for (int calls : List.of(3, 100, 777, 1500, 2501)) {
      PROBLEM.calls().set(0);
      SearchOutcome stopped =
          new Search(PROBLEM, SETTINGS, SearchListener.NONE, () -> PROBLEM.calls().get() >= calls)
              .run();
      assertThat(stopped.stop()).isEqualTo(StopReason.INTERRUPTED);
      assertThat(stopped.evaluations()).isLessThanOrEqualTo(calls);
      assertThat(
              new Search(PROBLEM, SETTINGS, SearchListener.NONE, () -> false)
                  .resume(stopped.state()))
          .isEqualTo(whole);
    }
  }

  @Test
  void refusesTheStateOfAnotherSearch() {
    SearchState other = run(SearchSettings.of(12, 4)).state();
    Search search = new Search(PROBLEM, SETTINGS, SearchListener.NONE, () -> false);
    assertThatThrownBy(() -> search.resume(other))
        .isInstanceOf(IllegalArgumentException.class)
        .isInstanceOf(ForeignStateException.class)
        .hasMessageContaining("another search");
  }

  @ParameterizedTest
  @ValueSource(strings = {"", "{}", "{\"format\": 2}", "[1", "{\"format\": 1, \"search\": \"x\"}"})
  void refusesBrokenText(String text) {
    assertThatThrownBy(() -> SearchStateCodec.read(text))
        .isInstanceOf(IllegalArgumentException.class);
  }

  @Test
  void reportsEveryEvaluationOnce() {
    PROBLEM.calls().set(0);
    assertThat(run(SETTINGS).evaluations()).isEqualTo(PROBLEM.calls().get());
  }

  @Test
  void aRunStoppedByTimeIsRepeatedByItsGenerations() {
    SearchOutcome timed = run(SETTINGS.withTimeSeconds(1e-9));
    assertThat(timed.stop()).isEqualTo(StopReason.TIME);
    assertThat(timed.generations()).isPositive();
    SearchOutcome again = run(SETTINGS.withGenerations(timed.generations()));
    assertThat(again.best()).isEqualTo(timed.best());
    assertThat(again.evaluations()).isEqualTo(timed.evaluations());
  }
}
