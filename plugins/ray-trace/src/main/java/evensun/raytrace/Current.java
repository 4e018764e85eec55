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
    return of(problem, estimate, row, 0, problem.wavelengthCount());
  }

  /** The current of a band of wavelengths, the last not included. */
  static Current of(Problem problem, Estimate estimate, int row, int from, int to) {
    double value = current(problem, estimate.mean[row], from, to);
    double squares = 0;
    for (double[][] rows : estimate.replicate) {
      double off = current(problem, rows[row], from, to) - value;
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

  private static double current(Problem problem, double[] share, int from, int to) {
    double sum = 0;
    for (int w = from; w < to; w++) {
      sum += problem.incidentMaPerCm2().at(w) * share[w];
    }
    return sum;
  }
}
