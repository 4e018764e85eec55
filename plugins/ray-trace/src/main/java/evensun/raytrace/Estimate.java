package evensun.raytrace;

import java.util.Arrays;

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

  private final double[] rest; // [w] of one replicate

  Estimate(int rows, int wavelengths, int replicates) {
    mean = new double[rows][wavelengths];
    error = new double[rows][wavelengths];
    replicate = new double[replicates][rows][wavelengths];
    total = new double[wavelengths];
    rest = new double[wavelengths];
  }

  /**
   * Takes shares over.
   *
   * @param shares [replicate][row][w]
   */
  void take(double[][][] shares) {
    takeMeans(shares, replicate.length);
    for (int r = 0; r < replicate.length; r++) {
      spread(shares[r], replicate[r]);
    }
    for (int row = 0; row < mean.length; row++) {
      for (int w = 0; w < total.length; w++) {
        double corrected = mean[row][w] * (total[w] - 1);
        error[row][w] = Math.sqrt(variance(row, w) + corrected * corrected);
      }
    }
  }

  /** Takes over shares of which replicates were not told apart; errors stay what they were. */
  void takeTogether(double[][][] shares) {
    takeMeans(shares, 1);
  }

  private void takeMeans(double[][][] shares, int count) {
    Arrays.fill(total, 0);
    for (int row = 0; row < mean.length; row++) {
      Arrays.fill(mean[row], 0);
      for (int r = 0; r < count; r++) {
        add(shares[r][row], 1.0 / count, mean[row]);
      }
      add(mean[row], 1, total);
    }
    for (double[] row : mean) {
      for (int w = 0; w < total.length; w++) {
        row[w] /= total[w];
      }
    }
  }

  private static void add(double[] from, double times, double[] into) {
    for (int w = 0; w < into.length; w++) {
      into[w] += times * from[w];
    }
  }

  private void spread(double[][] shares, double[][] into) {
    Arrays.fill(rest, 1);
    for (double[] row : shares) {
      for (int w = 0; w < rest.length; w++) {
        rest[w] -= row[w] / total[w];
      }
    }
    for (int row = 0; row < into.length; row++) {
      for (int w = 0; w < rest.length; w++) {
        into[row][w] = shares[row][w] / total[w] + mean[row][w] * rest[w];
      }
    }
  }

  /** Square of the standard error that replicates tell. */
  double variance(int row, int w) {
    double squares = 0;
    for (double[][] rows : replicate) {
      double off = rows[row][w] - mean[row][w];
      squares += off * off;
    }
    return squares / (replicate.length * (replicate.length - 1.0));
  }
}
