package evensun.testkit;

/**
 * A made-up material: n falls linearly with the wavelength, k does not change.
 *
 * @param n refractive index at 600 nm, greater than 0
 * @param slope change of n from 600 nm to 1200 nm
 * @param k extinction coefficient, at least 0
 */
public record CaseMedium(double n, double slope, double k) {

  private static final double CENTRE_NM = 600;

  /** Without dispersion. */
  public static CaseMedium of(double n, double k) {
    return new CaseMedium(n, 0, k);
  }

  /**
   * Refractive index.
   *
   * @param wavelengthNm vacuum wavelength in nm
   */
  public double nAt(double wavelengthNm) {
    return n + slope * (wavelengthNm - CENTRE_NM) / CENTRE_NM;
  }
}
