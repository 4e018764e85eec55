package evensun.run;

import evensun.result.SearchRecord;
import evensun.search.problem.Candidate;
import evensun.search.problem.Objective;
import evensun.search.proof.Exhaustive;
import evensun.search.proof.ExhaustiveOutcome;
import evensun.search.proof.StepCost;
import java.util.OptionalDouble;
import java.util.function.BooleanSupplier;
import org.jspecify.annotations.Nullable;

/**
 * Checks of a finished search: an exhaustive grid, and what the steps of the tool cost.
 *
 * @param outcome what the grid found; null where none was tried
 * @param better whether it found something better
 * @param asked whether the grid was asked for
 * @param stepCost in the unit of the aim; null where nothing stands on steps
 */
record Checks(
    @Nullable ExhaustiveOutcome outcome, boolean better, boolean asked, @Nullable Double stepCost) {

  static final Checks NONE = new Checks(null, false, false, null);

  /** Points of a grid that nobody asked for. */
  private static final long USUAL_POINTS = 20_000;

  /** Points of a grid that was asked for. */
  private static final long ASKED_POINTS = 200_000;

  /** A grid that takes less is tried unasked. */
  private static final double UNASKED_SECONDS = 2;

  /** Designs are timed so often; the shortest counts, which other programs disturb least. */
  private static final int TIMED = 20;

  /** A grid that is better by less than this part of the aim has found the same. */
  private static final double TOLERANCE = 1e-4;

  /**
   * Checks a design.
   *
   * @param asked whether a grid is to be tried whatever time it takes
   * @param negligible gain in the unit of the aim that makes no other design
   * @param evaluations roughly the most that the cost of steps may take
   */
  static Checks of(
      Objective objective,
      Candidate best,
      boolean asked,
      double negligible,
      int evaluations,
      int threads,
      BooleanSupplier cancelled) {
    OptionalDouble cost =
        best.isFeasible()
            ? StepCost.of(objective, best, threads, evaluations, cancelled)
            : OptionalDouble.empty();
    Double stepCost = cost.isPresent() ? cost.getAsDouble() : null;
    boolean affordable = objective.variables().size() <= Exhaustive.MOST_VARIABLES;
    if (!affordable || !asked && seconds(objective, best) > UNASKED_SECONDS) {
      return new Checks(null, false, false, stepCost);
    }
    Exhaustive exhaustive = new Exhaustive(objective, threads, cancelled);
    ExhaustiveOutcome grid = exhaustive.run(exhaustive.points(asked ? ASKED_POINTS : USUAL_POINTS));
    double alike = negligible + objective.tieResolution() + TOLERANCE * Math.abs(best.aim());
    return new Checks(grid, isBetter(grid.best(), best, alike), asked, stepCost);
  }

  /** How long a usual grid takes on one thread. */
  private static double seconds(Objective objective, Candidate best) {
    long shortest = Long.MAX_VALUE;
    try (Objective.Worker worker = objective.newWorker()) {
      for (int i = 0; i < TIMED; i++) {
        long start = System.nanoTime();
        worker.judge(best.toArray());
        shortest = Math.min(shortest, System.nanoTime() - start);
      }
    }
    return shortest * 1e-9 * USUAL_POINTS;
  }

  private static boolean isBetter(@Nullable Candidate grid, Candidate best, double alike) {
    if (grid == null || !grid.isFeasible()) {
      return false;
    }
    return !best.isFeasible() || grid.aim() > best.aim() + alike;
  }

  SearchRecord.@Nullable Grid grid(SearchRecords records) {
    return outcome == null
        ? null
        : new SearchRecord.Grid(
            outcome.points(),
            outcome.evaluations(),
            outcome.best() == null ? null : records.optimum(outcome.best()),
            better,
            outcome.complete(),
            asked);
  }
}
