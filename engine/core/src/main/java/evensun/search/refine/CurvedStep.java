package evensun.search.refine;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.stream.IntStream;
import org.apache.commons.math3.linear.Array2DRowRealMatrix;
import org.apache.commons.math3.linear.ArrayRealVector;
import org.apache.commons.math3.linear.LUDecomposition;
import org.apache.commons.math3.linear.SingularMatrixException;
import org.jspecify.annotations.Nullable;

/**
 * The best point when the tangents that the linear program found decisive hold as equations and the
 * curvature, learned from how the derivatives change, bends them. It ends the zigzag of linear
 * steps near an optimum that lies in no corner (sequential linear-quadratic programming: Byrd et
 * al., Math. Program. 100, 27 (2004); the curvature by damped BFGS updates: Powell, Lect. Notes
 * Math. 630, 144 (1978)).
 */
public final class CurvedStep {

  private final int size;
  private final int wanted;
  private final double[][] curvature;
  private final double[] weights;
  private boolean learned;

  CurvedStep(int size, int wanted, int kept) {
    this.size = size;
    this.wanted = wanted;
    curvature = new double[size][size];
    weights = new double[wanted + kept];
    Arrays.fill(weights, 0, wanted, 1.0 / wanted);
  }

  /**
   * The step to the best point.
   *
   * @param point [coordinate] where the tangents touch
   * @param linear [coordinate] the answer of the linear program
   * @param tangents [function] tangents at that answer, those wanted first
   * @return [coordinate] null when there is no such point or no curvature is known yet
   */
  double @Nullable [] best(
      double[] point, double[] rows, double[][] gradient, double[] linear, double[] tangents) {
    if (!learned) {
      return null;
    }
    int[] free = free(point, linear);
    List<Integer> active = active(tangents);
    while (!active.isEmpty() && active.get(0) < wanted && free.length > 0) {
      double[] solution = solve(rows, gradient, free, active);
      if (solution.length == 0) {
        return null;
      }
      int pushed = pushing(solution, free.length + 1, active);
      if (pushed < 0) {
        return target(point, solution, free, active);
      }
      active.remove(pushed);
    }
    return null;
  }

  /** A coordinate that stands on a wall and wants to stay there is not free. */
  private int[] free(double[] point, double[] linear) {
    return IntStream.range(0, size)
        .filter(j -> !((point[j] <= 0 || point[j] >= 1) && linear[j] == point[j]))
        .toArray();
  }

  private List<Integer> active(double[] tangents) {
    double smallest = Arrays.stream(tangents, 0, wanted).min().orElseThrow();
    List<Integer> active = new ArrayList<>();
    for (int i = 0; i < tangents.length; i++) {
      double above = i < wanted ? tangents[i] - smallest : tangents[i];
      if (above < 1e-8 * Math.max(1, Math.abs(smallest))) {
        active.add(i);
      }
    }
    return active;
  }

  /** Unknowns: the free coordinates of the step, the height t, one weight for each active row. */
  private double[] solve(double[] rows, double[][] gradient, int[] free, List<Integer> active) {
    int height = free.length;
    int count = height + 1 + active.size();
    double[][] matrix = new double[count][count];
    double[] right = new double[count];
    for (int a = 0; a < free.length; a++) {
      for (int b = 0; b < free.length; b++) {
        matrix[a][b] = curvature[free[a]][free[b]];
      }
    }
    for (int k = 0; k < active.size(); k++) {
      int row = active.get(k);
      int line = height + 1 + k;
      for (int a = 0; a < free.length; a++) {
        matrix[a][line] = -gradient[row][free[a]];
        matrix[line][a] = gradient[row][free[a]];
      }
      matrix[height][line] = row < wanted ? 1 : 0;
      matrix[line][height] = row < wanted ? -1 : 0;
      right[line] = -rows[row];
    }
    right[height] = 1;
    try {
      return new LUDecomposition(new Array2DRowRealMatrix(matrix, false), 1e-13)
          .getSolver()
          .solve(new ArrayRealVector(right, false))
          .toArray();
    } catch (SingularMatrixException dependent) {
      return new double[0];
    }
  }

  /** Index of the active row that holds the step back for no reason, -1 for none. */
  private static int pushing(double[] solution, int first, List<Integer> active) {
    int worst = -1;
    double least = -1e-12;
    for (int k = 0; k < active.size(); k++) {
      if (solution[first + k] < least) {
        least = solution[first + k];
        worst = k;
      }
    }
    return worst;
  }

  private double[] target(double[] point, double[] solution, int[] free, List<Integer> active) {
    Arrays.fill(weights, 0);
    for (int k = 0; k < active.size(); k++) {
      weights[active.get(k)] = solution[free.length + 1 + k];
    }
    double[] target = point.clone();
    for (int a = 0; a < free.length; a++) {
      target[free[a]] += solution[a];
    }
    return target;
  }

  /** Half of what the curvature takes from the promise of the tangents. */
  double bend(double[] from, double[] to) {
    double sum = 0;
    for (int i = 0; i < size; i++) {
      for (int j = 0; j < size; j++) {
        sum += curvature[i][j] * (to[i] - from[i]) * (to[j] - from[j]);
      }
    }
    return sum / 2;
  }

  /** Learns from a step, accepted or not. */
  void learn(double[] from, double[] to, double[][] gradientFrom, double[][] gradientTo) {
    double[] step = new double[size];
    double[] change = new double[size];
    for (int j = 0; j < size; j++) {
      step[j] = to[j] - from[j];
      for (int i = 0; i < weights.length; i++) {
        change[j] -= weights[i] * (gradientTo[i][j] - gradientFrom[i][j]);
      }
    }
    double length = dot(step, step);
    if (!(length > 1e-24)) {
      return;
    }
    if (!learned) {
      double first = Math.max(1e-3, Math.abs(dot(step, change)) / length);
      for (int j = 0; j < size; j++) {
        curvature[j][j] = first;
      }
      learned = true;
    }
    update(step, change);
  }

  private void update(double[] step, double[] change) {
    double[] bent = new double[size];
    for (int i = 0; i < size; i++) {
      bent[i] = dot(curvature[i], step);
    }
    double before = dot(step, bent);
    double seen = dot(step, change);
    double share = seen >= 0.2 * before ? 1 : 0.8 * before / (before - seen);
    double[] damped = new double[size];
    for (int i = 0; i < size; i++) {
      damped[i] = share * change[i] + (1 - share) * bent[i];
    }
    double after = dot(step, damped);
    if (!(before > 0 && after > 0)) {
      return;
    }
    for (int i = 0; i < size; i++) {
      for (int j = 0; j < size; j++) {
        curvature[i][j] += damped[i] * damped[j] / after - bent[i] * bent[j] / before;
      }
    }
  }

  private static double dot(double[] a, double[] b) {
    double sum = 0;
    for (int i = 0; i < a.length; i++) {
      sum += a[i] * b[i];
    }
    return sum;
  }
}
