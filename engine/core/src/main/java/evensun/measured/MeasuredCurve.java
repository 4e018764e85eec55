package evensun.measured;

/** A measured quantity between 0 and 1 against wavelength. Immutable. */
public final class MeasuredCurve {

  private final double[] wavelengthNm;
  private final double[] fraction;
  private final String readAs;

  /** Takes the arrays over; wavelengths increase. */
  MeasuredCurve(double[] wavelengthNm, double[] fraction, String readAs) {
    this.wavelengthNm = wavelengthNm;
    this.fraction = fraction;
    this.readAs = readAs;
  }

  /** Number of points, at least 2. */
  public int size() {
    return wavelengthNm.length;
  }

  /** Wavelength of a point in nm. */
  public double wavelengthNm(int point) {
    return wavelengthNm[point];
  }

  /** Value of a point as a fraction. */
  public double fraction(int point) {
    return fraction[point];
  }

  /** First wavelength in nm. */
  public double fromNm() {
    return wavelengthNm[0];
  }

  /** Last wavelength in nm. */
  public double toNm() {
    return wavelengthNm[wavelengthNm.length - 1];
  }

  /** How the file was understood, in words. */
  public String readAs() {
    return readAs;
  }

  /** Whether a wavelength in nm lies within the measurement. */
  public boolean covers(double nm) {
    return nm >= fromNm() && nm <= toNm();
  }

  /**
   * Value at a wavelength, linear between points.
   *
   * @param nm wavelength in nm, covered
   */
  public double at(double nm) {
    return Interpolation.linear(wavelengthNm, fraction, nm);
  }
}
