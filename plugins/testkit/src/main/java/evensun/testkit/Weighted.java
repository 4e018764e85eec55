package evensun.testkit;

import evensun.spi.Evaluator;
import evensun.spi.PreparedSolver;
import evensun.spi.Response;
import java.util.Arrays;

/**
 * An evaluation with three weighted sums: the first and last channel apart, and everything together
 * with what is transmitted.
 *
 * @param response the filled response, spectra and sums with their errors
 * @param withoutErrors the sums of a call that did not ask for errors
 * @param channels number of channels
 */
record Weighted(Response response, double[] withoutErrors, int channels) {

  private static final int SUMS = 3;

  static Weighted of(Subject subject, StackCase stack) {
    try (PreparedSolver prepared = subject.prepare(stack);
        Evaluator evaluator = prepared.newEvaluator()) {
      Response response = subject.spectra(prepared, stack);
      int channels = prepared.channels().size();
      ask(response, channels, stack.wavelengthCount());
      response.sumStandardError = null;
      evaluator.evaluate(stack.design(), response);
      double[] withoutErrors = response.sum;
      ask(response, channels, stack.wavelengthCount());
      evaluator.evaluate(stack.design(), response);
      return new Weighted(response, withoutErrors, channels);
    }
  }

  /** Adds the wish for the sums. */
  static void ask(Response response, int channels, int wavelengths) {
    response.weight = new double[SUMS * channels][];
    response.transmittanceWeight = new double[SUMS][];
    response.sum = new double[SUMS];
    response.sumStandardError = new double[SUMS];
    // Numbers left over from an earlier call must not count.
    Arrays.fill(response.sum, 17);
    if (channels > 0) {
      response.weight[0] = weights(wavelengths, 1);
      response.weight[channels + channels - 1] = weights(wavelengths, 0.5);
    }
    for (int c = 0; c < channels; c++) {
      response.weight[2 * channels + c] = weights(wavelengths, 1 + 0.1 * c);
    }
    response.transmittanceWeight[2] = weights(wavelengths, 0.25);
  }

  int sums() {
    return SUMS;
  }

  /** The sum that the spectra of the response make. */
  double wanted(int s) {
    double sum = 0;
    for (int c = 0; c < channels; c++) {
      sum += product(response.weight[s * channels + c], response.absorptance[c]);
    }
    return sum + product(response.transmittanceWeight[s], response.transmittance[0]);
  }

  private static double product(double[] weight, double[] row) {
    double sum = 0;
    for (int w = 0; weight != null && w < row.length; w++) {
      sum += weight[w] * row[w];
    }
    return sum;
  }

  private static double[] weights(int wavelengths, double scale) {
    double[] weights = new double[wavelengths];
    for (int w = 0; w < wavelengths; w++) {
      weights[w] = scale * (0.2 + 0.05 * w);
    }
    return weights;
  }
}
