package evensun.verify;

/** What regular pyramids with {111} facets reflect, from the Fresnel equations by geometry. */
final class Facets {

  /** Share of the rays that meet a third facet. */
  private static final double THIRD = 1.0 / 9;

  private Facets() {}

  /**
   * Reflectance of bare pyramids for unpolarised light along the normal. A ray meets opposite
   * facets in turn and stays in the plane across both, so that s and p light keep apart.
   *
   * @param n index of the pyramids
   * @param k extinction coefficient
   */
  static double pyramids(double n, double k) {
    double facet = RayProbe.FACET_DEG;
    double sum = 0;
    for (boolean p : new boolean[] {false, true}) {
      double two = bare(facet, n, k, p) * bare(180 - 3 * facet, n, k, p);
      sum += two * (1 - THIRD + THIRD * bare(360 - 5 * facet, n, k, p));
    }
    return 0.5 * sum;
  }

  /** |r|² of a face from air, with N = n + ik and N cos θ' = √(N² − sin²θ). */
  private static double bare(double angleDeg, double n, double k, boolean p) {
    double cos = Math.cos(Math.toRadians(angleDeg));
    double sin2 = 1 - cos * cos;
    double re = n * n - k * k - sin2;
    double im = 2 * n * k;
    double size = Math.hypot(re, im);
    double a = Math.sqrt(0.5 * (size + re));
    double b = Math.sqrt(0.5 * (size - re));
    if (!p) {
      return ((cos - a) * (cos - a) + b * b) / ((cos + a) * (cos + a) + b * b);
    }
    // r_p = (N² cos θ − q) / (N² cos θ + q)
    double x = (n * n - k * k) * cos;
    double y = 2 * n * k * cos;
    return ((x - a) * (x - a) + (y - b) * (y - b)) / ((x + a) * (x + a) + (y + b) * (y + b));
  }
}
