package evensun.raytrace.trace;

/**
 * Thick media at one wavelength.
 *
 * @param wavelengthUm vacuum wavelength in µm
 * @param n [m] refractive index
 * @param k [m] extinction coefficient
 * @param leastUm [m] thickness in µm that no design of this trace goes below
 */
record MediaRow(double wavelengthUm, double[] n, double[] k, double[] leastUm) {

  /** Absorption coefficient per µm. */
  double alphaPerUm(int medium) {
    return 4 * Math.PI * k[medium] / wavelengthUm;
  }
}
