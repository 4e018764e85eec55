package evensun.search.refine;

import java.util.Arrays;

/**
 * The best point of a small box when every function is replaced by its tangent. The unknowns of the
 * linear program are the distances y from the lower walls of the box, the height t of the smallest
 * function above what no point of the box falls below, and how much σ of the largest possible
 * breach is avoided, all at least 0; t + penalty · σ is maximised. Written so, the origin is
 * feasible.
 */
public final class LinearStep {

  private final int size;
  private final int wanted;
  private final int kept;
  private final double penalty;
  private final SmallSimplex simplex;
  private final double[][] a;
  private final double[] b;
  private final double[] c;
  private final double[] x;
  private double gain;

  LinearStep(int size, int wanted, int kept, double penalty) {
    this.size = size;
    this.wanted = wanted;
    this.kept = kept;
    this.penalty = penalty;
    int rows = wanted + kept + size + 1;
    simplex = new SmallSimplex(rows, size + 2);
    a = new double[rows][size + 2];
    b = new double[rows];
    c = new double[size + 2];
    x = new double[size + 2];
  }

  /** What the tangents promised for the last point, in the unit of the merit. */
  double gain() {
    return gain;
  }

  /**
   * The best point.
   *
   * @param point [coordinate] middle of the box
   * @param rows [function] values there, those wanted first
   * @param gradient [function][coordinate] derivatives there
   * @param radius half the side of the box
   */
  double[] best(double[] point, double[] rows, double[][] gradient, double radius) {
    double[] low = new double[size];
    double[] span = new double[size];
    for (int j = 0; j < size; j++) {
      low[j] = Math.max(0, point[j] - radius);
      span[j] = Math.min(1, point[j] + radius) - low[j];
    }
    set(point, rows, gradient, low, span);
    simplex.maximise(a, b, c, x);
    double[] target = new double[size];
    for (int j = 0; j < size; j++) {
      target[j] = Math.min(1, Math.max(0, low[j] + Math.min(span[j], Math.max(0, x[j]))));
    }
    gain = merit(tangents(target, point, rows, gradient)) - merit(rows);
    return target;
  }

  private void set(
      double[] point, double[] rows, double[][] gradient, double[] low, double[] span) {
    double worstBreach = 0;
    double bottom = Double.POSITIVE_INFINITY;
    for (int i = 0; i < wanted + kept; i++) {
      b[i] = rows[i];
      for (int j = 0; j < size; j++) {
        a[i][j] = -gradient[i][j];
        b[i] += gradient[i][j] * (low[j] - point[j]);
      }
      a[i][size] = i < wanted ? 1 : 0;
      a[i][size + 1] = i < wanted ? 0 : 1;
      bottom = i < wanted ? Math.min(bottom, b[i]) : bottom;
      worstBreach = i < wanted ? worstBreach : Math.max(worstBreach, -b[i]);
    }
    bottom -= largestFall(gradient, span);
    for (int i = 0; i < wanted + kept; i++) {
      b[i] += i < wanted ? -bottom : worstBreach;
    }
    setWalls(span, worstBreach);
    c[size] = 1;
    c[size + 1] = penalty;
  }

  private void setWalls(double[] span, double worstBreach) {
    int first = wanted + kept;
    for (int j = 0; j <= size; j++) {
      Arrays.fill(a[first + j], 0);
      a[first + j][j < size ? j : size + 1] = 1;
      b[first + j] = j < size ? span[j] : worstBreach;
    }
  }

  /** Without it, the height t could not be zero and the origin not a start. */
  private double largestFall(double[][] gradient, double[] span) {
    double largest = 0;
    for (int i = 0; i < wanted; i++) {
      double fall = 0;
      for (int j = 0; j < size; j++) {
        fall += Math.max(0, -gradient[i][j]) * span[j];
      }
      largest = Math.max(largest, fall);
    }
    return largest;
  }

  /** The tangents of all functions at a point. */
  double[] tangents(double[] target, double[] point, double[] rows, double[][] gradient) {
    double[] tangents = rows.clone();
    for (int i = 0; i < tangents.length; i++) {
      for (int j = 0; j < size; j++) {
        tangents[i] += gradient[i][j] * (target[j] - point[j]);
      }
    }
    return tangents;
  }

  /** The smallest of the wanted, less the price of the largest breach. */
  double merit(double[] rows) {
    double smallest = Double.POSITIVE_INFINITY;
    double breach = 0;
    for (int i = 0; i < rows.length; i++) {
      smallest = i < wanted ? Math.min(smallest, rows[i]) : smallest;
      breach = i < wanted ? breach : Math.max(breach, -rows[i]);
    }
    return smallest - penalty * breach;
  }
}
