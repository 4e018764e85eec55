package evensun.light;

/**
 * Evenly spaced wavelengths and the bins around them: bins meet at the midpoints, the first and
 * last end at the grid's ends.
 */
public final class WavelengthGrid {

  private final double stepNm;
  private final double[] wavelengthNm;

  private WavelengthGrid(double stepNm, double[] wavelengthNm) {
    this.stepNm = stepNm;
    this.wavelengthNm = wavelengthNm;
  }

  /**
   * A grid.
   *
   * @param fromNm first wavelength in nm, greater than 0
   * @param toNm last wavelength in nm, at least {@code fromNm}
   * @param stepNm step in nm, greater than 0; the range must be a multiple of it to 1e-6 steps
   * @throws IllegalArgumentException when the range is no multiple of the step
   */
  public static WavelengthGrid of(double fromNm, double toNm, double stepNm) {
    double steps = (toNm - fromNm) / stepNm;
    long count = Math.round(steps);
    if (!(fromNm > 0 && toNm >= fromNm && stepNm > 0) || Math.abs(steps - count) > 1e-6) {
      throw new IllegalArgumentException(
          "the range " + fromNm + " to " + toNm + " nm must be a multiple of " + stepNm + " nm");
    }
    double[] wavelengthNm = new double[(int) count + 1];
    for (int i = 0; i < wavelengthNm.length; i++) {
      wavelengthNm[i] = count == 0 ? fromNm : fromNm + (toNm - fromNm) * i / count;
    }
    return new WavelengthGrid(stepNm, wavelengthNm);
  }

  /** Number of wavelengths W. */
  public int size() {
    return wavelengthNm.length;
  }

  /** Step in nm. */
  public double stepNm() {
    return stepNm;
  }

  /** First wavelength in nm. */
  public double fromNm() {
    return wavelengthNm[0];
  }

  /** Last wavelength in nm. */
  public double toNm() {
    return wavelengthNm[wavelengthNm.length - 1];
  }

  /** [w] the wavelengths in nm; a fresh array. */
  public double[] wavelengthNm() {
    return wavelengthNm.clone();
  }

  /** [w + 1] edges of the bins in nm; a fresh array. */
  public double[] edgesNm() {
    return edgesNm(wavelengthNm);
  }

  /** [w + 1] edges of the bins around any rising wavelengths in nm; a fresh array. */
  public static double[] edgesNm(double[] wavelengthNm) {
    int size = wavelengthNm.length;
    double[] edges = new double[size + 1];
    edges[0] = wavelengthNm[0];
    edges[size] = wavelengthNm[size - 1];
    for (int i = 1; i < size; i++) {
      edges[i] = 0.5 * (wavelengthNm[i - 1] + wavelengthNm[i]);
    }
    return edges;
  }
}
