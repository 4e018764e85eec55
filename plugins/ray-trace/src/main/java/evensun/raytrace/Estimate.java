package evensun.raytrace;

/**
 * Means and errors of replicates, made to add up to one.
 *
 * <p>All light is reflected, transmitted or absorbed, so that the true total is known to be 1:
 * means are divided by the total that was found, and each replicate's part of that correction goes
 * along (the usual estimator of a ratio, linearised). The correction counts as an error of a
 * spectrum, since light let go by every lot shows in nothing else. Owned by one thread.
 */
final class Estimate {

  /** [row][w] means. */
  final double[][] mean;

  /** [row][w] their standard errors. */
  final double[][] error;

  /** [replicate][row][w] what each replicate says; their mean is the mean. */
  final double[][][] replicate;

  /** [w] total before the correction. */
  final double[] total;

  Estimate(int rows, int wavelengths, int replicates) {
    mean = new double[rows][wavelengths];
    error = new double[rows][wavelengths];
    replicate = new double[replicates][rows][wavelengths];
    total = new double[wavelengths];
  }

  /**
   * Takes shares over.
   *
   * @param shares [w][replicate][row]
   */
  void take(double[][][] shares) {
    for (int w = 0; w < total.length; w++) {
      take(w, shares[w]);
    }
  }

  private void take(int w, double[][] shares) {
    int count = replicate.length;
    total[w] = 0;
    for (int row = 0; row < mean.length; row++) {
      double sum = 0;
      for (int r = 0; r < count; r++) {
        sum += shares[r][row];
      }
      mean[row][w] = sum / count;
      total[w] += mean[row][w];
    }
    for (int row = 0; row < mean.length; row++) {
      mean[row][w] /= total[w];
    }
    for (int r = 0; r < count; r++) {
      double rest = 1 - total(shares[r]) / total[w];
      for (int row = 0; row < mean.length; row++) {
        replicate[r][row][w] = shares[r][row] / total[w] + mean[row][w] * rest;
      }
    }
    for (int row = 0; row < mean.length; row++) {
      error[row][w] = error(row, w);
    }
  }

  private static double total(double[] shares) {
    double sum = 0;
    for (double share : shares) {
      sum += share;
    }
    return sum;
  }

  private double error(int row, int w) {
    double squares = 0;
    for (double[][] rows : replicate) {
      double off = rows[row][w] - mean[row][w];
      squares += off * off;
    }
    double variance = squares / (replicate.length * (replicate.length - 1.0));
    double corrected = mean[row][w] * (total[w] - 1);
    return Math.sqrt(variance + corrected * corrected);
  }
}
