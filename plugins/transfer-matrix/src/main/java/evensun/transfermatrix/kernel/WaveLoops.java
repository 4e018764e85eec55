package evensun.transfermatrix.kernel;

/**
 * The inner loops of coherent packets, over wavelengths.
 *
 * <p>Every row starts at index 0 of an array of its own and every loop is short: only then does the
 * JIT compiler turn them into vector instructions. A pair (u, w) stands for the waves on and back
 * at the near face of a layer, up to a factor common to both.
 */
final class WaveLoops {

  private WaveLoops() {}

  /** From a pair below a face to the pair above it: u + r w and r u + w. */
  static void face(
      double[] rRe,
      double[] rIm,
      double[] uRe,
      double[] uIm,
      double[] wRe,
      double[] wIm,
      double[] onRe,
      double[] onIm,
      double[] backRe,
      double[] backIm) {
    for (int w = 0; w < rRe.length; w++) {
      double a = rRe[w];
      double b = rIm[w];
      double c = uRe[w];
      double d = uIm[w];
      double e = wRe[w];
      double f = wIm[w];
      onRe[w] = c + a * e - b * f;
      onIm[w] = d + a * f + b * e;
      backRe[w] = a * c - b * d + e;
      backIm[w] = a * d + b * c + f;
    }
  }

  /** Complex product of two rows. */
  static void multiply(
      double[] aRe, double[] aIm, double[] bRe, double[] bIm, double[] outRe, double[] outIm) {
    for (int w = 0; w < aRe.length; w++) {
      double a = aRe[w];
      double b = aIm[w];
      double c = bRe[w];
      double d = bIm[w];
      outRe[w] = a * c - b * d;
      outIm[w] = a * d + b * c;
    }
  }

  /** Flux of a pair: η′(|u|² − |w|²) + cross·η″ Im(w u*). */
  static void flux(
      double[] etaRe,
      double[] etaIm,
      double[] uRe,
      double[] uIm,
      double[] wRe,
      double[] wIm,
      double cross,
      double[] out) {
    for (int w = 0; w < out.length; w++) {
      double straight = uRe[w] * uRe[w] + uIm[w] * uIm[w] - wRe[w] * wRe[w] - wIm[w] * wIm[w];
      double shared = wIm[w] * uRe[w] - wRe[w] * uIm[w];
      out[w] = etaRe[w] * straight + cross * etaIm[w] * shared;
    }
  }

  /** How much of the square of a wave is left below the next face. */
  static void through(double[] before, double[] size, double[] face, double[] out) {
    for (int w = 0; w < out.length; w++) {
      out[w] = before[w] * size[w] * face[w];
    }
  }

  /** 1/(|u|² η′): what makes the flux into the packet one. */
  static void norm(double[] uRe, double[] uIm, double[] carried, double[] out) {
    for (int w = 0; w < out.length; w++) {
      out[w] = 1 / ((uRe[w] * uRe[w] + uIm[w] * uIm[w]) * carried[w]);
    }
  }

  /** |v|²/|u|², from 1/(|u|² η′). */
  static void reflectance(
      double[] vRe, double[] vIm, double[] norm, double[] carried, double[] out) {
    for (int w = 0; w < out.length; w++) {
      out[w] = (vRe[w] * vRe[w] + vIm[w] * vIm[w]) * norm[w] * carried[w];
    }
  }

  /** −cross·(η″/η′) Im(v/u), from 1/(|u|² η′). */
  static void mixed(
      double[] uRe,
      double[] uIm,
      double[] vRe,
      double[] vIm,
      double[] etaIm,
      double cross,
      double[] norm,
      double[] out) {
    for (int w = 0; w < out.length; w++) {
      out[w] = -cross * etaIm[w] * (vIm[w] * uRe[w] - vRe[w] * uIm[w]) * norm[w];
    }
  }

  /** Product of three rows. */
  static void product(double[] a, double[] b, double[] c, double[] out) {
    for (int w = 0; w < out.length; w++) {
      out[w] = a[w] * b[w] * c[w];
    }
  }

  /** Product of two rows. */
  static void product(double[] a, double[] b, double[] out) {
    for (int w = 0; w < out.length; w++) {
      out[w] = a[w] * b[w];
    }
  }

  /** scale·(a·b − c·d): what enters a layer less what leaves it. */
  static void absorbed(
      double[] scale, double[] a, double[] b, double[] c, double[] d, double[] out) {
    for (int w = 0; w < out.length; w++) {
      out[w] = scale[w] * (a[w] * b[w] - c[w] * d[w]);
    }
  }

  /** The same, added to what is there. */
  static void addAbsorbed(
      double[] scale, double[] a, double[] b, double[] c, double[] d, double[] out) {
    for (int w = 0; w < out.length; w++) {
      out[w] += scale[w] * (a[w] * b[w] - c[w] * d[w]);
    }
  }

  /** Adds a row to another. */
  static void add(double[] row, double[] out) {
    for (int w = 0; w < out.length; w++) {
      out[w] += row[w];
    }
  }
}
