package evensun.search.refine;

import evensun.search.problem.Fitness;
import java.util.Arrays;
import org.apache.commons.math3.exception.MathIllegalArgumentException;
import org.apache.commons.math3.exception.MathIllegalStateException;
import org.apache.commons.math3.optim.InitialGuess;
import org.apache.commons.math3.optim.MaxEval;
import org.apache.commons.math3.optim.MaxIter;
import org.apache.commons.math3.optim.SimpleBounds;
import org.apache.commons.math3.optim.SimpleValueChecker;
import org.apache.commons.math3.optim.nonlinear.scalar.GoalType;
import org.apache.commons.math3.optim.nonlinear.scalar.ObjectiveFunction;
import org.apache.commons.math3.optim.nonlinear.scalar.noderiv.BOBYQAOptimizer;
import org.apache.commons.math3.optim.nonlinear.scalar.noderiv.CMAESOptimizer;
import org.apache.commons.math3.optim.univariate.BrentOptimizer;
import org.apache.commons.math3.optim.univariate.SearchInterval;
import org.apache.commons.math3.optim.univariate.UnivariateObjectiveFunction;
import org.apache.commons.math3.random.Well19937c;

/** Local methods that need values alone; the problem remembers the best design they meet. */
public final class DerivativeFree {

  /** The library ends at once for any other value that is never reached, such as infinity. */
  private static final double NO_TARGET = 0;

  private final LocalProblem problem;
  private final int[] free;
  private final double[] genes;
  private final double reference;

  public DerivativeFree(LocalProblem problem, int[] free) {
    this.problem = problem;
    this.free = free;
    genes = problem.best().geneArray();
    reference = problem.bestFitness().first;
  }

  /** A quadratic model in a trust region (BOBYQA); for one variable, Brent's method. */
  public void quadratic(double radius, double end, int evaluations) {
    if (evaluations < 2 * free.length + 10) {
      return;
    }
    if (free.length == 1) {
      line(radius, end, evaluations);
      return;
    }
    double[] point = point();
    try {
      new BOBYQAOptimizer(2 * free.length + 1, radius, end)
          .optimize(
              new MaxEval(evaluations),
              new ObjectiveFunction(this::value),
              GoalType.MAXIMIZE,
              new InitialGuess(point),
              box());
    } catch (MathIllegalStateException | MathIllegalArgumentException ended) {
      // The budget is spent or the model degenerated; the best design is kept either way.
    }
  }

  private void line(double radius, double end, int evaluations) {
    double from = genes[free[0]];
    double low = Math.max(0, from - radius);
    double high = Math.min(1, from + radius);
    try {
      new BrentOptimizer(1e-10, end)
          .optimize(
              new MaxEval(evaluations),
              new UnivariateObjectiveFunction(x -> value(new double[] {x})),
              GoalType.MAXIMIZE,
              new SearchInterval(low, high, Math.min(high, Math.max(low, from))));
    } catch (MathIllegalStateException ended) {
      // As above.
    }
  }

  /**
   * An adapting cloud (CMA-ES), which also follows kinks and bent valleys.
   *
   * @param seed seed of the cloud
   */
  void cloud(double width, long seed, int evaluations) {
    int size = 4 + (int) (3 * Math.log(free.length));
    if (evaluations < 5 * size || free.length < 2) {
      return;
    }
    double[] widths = new double[free.length];
    Arrays.fill(widths, width);
    try {
      new CMAESOptimizer(
              evaluations,
              NO_TARGET,
              true,
              0,
              1,
              new Well19937c(seed),
              false,
              new SimpleValueChecker(1e-13, 1e-9))
          .optimize(
              new MaxEval(evaluations),
              new MaxIter(evaluations),
              new ObjectiveFunction(this::value),
              GoalType.MAXIMIZE,
              new InitialGuess(point()),
              box(),
              new CMAESOptimizer.Sigma(widths),
              new CMAESOptimizer.PopulationSize(size));
    } catch (MathIllegalStateException | MathIllegalArgumentException ended) {
      // The budget is spent; the best design is kept.
    }
  }

  private SimpleBounds box() {
    double[] high = new double[free.length];
    Arrays.fill(high, 1);
    return new SimpleBounds(new double[free.length], high);
  }

  private double[] point() {
    return Arrays.stream(free).mapToDouble(i -> genes[i]).toArray();
  }

  /** One number to climb: broken limits pull it below every design that keeps them. */
  private double value(double[] point) {
    double[] all = genes.clone();
    for (int j = 0; j < free.length; j++) {
      all[free[j]] = Math.min(1, Math.max(0, point[j]));
    }
    Fitness fitness = Fitness.of(problem.judge(all), problem.floor());
    double scale = 100 * Math.max(1, Math.abs(reference));
    if (fitness.verdict.isFailure()) {
      return reference - 1e3 * scale;
    }
    return fitness.isFeasible()
        ? fitness.first
        : Math.min(fitness.first, reference) - scale * Math.min(10, fitness.violation);
  }
}
