package evensun.testkit;

/**
 * Reflectance of one face by Fresnel's formulas (Born and Wolf, Principles of Optics, 1.5.2), from
 * a transparent medium onto one that may absorb.
 */
final class Fresnel {

  private Fresnel() {}

  /**
   * For light polarised across the plane of incidence.
   *
   * @param n0 index of the transparent medium
   * @param angleDeg angle of incidence in degrees
   * @param n index behind the face
   * @param k extinction coefficient behind it
   */
  static double s(double n0, double angleDeg, double n, double k) {
    double cos = Math.cos(Math.toRadians(angleDeg));
    double[] q = normal(n0, angleDeg, n, k);
    return squaredRatio(n0 * cos - q[0], -q[1], n0 * cos + q[0], q[1]);
  }

  /** For light polarised in the plane of incidence. */
  static double p(double n0, double angleDeg, double n, double k) {
    double cos = Math.cos(Math.toRadians(angleDeg));
    double[] q = normal(n0, angleDeg, n, k);
    double real = (n * n - k * k) * cos;
    double imaginary = 2 * n * k * cos;
    return squaredRatio(
        real - n0 * q[0], imaginary - n0 * q[1], real + n0 * q[0], imaginary + n0 * q[1]);
  }

  /** sqrt(N² − n0² sin²θ), the branch that decays into the medium. */
  private static double[] normal(double n0, double angleDeg, double n, double k) {
    double sin = n0 * Math.sin(Math.toRadians(angleDeg));
    double real = n * n - k * k - sin * sin;
    double imaginary = 2 * n * k;
    double size = Math.hypot(real, imaginary);
    // The larger part first, so that the smaller does not drown in a difference.
    if (real >= 0) {
      double root = Math.sqrt((size + real) / 2);
      return new double[] {root, root == 0 ? 0 : imaginary / (2 * root)};
    }
    double root = Math.sqrt((size - real) / 2);
    return new double[] {imaginary / (2 * root), root};
  }

  private static double squaredRatio(double a, double b, double c, double d) {
    return (a * a + b * b) / (c * c + d * d);
  }
}
