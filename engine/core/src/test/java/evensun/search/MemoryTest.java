package evensun.search;

import static evensun.search.Problem.box;
import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import java.util.OptionalInt;
import org.junit.jupiter.api.Test;

/**
 * What a search keeps does not grow with its generations but for a line of history each. Witness: a
 * listener that keeps every state on purpose, which the same measurement must notice.
 */
class MemoryTest {

  private static final int EARLY = 100;
  private static final int LATE = 800;

  /** A record of history takes some 100 bytes, a kept population of 64 designs some 50,000. */
  private static final long ALLOWED_BYTES_PER_GENERATION = 3_000;

  private static final class Heap implements SearchListener {
    final List<SearchState> kept = new ArrayList<>();
    final boolean keeping;
    long early;
    long late;

    Heap(boolean keeping) {
      this.keeping = keeping;
    }

    @Override
    public void state(SearchState state) {
      if (keeping) {
        kept.add(state);
      }
      if (state.generation() == EARLY && early == 0) {
        early = liveBytes();
      } else if (state.generation() == LATE && late == 0) {
        late = liveBytes();
      }
    }

    long bytesPerGeneration() {
      return (late - early) / (LATE - EARLY);
    }

    private static long liveBytes() {
      Runtime runtime = Runtime.getRuntime();
      long least = Long.MAX_VALUE;
      for (int i = 0; i < 4; i++) {
        System.gc();
        least = Math.min(least, runtime.totalMemory() - runtime.freeMemory());
      }
      return least;
    }
  }

  private static long bytesPerGeneration(boolean keeping) {
    SearchSettings settings =
        new SearchSettings(
            4,
            2,
            new SearchSettings.Budget(10_000_000, OptionalDouble.empty(), OptionalInt.of(LATE + 1)),
            new SearchSettings.Effort(64, 1, LATE + 1, 0, 2, 0.5));
    Heap heap = new Heap(keeping);
    Problem problem = Problem.of(TestFunctions::rastrigin, box(6, -5.12, 5.12));
    SearchOutcome outcome = new Search(problem, settings, heap, () -> false).run();
    assertThat(outcome.generations()).isGreaterThanOrEqualTo(LATE);
    return heap.bytesPerGeneration();
  }

  @Test
  void staysTheSameOverGenerations() {
    assertThat(bytesPerGeneration(false)).isLessThan(ALLOWED_BYTES_PER_GENERATION);
  }

  @Test
  void theMeasurementWouldNoticeAPopulationThatIsKept() {
    assertThat(bytesPerGeneration(true)).isGreaterThan(3 * ALLOWED_BYTES_PER_GENERATION);
  }
}
