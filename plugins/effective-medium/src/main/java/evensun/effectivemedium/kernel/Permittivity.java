package evensun.effectivemedium.kernel;

/** Between complex refractive index and complex permittivity, ε = (n + ik)². */
public final class Permittivity {

  private Permittivity() {}

  /**
   * Squares an index, in place where asked to.
   *
   * @param n [w] refractive index
   * @param k [w] extinction coefficient, at least 0
   * @param re [w] out: real part of the permittivity
   * @param im [w] out: imaginary part of the permittivity
   */
  public static void ofIndex(double[] n, double[] k, double[] re, double[] im) {
    for (int w = 0; w < n.length; w++) {
      double real = (n[w] - k[w]) * (n[w] + k[w]);
      double imaginary = 2 * n[w] * k[w];
      re[w] = real;
      im[w] = imaginary;
    }
  }

  /**
   * The root in the first quadrant. An imaginary part below 0, as rounding may leave for a medium
   * without loss, counts as 0.
   *
   * @param re [w] real part of the permittivity
   * @param im [w] imaginary part of the permittivity
   * @param n [w] out: refractive index
   * @param k [w] out: extinction coefficient, at least 0
   */
  public static void toIndex(double[] re, double[] im, double[] n, double[] k) {
    for (int w = 0; w < re.length; w++) {
      double loss = Math.max(im[w], 0);
      double modulus = Math.sqrt(re[w] * re[w] + loss * loss);
      // The larger part first: the smaller one then comes without cancellation.
      double large = Math.sqrt(0.5 * (modulus + Math.abs(re[w])));
      double small = large > 0 ? 0.5 * loss / large : 0;
      n[w] = re[w] >= 0 ? large : small;
      k[w] = re[w] >= 0 ? small : large;
    }
  }
}
