package evensun.effectivemedium.kernel;

/**
 * Bruggeman's rule for two components in closed form.
 *
 * <p>With D = (1 − P)/P for the depolarisation factor P, the rule is Dε² − bε − ε₁ε₂ = 0, b =
 * f₁(Dε₁ − ε₂) + f₂(Dε₂ − ε₁). Put ε = N₁N₂y with the indices N = √ε: then Dy² − βy − 1 = 0, β =
 * b/(N₁N₂). The product of the two roots y is −1/D, so one has a positive real part and the other a
 * negative one. N₁N₂ points along the bisector of ε₁ and ε₂; the root that goes over into ε₁ and ε₂
 * as a fraction becomes one lies between them, so it is the one with the positive real part, and
 * that is the principal square root's. No sign has to be tried.
 */
public final class PairBruggeman {

  private PairBruggeman() {}

  /**
   * Mixes two components.
   *
   * @param n1 [w] refractive index of the first component
   * @param k1 [w] extinction coefficient of the first component, at least 0
   * @param n2 [w] refractive index of the second component
   * @param k2 [w] extinction coefficient of the second component, at least 0
   * @param f2 volume fraction of the second component, in [0, 1]
   * @param d (1 − P)/P, greater than 0; 2 for spheres
   * @param re [w] out: real part of the effective permittivity
   * @param im [w] out: imaginary part of the effective permittivity
   */
  public static void mix(
      double[] n1,
      double[] k1,
      double[] n2,
      double[] k2,
      double f2,
      double d,
      double[] re,
      double[] im) {
    double f1 = 1 - f2;
    double own1 = f1 * d - f2;
    double own2 = f2 * d - f1;
    for (int w = 0; w < re.length; w++) {
      double bRe =
          own1 * (n1[w] - k1[w]) * (n1[w] + k1[w]) + own2 * (n2[w] - k2[w]) * (n2[w] + k2[w]);
      double bIm = 2 * (own1 * n1[w] * k1[w] + own2 * n2[w] * k2[w]);
      double mRe = n1[w] * n2[w] - k1[w] * k2[w];
      double mIm = n1[w] * k2[w] + k1[w] * n2[w];
      double scale = 1 / (mRe * mRe + mIm * mIm);
      double betaRe = (bRe * mRe + bIm * mIm) * scale;
      double betaIm = (bIm * mRe - bRe * mIm) * scale;

      double aRe = betaRe * betaRe - betaIm * betaIm + 4 * d;
      double aIm = 2 * betaRe * betaIm;
      double modulus = Math.sqrt(aRe * aRe + aIm * aIm);
      double large = Math.sqrt(0.5 * (modulus + Math.abs(aRe)));
      double small = large > 0 ? 0.5 * Math.abs(aIm) / large : 0;
      double sRe = aRe >= 0 ? large : small;
      double sIm = Math.copySign(aRe >= 0 ? small : large, aIm);

      double yRe;
      double yIm;
      if (betaRe >= 0) {
        yRe = (betaRe + sRe) / (2 * d);
        yIm = (betaIm + sIm) / (2 * d);
      } else {
        // The same root without the cancellation of β + s: y = 2/(s − β).
        double qRe = sRe - betaRe;
        double qIm = sIm - betaIm;
        double inverse = 2 / (qRe * qRe + qIm * qIm);
        yRe = qRe * inverse;
        yIm = -qIm * inverse;
      }
      re[w] = mRe * yRe - mIm * yIm;
      im[w] = mRe * yIm + mIm * yRe;
    }
  }
}
