package evensun.raytrace.trace;

/**
 * Fresnel reflectance of a face without films, from a medium taken as transparent: a guess of how
 * light will split, which decides what is worth following and nothing else.
 */
final class BareFace {

  private double s;
  private double p;

  /**
   * Finds the reflectances.
   *
   * @param n1 index of the medium the light comes from
   * @param cosine of the angle of incidence
   * @param n2 index beyond
   * @param k2 extinction coefficient beyond
   */
  void solve(double n1, double cosine, double n2, double k2) {
    double tangential = n1 * n1 * (1 - cosine * cosine);
    double re = n2 * n2 - k2 * k2 - tangential;
    double im = 2 * n2 * k2;
    double size = Math.hypot(re, im);
    double a = Math.sqrt(Math.max(0, (size + re) / 2));
    double b = Math.sqrt(Math.max(0, (size - re) / 2));
    double incident = n1 * cosine;
    s = reflectance(incident, a, b);
    // Admittance of p: N² / q, against n1 / cosine.
    double squares = a * a + b * b;
    double nRe = n2 * n2 - k2 * k2;
    double yRe = (nRe * a + im * b) / squares;
    double yIm = (im * a - nRe * b) / squares;
    p = squares == 0 ? 1 : reflectance(n1 / Math.max(cosine, 1e-9), yRe, yIm);
  }

  private static double reflectance(double y1, double yRe, double yIm) {
    double below = (y1 + yRe) * (y1 + yRe) + yIm * yIm;
    return below == 0 ? 1 : ((y1 - yRe) * (y1 - yRe) + yIm * yIm) / below;
  }

  double s() {
    return s;
  }

  double p() {
    return p;
  }
}
