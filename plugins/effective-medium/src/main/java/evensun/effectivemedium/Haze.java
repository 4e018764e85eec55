package evensun.effectivemedium;

/**
 * Scalar scattering of a rough face with heights of normal distribution: the share of the reflected
 * or transmitted light that leaves the specular direction (Bennett & Porteus, J. Opt. Soc. Am. 51,
 * 123 (1961); Carniglia, Opt. Eng. 18, 104 (1979)).
 */
final class Haze {

  private Haze() {}

  /**
   * H_R = 1 − exp(−(4πσ n₁ cos θ₁/λ)²).
   *
   * @param rmsNm σ in nm, at least 0
   * @param wavelengthNm λ in nm, greater than 0
   * @param nCos1 refractive index times cosine on the side of the light
   */
  static double reflected(double rmsNm, double wavelengthNm, double nCos1) {
    return share(4 * Math.PI * rmsNm * nCos1 / wavelengthNm);
  }

  /**
   * H_T = 1 − exp(−(2πσ (n₁ cos θ₁ − n₂ cos θ₂)/λ)²).
   *
   * @param rmsNm σ in nm, at least 0
   * @param wavelengthNm λ in nm, greater than 0
   * @param nCos1 refractive index times cosine on the side of the light
   * @param nCos2 refractive index times cosine on the far side
   */
  static double transmitted(double rmsNm, double wavelengthNm, double nCos1, double nCos2) {
    return share(2 * Math.PI * rmsNm * (nCos1 - nCos2) / wavelengthNm);
  }

  private static double share(double phase) {
    return -Math.expm1(-phase * phase);
  }

  /**
   * n cos θ by Snell's law; 0 where the light is totally reflected.
   *
   * @param n refractive index
   * @param nSin refractive index times sine of the angle, the same in every layer
   */
  static double nCos(double n, double nSin) {
    return Math.sqrt(Math.max(0, n * n - nSin * nSin));
  }
}
