package evensun.effectivemedium.kernel;

import java.util.Arrays;

/**
 * Rules that average a power of the permittivity: ε^a = Σ fᵢ εᵢ^a with a = 1 and −1 (Wiener), 1/3
 * (Looyenga), 1/2 (refractive index).
 */
public final class PowerMeans {

  private PowerMeans() {}

  /**
   * The cube roots of a row, in the sector [0, 60°].
   *
   * @param re [w] real part of a permittivity
   * @param im [w] imaginary part of a permittivity, at least 0
   * @param rootRe [w] out: real part of the root
   * @param rootIm [w] out: imaginary part of the root
   */
  public static void cubeRoots(double[] re, double[] im, double[] rootRe, double[] rootIm) {
    for (int w = 0; w < re.length; w++) {
      double modulus = Math.cbrt(Math.hypot(re[w], im[w]));
      double angle = Math.atan2(im[w], re[w]) / 3;
      rootRe[w] = modulus * Math.cos(angle);
      rootIm[w] = modulus * Math.sin(angle);
    }
  }

  /**
   * Σ fᵢ xᵢ.
   *
   * @param xRe [c][w] real parts
   * @param xIm [c][w] imaginary parts
   * @param fraction [c] volume fractions
   * @param re [w] out: real part of the mean
   * @param im [w] out: imaginary part of the mean
   */
  public static void mean(
      double[][] xRe, double[][] xIm, double[] fraction, double[] re, double[] im) {
    Arrays.fill(re, 0);
    Arrays.fill(im, 0);
    for (int c = 0; c < fraction.length; c++) {
      add(xRe[c], fraction[c], re);
      add(xIm[c], fraction[c], im);
    }
  }

  private static void add(double[] x, double factor, double[] into) {
    for (int w = 0; w < into.length; w++) {
      into[w] += factor * x[w];
    }
  }

  /** Cubes a row in place. */
  public static void cube(double[] re, double[] im) {
    for (int w = 0; w < re.length; w++) {
      double a = re[w];
      double b = im[w];
      re[w] = a * (a * a - 3 * b * b);
      im[w] = b * (3 * a * a - b * b);
    }
  }

  /**
   * 1/Σ fᵢ/εᵢ.
   *
   * @param epsRe [c][w] real parts of the permittivities
   * @param epsIm [c][w] imaginary parts, at least 0
   * @param fraction [c] volume fractions
   * @param re [w] out: real part of the effective permittivity
   * @param im [w] out: imaginary part of the effective permittivity
   */
  public static void harmonic(
      double[][] epsRe, double[][] epsIm, double[] fraction, double[] re, double[] im) {
    Arrays.fill(re, 0);
    Arrays.fill(im, 0);
    for (int c = 0; c < fraction.length; c++) {
      addInverse(epsRe[c], epsIm[c], fraction[c], re, im);
    }
    for (int w = 0; w < re.length; w++) {
      double inverse = 1 / (re[w] * re[w] + im[w] * im[w]);
      re[w] *= inverse;
      im[w] *= -inverse;
    }
  }

  private static void addInverse(
      double[] epsRe, double[] epsIm, double fraction, double[] re, double[] im) {
    for (int w = 0; w < re.length; w++) {
      double scale = fraction / (epsRe[w] * epsRe[w] + epsIm[w] * epsIm[w]);
      re[w] += epsRe[w] * scale;
      im[w] -= epsIm[w] * scale;
    }
  }
}
