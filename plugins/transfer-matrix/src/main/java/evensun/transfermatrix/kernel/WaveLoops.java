package evensun.transfermatrix.kernel;

/**
 * The inner loops of coherent packets, over wavelengths.
 *
 * <p>Every row starts at index 0 of an array of its own, no loop touches more than six arrays, and
 * the count is passed in: only then does the JIT compiler of Java 17 turn them into vector
 * instructions. A pair (u, w) stands for the waves on and back at the near face of a layer, up to a
 * factor common to both.
 */
final class WaveLoops {

  private WaveLoops() {}

  /** Complex product of two rows. */
  static void multiply(
      double[] aRe,
      double[] aIm,
      double[] bRe,
      double[] bIm,
      double[] outRe,
      double[] outIm,
      int count) {
    for (int w = 0; w < count; w++) {
      double a = aRe[w];
      double b = aIm[w];
      double c = bRe[w];
      double d = bIm[w];
      outRe[w] = a * c - b * d;
      outIm[w] = a * d + b * c;
    }
  }

  /** Adds the complex product of two rows. */
  static void addProduct(
      double[] aRe,
      double[] aIm,
      double[] bRe,
      double[] bIm,
      double[] outRe,
      double[] outIm,
      int count) {
    for (int w = 0; w < count; w++) {
      double a = aRe[w];
      double b = aIm[w];
      double c = bRe[w];
      double d = bIm[w];
      outRe[w] += a * c - b * d;
      outIm[w] += a * d + b * c;
    }
  }

  /** The mixed part of the flux of a pair: cross·η″ Im(w u*). */
  static void mixedFlux(
      double[] etaIm,
      double[] uRe,
      double[] uIm,
      double[] wRe,
      double[] wIm,
      double cross,
      double[] out,
      int count) {
    for (int w = 0; w < count; w++) {
      out[w] = cross * etaIm[w] * (wIm[w] * uRe[w] - wRe[w] * uIm[w]);
    }
  }

  /** Adds the straight part of the flux of a pair: η′(|u|² − |w|²). */
  static void addFlux(
      double[] etaRe,
      double[] uRe,
      double[] uIm,
      double[] wRe,
      double[] wIm,
      double[] out,
      int count) {
    for (int w = 0; w < count; w++) {
      out[w] += etaRe[w] * (uRe[w] * uRe[w] + uIm[w] * uIm[w] - wRe[w] * wRe[w] - wIm[w] * wIm[w]);
    }
  }

  /** How much of the square of a wave is left below the next face. */
  static void through(double[] before, double[] size, double[] face, double[] out, int count) {
    for (int w = 0; w < count; w++) {
      out[w] = before[w] * size[w] * face[w];
    }
  }

  /** 1/(|u|² η′): what makes the flux into the packet one. */
  static void norm(double[] uRe, double[] uIm, double[] carried, double[] out, int count) {
    for (int w = 0; w < count; w++) {
      out[w] = 1 / ((uRe[w] * uRe[w] + uIm[w] * uIm[w]) * carried[w]);
    }
  }

  /** |v|²/|u|², from 1/(|u|² η′). */
  static void reflectance(
      double[] vRe, double[] vIm, double[] norm, double[] carried, double[] out, int count) {
    for (int w = 0; w < count; w++) {
      out[w] = (vRe[w] * vRe[w] + vIm[w] * vIm[w]) * norm[w] * carried[w];
    }
  }

  /** Product of three rows. */
  static void product(double[] a, double[] b, double[] c, double[] out, int count) {
    for (int w = 0; w < count; w++) {
      out[w] = a[w] * b[w] * c[w];
    }
  }

  /** Product of two rows. */
  static void product(double[] a, double[] b, double[] out, int count) {
    for (int w = 0; w < count; w++) {
      out[w] = a[w] * b[w];
    }
  }

  /** scale·(a·b − c·d): what enters a layer less what leaves it. */
  static void absorbed(
      double[] scale, double[] a, double[] b, double[] c, double[] d, double[] out, int count) {
    for (int w = 0; w < count; w++) {
      out[w] = scale[w] * (a[w] * b[w] - c[w] * d[w]);
    }
  }

  /** The same, added to what is there. */
  static void addAbsorbed(
      double[] scale, double[] a, double[] b, double[] c, double[] d, double[] out, int count) {
    for (int w = 0; w < count; w++) {
      out[w] += scale[w] * (a[w] * b[w] - c[w] * d[w]);
    }
  }

  /** Adds a row to another. */
  static void add(double[] row, double[] out, int count) {
    for (int w = 0; w < count; w++) {
      out[w] += row[w];
    }
  }
}
