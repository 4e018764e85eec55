package evensun.light;

/**
 * Spectral irradiance as a table, linear between its points and zero outside; immutable.
 *
 * <p>Integrals are exact for the piecewise linear irradiance: of E(λ) for power, of E(λ)·λ/(hc) for
 * photons.
 */
public final class Spectrum {

  private final String name;
  private final String source;
  private final double[] wavelengthNm;
  private final double[] irradiance;
  private final double[] cumulativeMaPerCm2;

  private Spectrum(String name, String source, double[] wavelengthNm, double[] irradiance) {
    this.name = name;
    this.source = source;
    this.wavelengthNm = wavelengthNm;
    this.irradiance = irradiance;
    this.cumulativeMaPerCm2 = new double[wavelengthNm.length];
    for (int i = 1; i < wavelengthNm.length; i++) {
      cumulativeMaPerCm2[i] =
          cumulativeMaPerCm2[i - 1] + segmentMaPerCm2(i - 1, wavelengthNm[i - 1], wavelengthNm[i]);
    }
  }

  /**
   * A spectrum.
   *
   * @param name as shown to people
   * @param source where the numbers come from
   * @param wavelengthNm [i] in nm, positive, strictly increasing, at least two
   * @param irradianceWPerM2PerNm [i] at least 0
   * @throws IllegalArgumentException naming the point that breaks the rule
   */
  public static Spectrum of(
      String name, String source, double[] wavelengthNm, double[] irradianceWPerM2PerNm) {
    if (wavelengthNm.length < 2 || wavelengthNm.length != irradianceWPerM2PerNm.length) {
      throw new IllegalArgumentException(
          "a spectrum needs at least two points, each with a wavelength and an irradiance");
    }
    double last = 0;
    for (int i = 0; i < wavelengthNm.length; i++) {
      if (!(wavelengthNm[i] > last)) {
        throw new IllegalArgumentException(
            "wavelengths must be positive and increase but "
                + wavelengthNm[i]
                + " nm follows "
                + last
                + " nm");
      }
      if (!(irradianceWPerM2PerNm[i] >= 0) || Double.isInfinite(irradianceWPerM2PerNm[i])) {
        throw new IllegalArgumentException(
            "irradiance must be finite and at least 0 W m⁻² nm⁻¹ but was "
                + irradianceWPerM2PerNm[i]
                + " at "
                + wavelengthNm[i]
                + " nm");
      }
      last = wavelengthNm[i];
    }
    return new Spectrum(name, source, wavelengthNm.clone(), irradianceWPerM2PerNm.clone());
  }

  /**
   * The same spectrum times a factor.
   *
   * @param factor greater than 0
   * @param why as shown to people behind the name
   */
  public Spectrum times(double factor, String why) {
    if (!(factor > 0) || Double.isInfinite(factor)) {
      throw new IllegalArgumentException("a spectrum is scaled by more than 0 but was " + factor);
    }
    double[] scaled = irradiance.clone();
    for (int i = 0; i < scaled.length; i++) {
      scaled[i] *= factor;
    }
    return new Spectrum(why.isEmpty() ? name : name + ", " + why, source, wavelengthNm, scaled);
  }

  /** Name as shown to people. */
  public String name() {
    return name;
  }

  /** Where the numbers come from. */
  public String source() {
    return source;
  }

  /** First wavelength of the table in nm. */
  public double fromNm() {
    return wavelengthNm[0];
  }

  /** Last wavelength of the table in nm. */
  public double toNm() {
    return wavelengthNm[wavelengthNm.length - 1];
  }

  /** [i] the table's wavelengths in nm; a fresh array. */
  public double[] wavelengthNm() {
    return wavelengthNm.clone();
  }

  /** [i] the table's irradiance in W m⁻² nm⁻¹; a fresh array. */
  public double[] irradianceWPerM2PerNm() {
    return irradiance.clone();
  }

  /** Irradiance over the whole table in W m⁻². */
  public double totalWPerM2() {
    return powerWPerM2(fromNm(), toNm());
  }

  /**
   * Irradiance between two wavelengths.
   *
   * @param fromNm in nm
   * @param toNm in nm, at least {@code fromNm}
   * @return W m⁻²
   */
  public double powerWPerM2(double fromNm, double toNm) {
    double sum = 0;
    for (int i = 0; i + 1 < wavelengthNm.length; i++) {
      double a = Math.max(fromNm, wavelengthNm[i]);
      double b = Math.min(toNm, wavelengthNm[i + 1]);
      if (b > a) {
        sum += 0.5 * (at(i, a) + at(i, b)) * (b - a);
      }
    }
    return sum;
  }

  /**
   * Photon current between two wavelengths: q times the photon flux.
   *
   * @param fromNm in nm
   * @param toNm in nm
   * @return mA cm⁻²; negative when {@code toNm < fromNm}
   */
  public double photonCurrentMaPerCm2(double fromNm, double toNm) {
    return cumulative(toNm) - cumulative(fromNm);
  }

  /** Photon current in each bin of a grid, [w] in mA cm⁻². */
  public double[] binsMaPerCm2(WavelengthGrid grid) {
    double[] edges = grid.edgesNm();
    double[] bins = new double[grid.size()];
    for (int i = 0; i < bins.length; i++) {
      bins[i] = photonCurrentMaPerCm2(edges[i], edges[i + 1]);
    }
    return bins;
  }

  private double cumulative(double nm) {
    if (nm <= wavelengthNm[0]) {
      return 0;
    }
    int last = wavelengthNm.length - 1;
    if (nm >= wavelengthNm[last]) {
      return cumulativeMaPerCm2[last];
    }
    int low = 0;
    int high = last;
    while (high - low > 1) {
      int middle = (low + high) >>> 1;
      if (wavelengthNm[middle] <= nm) {
        low = middle;
      } else {
        high = middle;
      }
    }
    return cumulativeMaPerCm2[low] + segmentMaPerCm2(low, wavelengthNm[low], nm);
  }

  private double at(int segment, double nm) {
    double share =
        (nm - wavelengthNm[segment]) / (wavelengthNm[segment + 1] - wavelengthNm[segment]);
    return irradiance[segment] + share * (irradiance[segment + 1] - irradiance[segment]);
  }

  /** q/(hc) ∫ E λ dλ over part of a segment; Simpson's rule is exact for a parabola. */
  private double segmentMaPerCm2(int segment, double a, double b) {
    double middle = 0.5 * (a + b);
    double integral =
        (b - a) / 6 * (at(segment, a) * a + 4 * at(segment, middle) * middle + at(segment, b) * b);
    return 0.1 * integral / Constants.HC_EV_NM; // 1 A m⁻² is 0.1 mA cm⁻²
  }
}
