package evensun.light;

/** Thermal radiation of a black body (Planck 1901). */
public final class Blackbody {

  /** Irradiance at the Earth over exitance at the sun: (solar radius / astronomical unit)². */
  public static final double SUN_DILUTION = Math.pow(6.957e8 / 1.495978707e11, 2);

  private static final int POINTS = 3000;
  private static final double SHORTEST = 0.08;
  private static final double LONGEST = 80;
  private static final double WIEN_NM_K = 2.897771955e6;

  private Blackbody() {}

  /**
   * Exitance into the half space, from 0.08 to 80 times the wavelength of its peak.
   *
   * @param temperatureK in (0, 1e5] K
   */
  public static Spectrum at(double temperatureK) {
    if (!(temperatureK > 0 && temperatureK <= 1e5)) {
      throw new IllegalArgumentException(
          "temperatureK must be in (0, 1e5] K but was " + temperatureK);
    }
    double peakNm = WIEN_NM_K / temperatureK;
    double[] nm = new double[POINTS];
    double[] exitance = new double[POINTS];
    for (int i = 0; i < POINTS; i++) {
      nm[i] = peakNm * SHORTEST * Math.pow(LONGEST / SHORTEST, i / (POINTS - 1.0));
      exitance[i] = exitanceWPerM2PerNm(nm[i], temperatureK);
    }
    return Spectrum.of(
        "blackbody " + temperatureK + " K", "Planck's law, half space", nm, exitance);
  }

  /** 2πhc² λ⁻⁵ / (exp(hc/λkT) − 1) in W m⁻² nm⁻¹. */
  static double exitanceWPerM2PerNm(double wavelengthNm, double temperatureK) {
    double m = wavelengthNm * 1e-9;
    double hc = Constants.PLANCK_JS * Constants.LIGHT_SPEED_M_PER_S;
    double exponent = hc / (m * Constants.BOLTZMANN_J_PER_K * temperatureK);
    return 2e-9
        * Math.PI
        * hc
        * Constants.LIGHT_SPEED_M_PER_S
        / (Math.pow(m, 5) * Math.expm1(exponent));
  }
}
