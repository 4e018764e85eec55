package evensun.raytrace;

import evensun.spi.Problem;

/**
 * A share of the light as a photon current.
 *
 * @param value in mA cm⁻²
 * @param error its standard error
 */
record Current(double value, double error) {

  /** The current of a row of an estimate; errors at different wavelengths go together. */
  static Current of(Problem problem, Estimate estimate, int row) {
    double value = current(problem, estimate.mean[row]);
    double squares = 0;
    for (double[][] rows : estimate.replicate) {
      double off = current(problem, rows[row]) - value;
      squares += off * off;
    }
    int count = estimate.replicate.length;
    return new Current(value, Math.sqrt(squares / (count * (count - 1.0))));
  }

  /** Largest standard error of what a layer or the exit medium absorbs. */
  static double largestError(Problem problem, Estimate estimate) {
    double largest = 0;
    for (int row = LitDevice.TRANSMITTED; row < estimate.mean.length; row++) {
      largest = Math.max(largest, of(problem, estimate, row).error());
    }
    return largest;
  }

  private static double current(Problem problem, double[] share) {
    double sum = 0;
    for (int w = 0; w < share.length; w++) {
      sum += problem.incidentMaPerCm2().at(w) * share[w];
    }
    return sum;
  }
}
