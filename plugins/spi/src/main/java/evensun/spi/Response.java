package evensun.spi;

/**
 * Where the light went. The caller owns it and reuses it; rows that are {@code null} are not wanted
 * and not written.
 *
 * <p>At every wavelength and incidence R + T + Σ_c A_c = 1, to 1e-9 for a deterministic solver and
 * within the stated error for a statistical one. T is the net flux into the exit medium.
 */
public final class Response {

  /** [i][w] reflectance, or null. */
  public double[][] reflectance;

  /** [i][w] transmittance, or null. */
  public double[][] transmittance;

  /** [i*C + c][w] absorptance of each channel, or null. */
  public double[][] absorptance;

  /** [i*C + c][w] standard error of absorptance, or null; only statistical solvers write it. */
  public double[][] absorptanceStandardError;

  /**
   * [s*C + c][w] in: weights of absorptance in the sums, mA cm⁻² for photocurrents; a null row is
   * zero; null when no sums are wanted. Weights apply to incidence 0.
   */
  public double[][] weight;

  /** [s][w] in: weights of transmittance in the sums; a null row, or null, is zero. */
  public double[][] transmittanceWeight;

  /**
   * [s] out: Σ_c Σ_w weight·absorptance + Σ_w transmittanceWeight·transmittance of incidence 0, or
   * null.
   */
  public double[] sum;

  /** [s] out: standard error of each sum, 0 where exact, or null. */
  public double[] sumStandardError;

  /** A response that wants nothing yet. */
  public Response() {}

  /**
   * A response that wants every spectrum and no sums.
   *
   * @param incidences I
   * @param channels C
   * @param wavelengths W
   */
  public static Response spectra(int incidences, int channels, int wavelengths) {
    Response response = new Response();
    response.reflectance = new double[incidences][wavelengths];
    response.transmittance = new double[incidences][wavelengths];
    response.absorptance = new double[incidences * channels][wavelengths];
    return response;
  }

  /**
   * A response that wants weighted sums alone, all weights zero until the caller sets rows.
   *
   * @param sums S
   * @param channels C
   */
  public static Response sums(int sums, int channels) {
    Response response = new Response();
    response.weight = new double[sums * channels][];
    response.transmittanceWeight = new double[sums][];
    response.sum = new double[sums];
    response.sumStandardError = new double[sums];
    return response;
  }
}
