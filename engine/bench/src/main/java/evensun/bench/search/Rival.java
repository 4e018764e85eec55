package evensun.bench.search;

import evensun.search.problem.Objective;
import evensun.search.problem.Space;
import evensun.search.problem.Verdict;
import java.util.Arrays;
import java.util.SplittableRandom;
import org.apache.commons.math3.exception.MathIllegalStateException;
import org.apache.commons.math3.optim.InitialGuess;
import org.apache.commons.math3.optim.MaxEval;
import org.apache.commons.math3.optim.MaxIter;
import org.apache.commons.math3.optim.SimpleBounds;
import org.apache.commons.math3.optim.SimpleValueChecker;
import org.apache.commons.math3.optim.nonlinear.scalar.GoalType;
import org.apache.commons.math3.optim.nonlinear.scalar.ObjectiveFunction;
import org.apache.commons.math3.optim.nonlinear.scalar.noderiv.CMAESOptimizer;
import org.apache.commons.math3.random.Well19937c;

/** Another method on the same problem, with a number of evaluations. */
final class Rival {

  private final Space space;
  private final Objective.Worker worker;
  private final SplittableRandom random;
  private int left;
  private double best = Double.NEGATIVE_INFINITY;

  private Rival(Objective problem, Objective.Worker worker, long seed, int evaluations) {
    this.space = new Space(problem.variables());
    this.worker = worker;
    this.random = new SplittableRandom(seed);
    this.left = evaluations;
  }

  /** Best value of plain random search. */
  static double random(Objective problem, long seed, int evaluations) {
    try (Objective.Worker worker = problem.newWorker()) {
      return new Rival(problem, worker, seed, evaluations).scatter();
    }
  }

  /**
   * Best value of Commons Math's CMA-ES from random starts; each restart doubles the cloud, the
   * usual remedy against many hills (Auger and Hansen, IEEE CEC 2005, 1769).
   */
  static double cloud(Objective problem, long seed, int evaluations) {
    try (Objective.Worker worker = problem.newWorker()) {
      return new Rival(problem, worker, seed, evaluations).clouds();
    }
  }

  private double value(double[] genes) {
    left--;
    Verdict verdict = worker.judge(space.values(genes));
    if (verdict.isFailure()) {
      return -1e300;
    }
    double value = verdict.aims().get(0);
    best = Math.max(best, value);
    return value;
  }

  private double[] point() {
    return random.doubles(space.size()).toArray();
  }

  private double scatter() {
    while (left > 0) {
      value(point());
    }
    return best;
  }

  private double clouds() {
    int size = 4 + (int) (3 * Math.log(space.size()));
    while (left > 2 * size) {
      cloud(size);
      size *= 2;
    }
    return scatter();
  }

  private void cloud(int size) {
    double[] sigma = new double[space.size()];
    Arrays.fill(sigma, 0.3);
    double[] high = new double[space.size()];
    Arrays.fill(high, 1);
    try {
      new CMAESOptimizer(
              left,
              0,
              true,
              0,
              1,
              new Well19937c(random.nextLong()),
              false,
              new SimpleValueChecker(1e-10, 1e-8))
          .optimize(
              new MaxEval(left),
              new MaxIter(left),
              new ObjectiveFunction(this::value),
              GoalType.MAXIMIZE,
              new InitialGuess(point()),
              new SimpleBounds(new double[space.size()], high),
              new CMAESOptimizer.Sigma(sigma),
              new CMAESOptimizer.PopulationSize(size));
    } catch (MathIllegalStateException spent) {
      // The evaluations are spent.
    }
  }
}
