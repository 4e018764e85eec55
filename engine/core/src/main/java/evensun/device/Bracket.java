package evensun.device;

import java.util.function.DoubleUnaryOperator;

/**
 * A root between two points where a function changes sign: inverse quadratic steps that may never
 * leave the bracket, bisection where they would not help (T. R. Chandrupatla, Adv. Eng. Softw. 28,
 * 145 (1997)). Values may be infinite. Allocates nothing.
 */
final class Bracket {

  private static final int MOST_STEPS = 200;

  private Bracket() {}

  /**
   * A root.
   *
   * @param f the function
   * @param from one end
   * @param to the other end; {@code f} has opposite signs, or is zero, at the ends
   * @param relative wanted precision of the root relative to itself
   * @return the better end of the last bracket
   */
  static double root(DoubleUnaryOperator f, double from, double to, double relative) {
    double b = from;
    double fb = f.applyAsDouble(from);
    double a = to;
    double fa = f.applyAsDouble(to);
    double c = a;
    double fc = fa;
    double t = 0.5;
    for (int i = 0; i < MOST_STEPS && fa != 0 && fb != 0; i++) {
      double x = a + t * (b - a);
      double fx = f.applyAsDouble(x);
      if (Math.signum(fx) == Math.signum(fa)) {
        c = a;
        fc = fa;
      } else {
        c = b;
        fc = fb;
        b = a;
        fb = fa;
      }
      a = x;
      fa = fx;
      double best = Math.abs(fa) < Math.abs(fb) ? a : b;
      double limit = (0.5 * relative * Math.abs(best) + Double.MIN_NORMAL) / Math.abs(b - a);
      if (limit > 0.5) {
        return best;
      }
      t = Math.min(1 - limit, Math.max(limit, share(a, fa, b, fb, c, fc)));
    }
    return Math.abs(fa) < Math.abs(fb) ? a : b;
  }

  /** Where between a and b to look next: by inverse quadratic interpolation, or the middle. */
  private static double share(double a, double fa, double b, double fb, double c, double fc) {
    double xi = (a - b) / (c - b);
    double phi = (fa - fb) / (fc - fb);
    boolean useful = phi * phi < xi && (1 - phi) * (1 - phi) < 1 - xi;
    if (!useful) {
      return 0.5;
    }
    return fa / (fb - fa) * fc / (fb - fc) + (c - a) / (b - a) * fa / (fc - fa) * fb / (fc - fb);
  }
}
