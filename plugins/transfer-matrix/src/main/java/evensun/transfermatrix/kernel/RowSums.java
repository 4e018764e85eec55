package evensun.transfermatrix.kernel;

/** Sums over wavelengths, in four strands so that additions need not wait for each other. */
public final class RowSums {

  private RowSums() {}

  /** Sum of a row. */
  static double total(double[] row) {
    double a = 0;
    double b = 0;
    double c = 0;
    double d = 0;
    int w = 0;
    for (; w + 3 < row.length; w += 4) {
      a += row[w];
      b += row[w + 1];
      c += row[w + 2];
      d += row[w + 3];
    }
    for (; w < row.length; w++) {
      a += row[w];
    }
    return (a + b) + (c + d);
  }

  /** Sum of the products of two rows of one length. */
  public static double dot(double[] x, double[] y) {
    double a = 0;
    double b = 0;
    double c = 0;
    double d = 0;
    int w = 0;
    for (; w + 3 < y.length; w += 4) {
      a += x[w] * y[w];
      b += x[w + 1] * y[w + 1];
      c += x[w + 2] * y[w + 2];
      d += x[w + 3] * y[w + 3];
    }
    for (; w < y.length; w++) {
      a += x[w] * y[w];
    }
    return (a + b) + (c + d);
  }
}
