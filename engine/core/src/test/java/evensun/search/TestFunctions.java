package evensun.search;

/**
 * Standard test functions of global optimisation, negated: their largest value is 0. Formulas:
 * Rastrigin, Ackley, Schwefel and Rosenbrock as in the survey of Jamil and Yang, Int. J. Math.
 * Model. Numer. Optim. 4, 150 (2013).
 */
public final class TestFunctions {

  private TestFunctions() {}

  /** On [-5.12, 5.12]; 0 at the origin. */
  public static double rastrigin(double[] x) {
    double sum = 10 * x.length;
    for (double v : x) {
      sum += v * v - 10 * Math.cos(2 * Math.PI * v);
    }
    return -sum;
  }

  /** On [-32.768, 32.768]; 0 at the origin. */
  public static double ackley(double[] x) {
    double squares = 0;
    double cosines = 0;
    for (double v : x) {
      squares += v * v;
      cosines += Math.cos(2 * Math.PI * v);
    }
    int n = x.length;
    return 20 * Math.exp(-0.2 * Math.sqrt(squares / n)) + Math.exp(cosines / n) - 20 - Math.E;
  }

  /** On [-500, 500]; 0 at 420.968746 in every variable. */
  public static double schwefel(double[] x) {
    double sum = 418.9828872724339 * x.length;
    for (double v : x) {
      sum -= v * Math.sin(Math.sqrt(Math.abs(v)));
    }
    return -sum;
  }

  /** On [-5, 10]; 0 at one in every variable. */
  public static double rosenbrock(double[] x) {
    double sum = 0;
    for (int i = 0; i + 1 < x.length; i++) {
      double valley = x[i + 1] - x[i] * x[i];
      sum += 100 * valley * valley + (1 - x[i]) * (1 - x[i]);
    }
    return -sum;
  }

  /**
   * The smaller of two Rastrigin functions, shifted by half a period to either side, on [-5.12,
   * 5.12]: its optimum lies on the kink between them.
   */
  public static double kinked(double[] x) {
    double[] left = x.clone();
    double[] right = x.clone();
    for (int i = 0; i < x.length; i++) {
      left[i] -= 0.5;
      right[i] += 0.5;
    }
    return Math.min(rastrigin(left), rastrigin(right));
  }
}
