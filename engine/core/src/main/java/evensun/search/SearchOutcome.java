package evensun.search;

import evensun.search.problem.Candidate;
import evensun.search.problem.FailureRecord;
import java.util.List;
import org.jspecify.annotations.Nullable;

/**
 * What a search found.
 *
 * @param best the best design; null when no design could be evaluated
 * @param stop why it stopped
 * @param generations generations over all rounds
 * @param evaluations designs evaluated
 * @param failureCount designs that could not be evaluated
 * @param failures one entry per kind of failure, in the order in which they were met
 * @param history one entry per generation
 * @param refinementGain what the local refinement, and the combining of what it found, added to the
 *     best first aim of the genetic algorithm alone
 * @param optima distinct good designs, best first
 * @param roundBests best first aim of each round, for the spread over restarts
 * @param state where the search stands; a resumed search continues from it
 */
public record SearchOutcome(
    @Nullable Candidate best,
    StopReason stop,
    int generations,
    int evaluations,
    int failureCount,
    List<FailureRecord> failures,
    List<GenerationRecord> history,
    double refinementGain,
    List<Candidate> optima,
    List<Double> roundBests,
    SearchState state) {

  static SearchOutcome of(
      SearchState state, StopReason stop, @Nullable Candidate best, List<Candidate> optima) {
    double gain = state.bestAim() - state.unrefinedBest();
    return new SearchOutcome(
        best,
        stop,
        state.generation(),
        state.evaluations(),
        state.failureCount(),
        state.failures(),
        state.history(),
        Double.isNaN(gain) ? 0 : Math.max(0, gain),
        optima,
        state.roundBests(),
        state);
  }

  public SearchOutcome {
    failures = List.copyOf(failures);
    history = List.copyOf(history);
    optima = List.copyOf(optima);
    roundBests = List.copyOf(roundBests);
  }
}
