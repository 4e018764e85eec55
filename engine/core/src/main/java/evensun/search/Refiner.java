package evensun.search;

import evensun.search.SearchState.Individual;
import java.util.ArrayList;
import java.util.List;

/**
 * Improves distinct good designs one by one, each on one thread and with a budget of its own, so
 * that the result does not depend on the number of threads.
 */
final class Refiner {

  private static final double PENALTY = 1e3;

  private final Space space;
  private final Judges judges;
  private final int limits;
  private final long seed;

  Refiner(Space space, Judges judges, int limits, long seed) {
    this.space = space;
    this.judges = judges;
    this.limits = limits;
    this.seed = seed;
  }

  /**
   * The improved designs in the order of the starts; never worse than they were.
   *
   * @param floor see {@link Fitness#of}
   * @param evaluations budget for all of them
   */
  List<Individual> refine(List<Individual> starts, double floor, int evaluations, Tally tally) {
    int each = evaluations / Math.max(1, starts.size());
    List<LocalProblem> problems =
        judges.each(
            starts.size(),
            (worker, i) -> {
              LocalProblem problem =
                  new LocalProblem(space, judges, worker, starts.get(i), floor, each);
              improve(problem, i);
              return problem;
            });
    List<Individual> improved = new ArrayList<>();
    for (LocalProblem problem : problems) {
      tally.add(problem.tally());
      improved.add(problem.best());
    }
    return improved;
  }

  private void improve(LocalProblem problem, int index) {
    if (problem.stepped().length > 0) {
      relax(problem);
      new StepNeighbours(problem).descend();
    }
    int[] free = problem.continuous();
    if (free.length == 0) {
      return;
    }
    if (problem.worker().partCount() > 0 && climb(problem, free)) {
      return;
    }
    withoutDerivatives(problem, free, index);
  }

  /** Moves to the best design without regard to steps, then onto the nearest steps. */
  private void relax(LocalProblem problem) {
    int[] free = problem.ordered();
    if (problem.worker().partCount() > 0) {
      LocalModel model = new LocalModel(problem, free, limits);
      double[] end = solver(model, problem).climb(40);
      problem.judge(model.genesOf(end));
    }
  }

  private static MaxMinSolver solver(LocalModel model, LocalProblem problem) {
    double[] start = model.pointOf(problem.best().geneArray());
    return new MaxMinSolver(model, start, 0.05, PENALTY);
  }

  /** Climbs with derivatives; false when the worker has none after all. */
  private boolean climb(LocalProblem problem, int[] free) {
    LocalModel model = new LocalModel(problem, free, limits);
    double[] start = model.pointOf(problem.best().geneArray());
    double[] end = new MaxMinSolver(model, start, 0.05, PENALTY).climb(80);
    if (problem.tally().evaluations() == 0) {
      return false;
    }
    settle(problem, model, start, end);
    return true;
  }

  /** A climb may end a hair beyond a limit: steps back until every limit is kept. */
  private static void settle(LocalProblem problem, LocalModel model, double[] start, double[] end) {
    for (double back = 0; back < 0.1; back = Math.max(1e-7, 10 * back)) {
      double[] point = new double[end.length];
      for (int i = 0; i < point.length; i++) {
        point[i] = end[i] + back * (start[i] - end[i]);
      }
      Verdict verdict = problem.judge(model.genesOf(point));
      if (Fitness.of(verdict, problem.floor()).isFeasible()) {
        return;
      }
    }
  }

  private void withoutDerivatives(LocalProblem problem, int[] free, int index) {
    int share = Math.min(problem.left() / 2, 40 * (free.length + 1));
    new DerivativeFree(problem, free).quadratic(0.02, 1e-7, share);
    if (index < 2) {
      int most = Math.min(problem.left(), 300 * (free.length + 1));
      new DerivativeFree(problem, free).cloud(0.01, seed + index, most);
    }
  }
}
