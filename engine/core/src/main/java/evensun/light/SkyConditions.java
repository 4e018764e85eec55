package evensun.light;

/**
 * A clear sky.
 *
 * @param airMass relative air mass, 0 (outside the atmosphere) or in [1, 38]
 * @param ozoneCm ozone in cm at standard conditions, in [0, 1]
 * @param precipitableWaterCm precipitable water in cm, in [0, 20]
 * @param aerosolDepth500Nm aerosol optical depth at 500 nm, in [0, 3]
 * @param pressureHpa surface pressure in hPa, in [100, 1100]
 * @param groundAlbedoFraction reflectance of the ground, in [0, 1]
 * @param tiltDeg tilt of the plane towards the sun in degrees, in [0, 90]
 */
public record SkyConditions(
    double airMass,
    double ozoneCm,
    double precipitableWaterCm,
    double aerosolDepth500Nm,
    double pressureHpa,
    double groundAlbedoFraction,
    double tiltDeg) {

  /** The conditions of the global and direct reference spectra (ASTM G173-03). */
  public static final SkyConditions REFERENCE =
      new SkyConditions(1.5, 0.34, 1.42, 0.084, 1013.25, 0.2, 37);

  public SkyConditions {
    if (airMass != 0) {
      check("airMass", airMass, 1, 38);
    }
    check("ozoneCm", ozoneCm, 0, 1);
    check("precipitableWaterCm", precipitableWaterCm, 0, 20);
    check("aerosolDepth500Nm", aerosolDepth500Nm, 0, 3);
    check("pressureHpa", pressureHpa, 100, 1100);
    check("groundAlbedoFraction", groundAlbedoFraction, 0, 1);
    check("tiltDeg", tiltDeg, 0, 90);
  }

  private static void check(String name, double value, double low, double high) {
    if (!(value >= low && value <= high)) {
      throw new IllegalArgumentException(
          name + " must be in [" + low + ", " + high + "] but was " + value);
    }
  }

  /** The same sky under another air mass. */
  public SkyConditions withAirMass(double airMass) {
    return new SkyConditions(
        airMass,
        ozoneCm,
        precipitableWaterCm,
        aerosolDepth500Nm,
        pressureHpa,
        groundAlbedoFraction,
        tiltDeg);
  }

  /**
   * Relative air mass of a solar zenith angle (Kasten 1966, as Bird and Riordan use it).
   *
   * @param zenithDeg in degrees, in [0, 90]
   */
  public static double airMass(double zenithDeg) {
    return 1 / (Math.cos(Math.toRadians(zenithDeg)) + 0.15 * Math.pow(93.885 - zenithDeg, -1.253));
  }

  /** The zenith angle of an air mass of at least 1, in degrees. */
  static double zenithDeg(double airMass) {
    double low = 0;
    double high = 90;
    for (int i = 0; i < 60; i++) {
      double middle = 0.5 * (low + high);
      if (airMass(middle) < airMass) {
        low = middle;
      } else {
        high = middle;
      }
    }
    return 0.5 * (low + high);
  }
}
