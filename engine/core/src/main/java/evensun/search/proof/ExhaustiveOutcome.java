package evensun.search.proof;

import evensun.search.problem.Candidate;
import java.util.List;
import org.jspecify.annotations.Nullable;

/**
 * What a look at every point of a grid found.
 *
 * @param bestOnGrid the best point of the grid; null when none could be evaluated
 * @param best the best design after the best distinct points were refined
 * @param points number of points of each variable
 * @param evaluations designs evaluated, refinement included
 * @param failureCount designs that could not be evaluated
 * @param complete whether the whole grid was seen; false when it was interrupted
 */
public record ExhaustiveOutcome(
    @Nullable Candidate bestOnGrid,
    @Nullable Candidate best,
    List<Integer> points,
    long evaluations,
    int failureCount,
    boolean complete) {

  public ExhaustiveOutcome {
    points = List.copyOf(points);
  }
}
