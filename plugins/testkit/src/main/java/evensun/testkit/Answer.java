package evensun.testkit;

import evensun.spi.Channel;
import evensun.spi.Response;
import java.util.List;

/** What a solver answered to one case: spectra by layer, and how far they may be off. */
public final class Answer {

  /** Rounding that an exact solver may leave. */
  public static final double EXACT = 1e-9;

  /**
   * Standard errors that a statistical answer may be off by; exceeded once in five hundred million.
   */
  private static final double SIGMAS = 6;

  /** [w] reflectance. */
  final double[] reflectance;

  /** [w] transmittance. */
  final double[] transmittance;

  /** [l][w] absorptance, components of a mixed layer added. */
  final double[][] absorptance;

  /** How far every number may be off. */
  final double tolerance;

  Answer(double[] reflectance, double[] transmittance, double[][] absorptance, double tol) {
    this.reflectance = reflectance;
    this.transmittance = transmittance;
    this.absorptance = absorptance;
    this.tolerance = tol;
  }

  static Answer of(Response response, List<Channel> channels, int layers, int wavelengths) {
    double[][] absorptance = new double[layers][wavelengths];
    for (int c = 0; c < channels.size(); c++) {
      for (int w = 0; w < wavelengths; w++) {
        absorptance[channels.get(c).layer()][w] += response.absorptance[c][w];
      }
    }
    return new Answer(
        response.reflectance[0].clone(),
        response.transmittance[0].clone(),
        absorptance,
        EXACT
            + SIGMAS
                * Math.max(
                    largest(response.absorptanceStandardError),
                    largest(response.sumStandardError)));
  }

  /** R + T + Σ A at one wavelength; 1 when no light is lost or made. */
  double total(int w) {
    double total = reflectance[w] + transmittance[w];
    for (double[] row : absorptance) {
      total += row[w];
    }
    return total;
  }

  private static double largest(double[]... rows) {
    double largest = 0;
    if (rows != null) {
      for (double[] row : rows) {
        for (int i = 0; row != null && i < row.length; i++) {
          largest = Math.max(largest, row[i]);
        }
      }
    }
    return largest;
  }
}
