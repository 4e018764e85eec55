package evensun.effectivemedium.kernel;

/**
 * How the light absorbed in a mixture is shared: component i takes fᵢ Im εᵢ |Eᵢ/E|², the field in a
 * particle of depolarisation factor P inside the effective medium being Eᵢ/E = ε/(ε + P(εᵢ − ε)),
 * for spheres 3ε/(εᵢ + 2ε); all normalised to a sum of one. P = 0 and P = 1 are the exact fields of
 * parallel and series sheets.
 */
public final class LossShares {

  private LossShares() {}

  /**
   * Fills the shares. Where no component absorbs they are the volume fractions.
   *
   * @param epsRe [c][w] real parts of the permittivities
   * @param epsIm [c][w] imaginary parts, at least 0
   * @param fraction [c] volume fractions, at least 0, of sum 1
   * @param p depolarisation factor, in [0, 1]
   * @param re [w] real part of the effective permittivity
   * @param im [w] imaginary part of the effective permittivity
   * @param share [c][w] out: shares, of sum 1
   */
  public static void fill(
      double[][] epsRe,
      double[][] epsIm,
      double[] fraction,
      double p,
      double[] re,
      double[] im,
      double[][] share) {
    for (int c = 0; c < fraction.length; c++) {
      losses(epsRe[c], epsIm[c], fraction[c], p, re, im, share[c]);
    }
    for (int w = 0; w < re.length; w++) {
      normalise(fraction, share, w);
    }
  }

  private static void losses(
      double[] epsRe,
      double[] epsIm,
      double fraction,
      double p,
      double[] re,
      double[] im,
      double[] loss) {
    for (int w = 0; w < re.length; w++) {
      double xRe = re[w] + p * (epsRe[w] - re[w]);
      double xIm = im[w] + p * (epsIm[w] - im[w]);
      loss[w] = fraction * epsIm[w] / (xRe * xRe + xIm * xIm);
    }
  }

  private static void normalise(double[] fraction, double[][] share, int w) {
    double sum = 0;
    for (int c = 0; c < fraction.length; c++) {
      sum += share[c][w];
    }
    double inverse = 1 / sum;
    boolean lossy = sum > 0 && inverse < Double.POSITIVE_INFINITY;
    for (int c = 0; c < fraction.length; c++) {
      share[c][w] = lossy ? share[c][w] * inverse : fraction[c];
    }
  }
}
