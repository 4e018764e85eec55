package evensun.measured;

/**
 * A measured curve against a predicted one, on the grid points that the measurement covers.
 *
 * @param fromNm first compared wavelength in nm
 * @param toNm last compared wavelength in nm
 * @param points number of compared wavelengths, at least 1
 * @param rmsDifference root of the mean squared difference of the fractions
 * @param measuredMaPerCm2 Σ measured · Φ over the compared bins, in mA cm⁻²
 * @param predictedMaPerCm2 Σ predicted · Φ over the same bins, in mA cm⁻²
 */
public record Comparison(
    double fromNm,
    double toNm,
    int points,
    double rmsDifference,
    double measuredMaPerCm2,
    double predictedMaPerCm2) {

  /**
   * Compares.
   *
   * @param curve the measurement
   * @param wavelengthNm [w] grid in nm, increasing
   * @param incidentMaPerCm2 [w] photon current Φ of each bin in mA cm⁻²
   * @param predicted [w] predicted fraction
   * @throws IllegalArgumentException when the measurement covers no point of the grid
   */
  public static Comparison of(
      MeasuredCurve curve, double[] wavelengthNm, double[] incidentMaPerCm2, double[] predicted) {
    int first = -1;
    int last = -1;
    double squares = 0;
    double measuredSum = 0;
    double predictedSum = 0;
    for (int w = 0; w < wavelengthNm.length; w++) {
      if (curve.covers(wavelengthNm[w])) {
        first = first < 0 ? w : first;
        last = w;
        double measured = curve.at(wavelengthNm[w]);
        squares += (measured - predicted[w]) * (measured - predicted[w]);
        measuredSum += measured * incidentMaPerCm2[w];
        predictedSum += predicted[w] * incidentMaPerCm2[w];
      }
    }
    if (first < 0) {
      throw new IllegalArgumentException("the measurement covers no wavelength of the grid");
    }
    int points = last - first + 1;
    return new Comparison(
        wavelengthNm[first],
        wavelengthNm[last],
        points,
        Math.sqrt(squares / points),
        measuredSum,
        predictedSum);
  }
}
