package evensun.material.table;

import java.util.Arrays;

/**
 * n and k at rising wavelengths, linear between their points, n and k separately; immutable.
 *
 * <p>Beyond its ends the first and last values hold; whoever asks there must have said so.
 */
public final class OpticalTable {

  /** What a photon energy of four digits leaves open at 1200 nm. */
  private static final double END_NM = 0.1;

  private final double[] wavelengthNm;
  private final double[] n;
  private final double[] k;

  private OpticalTable(double[] wavelengthNm, double[] n, double[] k) {
    this.wavelengthNm = wavelengthNm;
    this.n = n;
    this.k = k;
  }

  /**
   * A table.
   *
   * @param wavelengthNm [i] vacuum wavelengths in nm, positive, strictly increasing
   * @param n [i] refractive index, greater than 0
   * @param k [i] extinction coefficient, at least 0
   * @throws IllegalArgumentException naming the point that breaks a rule
   */
  public static OpticalTable of(double[] wavelengthNm, double[] n, double[] k) {
    if (wavelengthNm.length == 0
        || wavelengthNm.length != n.length
        || wavelengthNm.length != k.length) {
      throw new IllegalArgumentException(
          "a table needs at least one point, each with wavelength, n and k");
    }
    double last = 0;
    for (int i = 0; i < n.length; i++) {
      if (!(wavelengthNm[i] > last) || Double.isInfinite(wavelengthNm[i])) {
        throw new IllegalArgumentException(
            "wavelengths must be positive and increase but "
                + wavelengthNm[i]
                + " nm follows "
                + last
                + " nm");
      }
      check("n", n[i] > 0, "greater than 0", n[i], wavelengthNm[i]);
      check("k", k[i] >= 0, "at least 0", k[i], wavelengthNm[i]);
      last = wavelengthNm[i];
    }
    return new OpticalTable(wavelengthNm.clone(), n.clone(), k.clone());
  }

  private static void check(String what, boolean holds, String rule, double value, double nm) {
    if (!holds || Double.isInfinite(value)) {
      throw new IllegalArgumentException(
          what + " must be a finite number " + rule + " but was " + value + " at " + nm + " nm");
    }
  }

  /** Number of points. */
  public int size() {
    return wavelengthNm.length;
  }

  /** First wavelength in nm. */
  public double fromNm() {
    return wavelengthNm[0];
  }

  /** Last wavelength in nm. */
  public double toNm() {
    return wavelengthNm[wavelengthNm.length - 1];
  }

  /** Whether wavelengths from one to another lie in the table, but for the rounding of its ends. */
  public boolean covers(double fromNm, double toNm) {
    return fromNm >= fromNm() - END_NM && toNm <= toNm() + END_NM;
  }

  /** [i] wavelengths in nm; a fresh array. */
  public double[] wavelengthNm() {
    return wavelengthNm.clone();
  }

  /** [i] refractive index; a fresh array. */
  public double[] n() {
    return n.clone();
  }

  /** [i] extinction coefficient; a fresh array. */
  public double[] k() {
    return k.clone();
  }

  /** n at a wavelength in nm. */
  public double nAt(double nm) {
    return at(n, nm);
  }

  /** k at a wavelength in nm. */
  public double kAt(double nm) {
    return at(k, nm);
  }

  /** Absorption coefficient 4πk/λ in cm⁻¹ at a wavelength in nm. */
  public double alphaPerCmAt(double nm) {
    return 4e7 * Math.PI * kAt(nm) / nm;
  }

  private double at(double[] values, double nm) {
    int found = Arrays.binarySearch(wavelengthNm, nm);
    if (found >= 0) {
      return values[found];
    }
    int above = -found - 1;
    if (above == 0) {
      return values[0];
    }
    if (above == values.length) {
      return values[above - 1];
    }
    double low = wavelengthNm[above - 1];
    double share = (nm - low) / (wavelengthNm[above] - low);
    return values[above - 1] + share * (values[above] - values[above - 1]);
  }
}
