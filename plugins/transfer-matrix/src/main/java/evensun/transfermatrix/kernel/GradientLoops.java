package evensun.transfermatrix.kernel;

/** The inner loops of derivatives inside coherent packets; rows as in {@link PacketGradient}. */
final class GradientLoops {

  private GradientLoops() {}

  /** 1/u. */
  static void reciprocal(double[] uRe, double[] uIm, double[] outRe, double[] outIm, int count) {
    for (int w = 0; w < count; w++) {
      double a = uRe[w];
      double b = uIm[w];
      double scale = 1 / (a * a + b * b);
      outRe[w] = a * scale;
      outIm[w] = -b * scale;
    }
  }

  /** 2iκ·x, the derivative by thickness of what grows as exp(2iκd). */
  static void byThickness(
      double[] turnsPerNm,
      double[] decayPerNm,
      double[] xRe,
      double[] xIm,
      double[] outRe,
      double[] outIm,
      int count) {
    for (int w = 0; w < count; w++) {
      double decay = MediumRows.DECAY_PARTS * decayPerNm[w];
      double angle = 2 * Math.PI * turnsPerNm[w];
      outRe[w] = decay * xRe[w] - angle * xIm[w];
      outIm[w] = decay * xIm[w] + angle * xRe[w];
    }
  }

  /** α + 2 Re(h ν). */
  static void loss(
      double[] decayPerNm,
      double[] hRe,
      double[] hIm,
      double[] nuRe,
      double[] nuIm,
      double[] out,
      int count) {
    for (int w = 0; w < count; w++) {
      double growth = hRe[w] * nuRe[w] - hIm[w] * nuIm[w];
      out[w] = 2 * growth - MediumRows.DECAY_PARTS * decayPerNm[w];
    }
  }

  /** −2p η′ w*: the straight part of p ∂s/∂w, s the flux of a pair. */
  static void straightByWave(
      double[] p,
      double[] etaRe,
      double[] wRe,
      double[] wIm,
      double[] outRe,
      double[] outIm,
      int count) {
    for (int w = 0; w < count; w++) {
      double factor = 2 * etaRe[w] * p[w];
      outRe[w] = -factor * wRe[w];
      outIm[w] = factor * wIm[w];
    }
  }

  /** Adds −i·cross·p η″ u*: the mixed part of p ∂s/∂w. */
  static void addMixedByWave(
      double[] p,
      double[] etaIm,
      double cross,
      double[] uRe,
      double[] uIm,
      double[] outRe,
      double[] outIm,
      int count) {
    for (int w = 0; w < count; w++) {
      double factor = cross * etaIm[w] * p[w];
      outRe[w] -= factor * uIm[w];
      outIm[w] -= factor * uRe[w];
    }
  }

  /** Subtracts 2f·x. */
  static void subtractTwice(
      double[] f, double[] xRe, double[] xIm, double[] outRe, double[] outIm, int count) {
    for (int w = 0; w < count; w++) {
      double twice = 2 * f[w];
      outRe[w] -= twice * xRe[w];
      outIm[w] -= twice * xIm[w];
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
      double[] outIm,
      int count) {
    for (int w = 0; w < count; w++) {
      outRe[w] = 2 * ofReflectance[w] * rhoRe[w];
      outIm[w] = ofMixed[w] * cross * etaIm[w] / carried[w] - 2 * ofReflectance[w] * rhoIm[w];
    }
  }

  /** Real factor times complex row. */
  static void scale(
      double[] factor, double[] xRe, double[] xIm, double[] outRe, double[] outIm, int count) {
    for (int w = 0; w < count; w++) {
      outRe[w] = factor[w] * xRe[w];
      outIm[w] = factor[w] * xIm[w];
    }
  }

  /** Adds a real factor times a complex row. */
  static void addScaled(
      double[] factor, double[] xRe, double[] xIm, double[] outRe, double[] outIm, int count) {
    for (int w = 0; w < count; w++) {
      outRe[w] += factor[w] * xRe[w];
      outIm[w] += factor[w] * xIm[w];
    }
  }

  /** a·b + c. */
  static void multiplyAdd(double[] a, double[] b, double[] c, double[] out, int count) {
    for (int w = 0; w < count; w++) {
      out[w] = a[w] * b[w] + c[w];
    }
  }

  /** −a. */
  static void negative(double[] a, double[] out, int count) {
    for (int w = 0; w < count; w++) {
      out[w] = -a[w];
    }
  }

  /** a − b. */
  static void difference(double[] a, double[] b, double[] out, int count) {
    for (int w = 0; w < count; w++) {
      out[w] = a[w] - b[w];
    }
  }

  /** Re(h γ). */
  static void realProduct(
      double[] hRe, double[] hIm, double[] gRe, double[] gIm, double[] out, int count) {
    for (int w = 0; w < count; w++) {
      out[w] = hRe[w] * gRe[w] - hIm[w] * gIm[w];
    }
  }

  /** Subtracts a·b. */
  static void subtractProduct(double[] a, double[] b, double[] out, int count) {
    for (int w = 0; w < count; w++) {
      out[w] -= a[w] * b[w];
    }
  }
}
