package evensun.raytrace.trace;

/**
 * The thick media of a device over the spectrum.
 *
 * @param wavelengthUm [w] vacuum wavelengths in µm
 * @param n [m][w] refractive index
 * @param k [m][w] extinction coefficient
 * @param leastUm [m] thickness in µm that no design of a trace goes below; 0 outside
 */
public record Media(double[] wavelengthUm, double[][] n, double[][] k, double[] leastUm) {

  /** One wavelength. */
  MediaRow at(int w) {
    double[] nRow = new double[n.length];
    double[] kRow = new double[n.length];
    for (int m = 0; m < n.length; m++) {
      nRow[m] = n[m][w];
      kRow[m] = m == 0 ? 0 : k[m][w];
    }
    return new MediaRow(wavelengthUm[w], nRow, kRow, leastUm);
  }
}
