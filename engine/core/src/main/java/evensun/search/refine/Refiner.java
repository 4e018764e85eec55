package evensun.search.refine;

import evensun.search.problem.Fitness;
import evensun.search.problem.Individual;
import evensun.search.problem.Judges;
import evensun.search.problem.Optima;
import evensun.search.problem.Space;
import evensun.search.problem.Tally;
import evensun.search.problem.Verdict;
import java.util.ArrayList;
import java.util.List;

/**
 * Improves distinct good designs one by one, each on one thread and with a budget of its own, so
 * that the result does not depend on the number of threads.
 */
public final class Refiner {

  private static final double PENALTY = 1e3;
  private static final double DISTINCT = 0.03;
  private static final int POLISHED = 8;
  private static final int CLOUDS = 1;

  private final Space space;
  private final Judges judges;
  private final int limits;
  private final long seed;

  public Refiner(Space space, Judges judges, int limits, long seed) {
    this.space = space;
    this.judges = judges;
    this.limits = limits;
    this.seed = seed;
  }

  /**
   * The designs that come of the best of the starts, never worse than they were: all are improved
   * roughly, and those that are then the best distinct ones to the end.
   *
   * @param floor see {@link Fitness#of}
   * @param evaluations budget for all of them
   */
  public List<Individual> refine(
      List<Individual> starts, double floor, int evaluations, Tally tally) {
    int before = tally.evaluations();
    List<Individual> rough = pass(starts, floor, evaluations / 2, tally, Effort.ROUGH);
    List<Individual> chosen = Optima.distinct(space, rough, floor, DISTINCT, POLISHED);
    int left = evaluations - (tally.evaluations() - before);
    return pass(chosen, floor, left, tally, Effort.FULL);
  }

  private List<Individual> pass(
      List<Individual> starts, double floor, int evaluations, Tally tally, Effort effort) {
    int each = evaluations / Math.max(1, starts.size());
    List<LocalProblem> problems =
        judges.each(
            starts.size(),
            (worker, i) -> {
              LocalProblem problem =
                  new LocalProblem(space, judges, worker, starts.get(i), floor, each);
              improve(problem, i, effort);
              return problem;
            });
    List<Individual> improved = new ArrayList<>();
    for (LocalProblem problem : problems) {
      tally.add(problem.tally());
      improved.add(problem.best());
    }
    return improved;
  }

  /** How much one design is worth. */
  private enum Effort {
    ROUGH(12, 4e-3, 4),
    FULL(80, 2e-6, 40);

    final int steps;
    final double smallest;
    final int evaluationsPerVariable;

    Effort(int steps, double smallest, int evaluationsPerVariable) {
      this.steps = steps;
      this.smallest = smallest;
      this.evaluationsPerVariable = evaluationsPerVariable;
    }
  }

  /** Improves one design to the end. */
  void improve(LocalProblem problem) {
    improve(problem, 0, Effort.FULL);
  }

  private void improve(LocalProblem problem, int index, Effort effort) {
    if (problem.stepped().length > 0) {
      relax(problem, effort);
      if (effort == Effort.FULL) {
        new StepNeighbours(problem).descend();
      }
    }
    int[] free = problem.continuous();
    if (free.length == 0) {
      return;
    }
    if (problem.worker().partCount() > 0 && climb(problem, free, effort)) {
      return;
    }
    withoutDerivatives(problem, free, index, effort);
  }

  /** Moves to the best design without regard to steps, then onto the nearest steps. */
  private void relax(LocalProblem problem, Effort effort) {
    int[] free = problem.ordered();
    if (problem.worker().partCount() > 0) {
      LocalModel model = new LocalModel(problem, free, limits);
      double[] start = model.pointOf(problem.best().geneArray());
      double[] end = climbed(model, start, effort);
      problem.judge(model.genesOf(end));
    }
  }

  private static double[] climbed(LocalModel model, double[] start, Effort effort) {
    double radius = effort == Effort.ROUGH ? 0.05 : 0.01;
    return new MaxMinSolver(model, start, radius, PENALTY).climb(effort.steps, effort.smallest);
  }

  /** Climbs with derivatives; false when the worker has none after all. */
  private boolean climb(LocalProblem problem, int[] free, Effort effort) {
    LocalModel model = new LocalModel(problem, free, limits);
    double[] start = model.pointOf(problem.best().geneArray());
    double[] end = climbed(model, start, effort);
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

  private void withoutDerivatives(LocalProblem problem, int[] free, int index, Effort effort) {
    int share = Math.min(problem.left() / 2, effort.evaluationsPerVariable * (free.length + 1));
    boolean rough = effort == Effort.ROUGH;
    new DerivativeFree(problem, free).quadratic(rough ? 0.03 : 0.01, rough ? 1e-3 : 1e-7, share);
    if (!rough && index < CLOUDS) {
      int most = Math.min(problem.left(), 100 * (free.length + 1));
      new DerivativeFree(problem, free).cloud(0.01, seed + index, most);
    }
  }
}
