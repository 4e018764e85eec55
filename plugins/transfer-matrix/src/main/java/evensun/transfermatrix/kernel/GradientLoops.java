package evensun.transfermatrix.kernel;

/** The inner loops of derivatives inside coherent packets; rows as in {@link PacketGradient}. */
final class GradientLoops {

  private GradientLoops() {}

  /** 1/u. */
  static void reciprocal(double[] uRe, double[] uIm, double[] outRe, double[] outIm) {
    for (int w = 0; w < outRe.length; w++) {
      double a = uRe[w];
      double b = uIm[w];
      double scale = 1 / (a * a + b * b);
      outRe[w] = a * scale;
      outIm[w] = -b * scale;
    }
  }

  /** 1 - r². */
  static void oneLessSquare(double[] rRe, double[] rIm, double[] outRe, double[] outIm) {
    for (int w = 0; w < outRe.length; w++) {
      double a = rRe[w];
      double b = rIm[w];
      outRe[w] = 1 - (a * a - b * b);
      outIm[w] = -2 * a * b;
    }
  }

  /** Complex a·b + c·d. */
  static void multiplySum(
      double[] aRe,
      double[] aIm,
      double[] bRe,
      double[] bIm,
      double[] cRe,
      double[] cIm,
      double[] dRe,
      double[] dIm,
      double[] outRe,
      double[] outIm) {
    for (int w = 0; w < outRe.length; w++) {
      outRe[w] = aRe[w] * bRe[w] - aIm[w] * bIm[w] + cRe[w] * dRe[w] - cIm[w] * dIm[w];
      outIm[w] = aRe[w] * bIm[w] + aIm[w] * bRe[w] + cRe[w] * dIm[w] + cIm[w] * dRe[w];
    }
  }

  /** 2iκ·x, the derivative by thickness of what grows as exp(2iκd). */
  static void byThickness(
      double[] turnsPerNm,
      double[] decayPerNm,
      double[] xRe,
      double[] xIm,
      double[] outRe,
      double[] outIm) {
    for (int w = 0; w < outRe.length; w++) {
      double decay = MediumRows.DECAY_PARTS * decayPerNm[w];
      double angle = 2 * Math.PI * turnsPerNm[w];
      outRe[w] = decay * xRe[w] - angle * xIm[w];
      outIm[w] = decay * xIm[w] + angle * xRe[w];
    }
  }

  /** α + 2 Re(h ν). */
  static void loss(
      double[] decayPerNm, double[] hRe, double[] hIm, double[] nuRe, double[] nuIm, double[] out) {
    for (int w = 0; w < out.length; w++) {
      double growth = hRe[w] * nuRe[w] - hIm[w] * nuIm[w];
      out[w] = 2 * growth - MediumRows.DECAY_PARTS * decayPerNm[w];
    }
  }

  /** P ∂s/∂w of the flux s of a pair, P the product of the first two rows. */
  static void fluxByWave(
      double[] norm,
      double[] through,
      double[] etaRe,
      double[] etaIm,
      double cross,
      double[] uRe,
      double[] uIm,
      double[] wRe,
      double[] wIm,
      double[] outRe,
      double[] outIm) {
    for (int w = 0; w < outRe.length; w++) {
      double p = norm[w] * through[w];
      double straight = 2 * etaRe[w] * p;
      double mixed = cross * etaIm[w] * p;
      outRe[w] = -straight * wRe[w] - mixed * uIm[w];
      outIm[w] = straight * wIm[w] - mixed * uRe[w];
    }
  }

  /** Complex a·b − 2f·c. */
  static void seed(
      double[] aRe,
      double[] aIm,
      double[] bRe,
      double[] bIm,
      double[] f,
      double[] cRe,
      double[] cIm,
      double[] outRe,
      double[] outIm) {
    for (int w = 0; w < outRe.length; w++) {
      double twice = 2 * f[w];
      outRe[w] = aRe[w] * bRe[w] - aIm[w] * bIm[w] - twice * cRe[w];
      outIm[w] = aRe[w] * bIm[w] + aIm[w] * bRe[w] - twice * cIm[w];
    }
  }

  /** The derivative of wR·|ρ|² − wM·cross·(η″/η′) Im ρ by ρ, over u². */
  static void reflectionSeed(
      double[] ofReflectance,
      double[] ofMixed,
      double cross,
      double[] etaIm,
      double[] carried,
      double[] rhoRe,
      double[] rhoIm,
      double[] outRe,
      double[] outIm) {
    for (int w = 0; w < outRe.length; w++) {
      outRe[w] = 2 * ofReflectance[w] * rhoRe[w];
      outIm[w] = ofMixed[w] * cross * etaIm[w] / carried[w] - 2 * ofReflectance[w] * rhoIm[w];
    }
  }

  /** Real factor times complex row. */
  static void scale(double[] factor, double[] xRe, double[] xIm, double[] outRe, double[] outIm) {
    for (int w = 0; w < outRe.length; w++) {
      outRe[w] = factor[w] * xRe[w];
      outIm[w] = factor[w] * xIm[w];
    }
  }

  /** Adds a real factor times a complex row. */
  static void addScaled(
      double[] factor, double[] xRe, double[] xIm, double[] outRe, double[] outIm) {
    for (int w = 0; w < outRe.length; w++) {
      outRe[w] += factor[w] * xRe[w];
      outIm[w] += factor[w] * xIm[w];
    }
  }

  /** a·b + c. */
  static void multiplyAdd(double[] a, double[] b, double[] c, double[] out) {
    for (int w = 0; w < out.length; w++) {
      out[w] = a[w] * b[w] + c[w];
    }
  }

  /** (a − b)·c. */
  static void multiplyDifference(double[] a, double[] b, double[] c, double[] out) {
    for (int w = 0; w < out.length; w++) {
      out[w] = (a[w] - b[w]) * c[w];
    }
  }

  /** Re(h γ). */
  static void realProduct(double[] hRe, double[] hIm, double[] gRe, double[] gIm, double[] out) {
    for (int w = 0; w < out.length; w++) {
      out[w] = hRe[w] * gRe[w] - hIm[w] * gIm[w];
    }
  }

  /** Subtracts a·b. */
  static void subtractProduct(double[] a, double[] b, double[] out) {
    for (int w = 0; w < out.length; w++) {
      out[w] -= a[w] * b[w];
    }
  }

  /** Sum of a row, in four strands so that additions need not wait for each other. */
  static double total(double[] row) {
    double a = 0;
    double b = 0;
    double c = 0;
    double d = 0;
    int w = 0;
    for (; w + 3 < row.length; w += 4) {
      a += row[w];
      b += row[w + 1];
      c += row[w + 2];
      d += row[w + 3];
    }
    for (; w < row.length; w++) {
      a += row[w];
    }
    return (a + b) + (c + d);
  }
}
