package evensun.raytrace;

import evensun.spi.Response;
import java.util.Arrays;

/** Writes what is wanted of rows: reflected, transmitted, then the layers. */
final class Rows {

  private Rows() {}

  /**
   * Writes the spectra of an incidence.
   *
   * @param mean [row][w] shares
   * @param error [row][w] their standard errors, or null where exact
   */
  static void write(int incidence, double[][] mean, double[][] error, Response into) {
    int channels = mean.length - LitDevice.LAYERS;
    copy(mean[LitDevice.REFLECTED], row(into.reflectance, incidence));
    copy(mean[LitDevice.TRANSMITTED], row(into.transmittance, incidence));
    for (int c = 0; c < channels; c++) {
      int at = incidence * channels + c;
      copy(mean[LitDevice.LAYERS + c], row(into.absorptance, at));
      double[] errors = row(into.absorptanceStandardError, at);
      if (errors != null && error == null) {
        Arrays.fill(errors, 0);
      } else if (errors != null) {
        copy(error[LitDevice.LAYERS + c], errors);
      }
    }
  }

  /** A weighted sum of rows. */
  static double sum(int sum, double[][] rows, Response wanted) {
    int channels = rows.length - LitDevice.LAYERS;
    double total = dot(row(wanted.transmittanceWeight, sum), rows[LitDevice.TRANSMITTED]);
    for (int c = 0; c < channels; c++) {
      total += dot(row(wanted.weight, sum * channels + c), rows[LitDevice.LAYERS + c]);
    }
    return total;
  }

  private static double dot(double[] weight, double[] values) {
    double sum = 0;
    if (weight != null) {
      for (int w = 0; w < values.length; w++) {
        sum += weight[w] * values[w];
      }
    }
    return sum;
  }

  private static double[] row(double[][] rows, int index) {
    return rows == null ? null : rows[index];
  }

  private static void copy(double[] from, double[] to) {
    if (to != null) {
      System.arraycopy(from, 0, to, 0, from.length);
    }
  }
}
