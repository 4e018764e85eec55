package evensun.search;

import evensun.search.problem.Candidate;
import evensun.search.problem.FailureRecord;
import java.util.List;

/**
 * What a search for several aims found.
 *
 * @param front designs none of which is better in every aim, in the order of falling first aim
 * @param knee index into the front of the best compromise; -1 when the front is empty
 * @param stop why it stopped
 * @param generations generations
 * @param evaluations designs evaluated
 * @param failureCount designs that could not be evaluated
 * @param failures one entry per kind of failure
 * @param history one entry per generation; its best is that of the first aim
 * @param state where the search stands
 */
public record ParetoOutcome(
    List<Candidate> front,
    int knee,
    StopReason stop,
    int generations,
    int evaluations,
    int failureCount,
    List<FailureRecord> failures,
    List<GenerationRecord> history,
    SearchState state) {

  public ParetoOutcome {
    front = List.copyOf(front);
    failures = List.copyOf(failures);
    history = List.copyOf(history);
  }
}
