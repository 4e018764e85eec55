package evensun.evaluation;

import evensun.spi.EvaluationFailed;
import evensun.spi.Response;

/** Checks that no light is lost or made: R + T + Σ A = 1 at every wavelength. */
final class Ledger {

  /** Largest deviation allowed of a solver that states no error. */
  static final double TOLERANCE = 1e-9;

  private Ledger() {}

  /**
   * Checks one incidence of a response.
   *
   * @param response spectra
   * @param incidence index of the incidence
   * @param channels C
   * @param wavelengthNm [w] for the message
   * @throws EvaluationFailed naming the wavelength, when the ledger does not close or is no number
   */
  static void check(Response response, int incidence, int channels, double[] wavelengthNm) {
    for (int w = 0; w < wavelengthNm.length; w++) {
      double total = response.reflectance[incidence][w] + response.transmittance[incidence][w];
      double variance = 0;
      for (int c = 0; c < channels; c++) {
        total += response.absorptance[incidence * channels + c][w];
        double error = response.absorptanceStandardError[incidence * channels + c][w];
        variance += error * error;
      }
      if (!(Math.abs(total - 1) <= TOLERANCE + 5 * Math.sqrt(variance))) {
        throw new EvaluationFailed(
            "the solver's ledger does not close at %s nm: reflected, transmitted and absorbed add up to %.12f of the light"
                .formatted(wavelengthNm[w], total));
      }
    }
  }
}
