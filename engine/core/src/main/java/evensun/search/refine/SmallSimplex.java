package evensun.search.refine;

/**
 * Small linear programs: c·x is maximised under A x ≤ b and x ≥ 0 with b ≥ 0, so that the origin is
 * a start. Dantzig's simplex method on a condensed tableau; the library's solver takes a hundred
 * times as long for the few unknowns of a trust region, which a climb solves at every step.
 */
public final class SmallSimplex {

  private static final double ZERO = 1e-11;

  private final int rows;
  private final int columns;
  private final double[][] tableau;
  private final int[] basic;
  private final int[] free;

  /**
   * A program of a size.
   *
   * @param rows number of inequalities
   * @param columns number of unknowns
   */
  SmallSimplex(int rows, int columns) {
    this.rows = rows;
    this.columns = columns;
    tableau = new double[rows + 1][columns + 1];
    basic = new int[rows];
    free = new int[columns];
  }

  /**
   * Solves a program.
   *
   * @param a [row][column]
   * @param b [row] at least 0
   * @param c [column]
   * @param x [column] out, the best corner that was reached
   */
  void maximise(double[][] a, double[] b, double[] c, double[] x) {
    load(a, b, c);
    int most = 20 * (rows + columns);
    for (int i = 0; i < most; i++) {
      int column = i < most / 2 ? steepest() : firstRising();
      int row = column < 0 ? -1 : tightest(column);
      if (row < 0) {
        break;
      }
      pivot(row, column);
    }
    store(x);
  }

  private void load(double[][] a, double[] b, double[] c) {
    for (int i = 0; i < rows; i++) {
      System.arraycopy(a[i], 0, tableau[i], 0, columns);
      tableau[i][columns] = b[i];
      basic[i] = columns + i;
    }
    for (int j = 0; j < columns; j++) {
      tableau[rows][j] = -c[j];
      free[j] = j;
    }
    tableau[rows][columns] = 0;
  }

  private int steepest() {
    int best = -1;
    double least = -ZERO;
    for (int j = 0; j < columns; j++) {
      if (tableau[rows][j] < least) {
        least = tableau[rows][j];
        best = j;
      }
    }
    return best;
  }

  /** Bland's rule, which cannot go round in circles. */
  private int firstRising() {
    int best = -1;
    for (int j = 0; j < columns; j++) {
      if (tableau[rows][j] < -ZERO && (best < 0 || free[j] < free[best])) {
        best = j;
      }
    }
    return best;
  }

  private int tightest(int column) {
    int best = -1;
    double least = Double.POSITIVE_INFINITY;
    for (int i = 0; i < rows; i++) {
      double slope = tableau[i][column];
      if (slope > ZERO) {
        double ratio = tableau[i][columns] / slope;
        if (ratio < least || ratio == least && basic[i] < basic[best]) {
          least = ratio;
          best = i;
        }
      }
    }
    return best;
  }

  private void pivot(int row, int column) {
    double[] pivotRow = tableau[row];
    double inverse = 1 / pivotRow[column];
    pivotRow[column] = 1;
    for (int j = 0; j <= columns; j++) {
      pivotRow[j] *= inverse;
    }
    for (int i = 0; i <= rows; i++) {
      if (i != row && tableau[i][column] != 0) {
        subtract(tableau[i], pivotRow, column);
      }
    }
    int leaving = basic[row];
    basic[row] = free[column];
    free[column] = leaving;
  }

  private static void subtract(double[] target, double[] pivotRow, int column) {
    double factor = target[column];
    target[column] = 0;
    for (int j = 0; j < target.length; j++) {
      target[j] -= factor * pivotRow[j];
    }
  }

  private void store(double[] x) {
    for (int j = 0; j < columns; j++) {
      x[j] = 0;
    }
    for (int i = 0; i < rows; i++) {
      if (basic[i] < columns) {
        x[basic[i]] = tableau[i][columns];
      }
    }
  }
}
