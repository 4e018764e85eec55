package evensun.search.refine;

import evensun.search.problem.Individual;
import evensun.search.problem.Judges;
import evensun.search.problem.KeptAims;
import evensun.search.problem.Objective;
import evensun.search.problem.Space;
import evensun.search.problem.Tally;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.IntStream;

/**
 * Raises the first aim of every design of a front while the other aims of that design are kept (the
 * ε-constraint method: Haimes, Lasdon and Wismer, IEEE Trans. Syst. Man Cybern. 1, 296 (1971)).
 */
public final class FrontRefiner {

  /**
   * A climb whose evaluations are spent still takes the slopes of its last step and the way back
   * behind the limits.
   */
  private static final int LAST_STEPS = 12;

  private final Objective objective;
  private final Space space;
  private final Judges judges;
  private final Refiner refiner;

  /**
   * A refiner.
   *
   * @param objective with several aims
   * @param judges workers of the objective
   */
  public FrontRefiner(Objective objective, Space space, Judges judges, long seed) {
    this.objective = objective;
    this.space = space;
    this.judges = judges;
    int limits = objective.limits().size() + objective.aims().size() - 1;
    refiner = new Refiner(space, judges, limits, seed);
  }

  /**
   * The improved designs, each at least as good in every aim as the one whose place it takes; fewer
   * than the front has where the evaluations are few.
   *
   * @param starts where to start from for each of them
   * @param front designs that keep all limits, whose further aims are kept
   * @param evaluations budget for all of them
   */
  public List<Individual> refine(
      List<Individual> starts, List<Individual> front, int evaluations, Tally tally) {
    int[] picked = picked(front.size(), evaluations);
    int each = evaluations / Math.max(1, picked.length);
    List<LocalProblem> problems =
        judges.each(
            picked.length,
            (worker, i) -> improved(starts.get(picked[i]), front.get(picked[i]), worker, each));
    List<Individual> improved = new ArrayList<>();
    for (int i = 0; i < problems.size(); i++) {
      tally.add(problems.get(i).tally());
      Individual best = problems.get(i).best();
      KeptAims kept = new KeptAims(objective, front.get(picked[i]).verdict());
      improved.add(new Individual(best.birth(), best.genes(), kept.released(best.verdict())));
    }
    return improved;
  }

  /** Places spread evenly over the front, as many as there are evaluations for. */
  private int[] picked(int places, int evaluations) {
    int count = Math.min(places, evaluations / (2 * lastSteps()));
    return IntStream.range(0, count).map(i -> (int) ((long) i * places / count)).toArray();
  }

  private int lastSteps() {
    return space.size() + LAST_STEPS;
  }

  private LocalProblem improved(
      Individual from, Individual place, Objective.Worker worker, int evaluations) {
    KeptAims kept = new KeptAims(objective, place.verdict());
    Individual start = new Individual(from.birth(), from.genes(), kept.kept(from.verdict()));
    int climb = worker.partCount() > 0 ? evaluations - lastSteps() : evaluations;
    LocalProblem problem =
        new LocalProblem(space, judges, kept.on(worker), start, Double.NEGATIVE_INFINITY, climb);
    refiner.improve(problem);
    return problem;
  }
}
