package evensun.search.refine;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Random;
import org.apache.commons.math3.optim.linear.LinearConstraint;
import org.apache.commons.math3.optim.linear.LinearConstraintSet;
import org.apache.commons.math3.optim.linear.LinearObjectiveFunction;
import org.apache.commons.math3.optim.linear.NonNegativeConstraint;
import org.apache.commons.math3.optim.linear.Relationship;
import org.apache.commons.math3.optim.linear.SimplexSolver;
import org.apache.commons.math3.optim.nonlinear.scalar.GoalType;
import org.junit.jupiter.api.Test;

class MaxMinSolverTest {

  /** Witness: the linear programs solved by Commons Math. */
  @Test
  void smallProgramsAgreeWithTheLibrary() {
    Random random = new Random(1);
    for (int trial = 0; trial < 300; trial++) {
      int columns = 2 + random.nextInt(12);
      int rows = columns + 1 + random.nextInt(4);
      double[][] a = new double[rows][columns];
      double[] b = new double[rows];
      for (int i = 0; i < rows; i++) {
        b[i] = i < columns ? 1 : random.nextInt(4) == 0 ? 0 : random.nextDouble();
        for (int j = 0; j < columns; j++) {
          a[i][j] = i < columns ? (i == j ? 1 : 0) : random.nextGaussian();
        }
      }
      double[] c = random.doubles(columns, -1, 1).toArray();
      double[] x = new double[columns];
      new SmallSimplex(rows, columns).maximise(a, b, c, x);
      assertThat(dot(c, x)).isCloseTo(library(a, b, c), within(1e-9));
      for (int i = 0; i < rows; i++) {
        assertThat(dot(a[i], x)).isLessThanOrEqualTo(b[i] + 1e-9);
      }
    }
  }

  private static double library(double[][] a, double[] b, double[] c) {
    List<LinearConstraint> constraints = new ArrayList<>();
    for (int i = 0; i < b.length; i++) {
      constraints.add(new LinearConstraint(a[i], Relationship.LEQ, b[i]));
    }
    return new SimplexSolver()
        .optimize(
            new LinearObjectiveFunction(c, 0),
            new LinearConstraintSet(constraints),
            GoalType.MAXIMIZE,
            new NonNegativeConstraint(true))
        .getValue();
  }

  private static double dot(double[] a, double[] b) {
    double sum = 0;
    for (int i = 0; i < a.length; i++) {
      sum += a[i] * b[i];
    }
    return sum;
  }

  /**
   * Two bowls, upside down, around (0.2, 0.4) and (0.8, 0.4). Witness: by symmetry the best point
   * of the smaller is half-way, at (0.5, 0.4).
   */
  private static final class Bowls implements MaxMinModel {
    private final double lowestX;

    Bowls(double lowestX) {
      this.lowestX = lowestX;
    }

    @Override
    public int size() {
      return 2;
    }

    @Override
    public int wanted() {
      return 2;
    }

    @Override
    public int kept() {
      return 1;
    }

    @Override
    public boolean at(double[] p, double[] rows, double[][] gradient) {
      for (int i = 0; i < 2; i++) {
        double dx = p[0] - (i == 0 ? 0.2 : 0.8);
        double dy = p[1] - 0.4;
        rows[i] = -dx * dx - 3 * dy * dy;
        gradient[i] = new double[] {-2 * dx, -6 * dy};
      }
      rows[2] = p[0] - lowestX;
      gradient[2] = new double[] {1, 0};
      return true;
    }
  }

  @Test
  void findsTheKink() {
    double[] end =
        new MaxMinSolver(new Bowls(-1), new double[] {0.05, 0.9}, 0.05, 1e3).climb(80, 2e-6);
    assertThat(end[0]).isCloseTo(0.5, within(1e-6));
    assertThat(end[1]).isCloseTo(0.4, within(1e-3));
  }

  /** Witness: with x at least 0.7 the farther bowl decides, and it falls with x: x = 0.7. */
  @Test
  void stopsAtALimitEvenWhenItStartsBeyond() {
    double[] end =
        new MaxMinSolver(new Bowls(0.7), new double[] {0.05, 0.9}, 0.05, 1e3).climb(80, 2e-6);
    assertThat(end[0]).isCloseTo(0.7, within(1e-6));
    assertThat(end[1]).isCloseTo(0.4, within(1e-3));
  }

  @Test
  void anUnusableStartIsReturned() {
    MaxMinModel broken = new Bowls(Double.NaN);
    double[] start = {0.3, 0.3};
    assertThat(new MaxMinSolver(broken, start, 0.05, 1e3).climb(80, 2e-6)).isEqualTo(start);
    assertThat(Arrays.stream(start).sum()).isCloseTo(0.6, within(1e-12));
  }
}
