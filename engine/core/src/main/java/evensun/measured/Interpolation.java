package evensun.measured;

import java.util.Arrays;

/** Linear interpolation in increasing abscissas. */
final class Interpolation {

  private Interpolation() {}

  /** Value at x; the end values hold beyond the ends. */
  static double linear(double[] xs, double[] ys, double x) {
    int found = Arrays.binarySearch(xs, x);
    if (found >= 0) {
      return ys[found];
    }
    int right = -found - 1;
    if (right == 0 || right == xs.length) {
      return ys[Math.min(right, xs.length - 1)];
    }
    double share = (x - xs[right - 1]) / (xs[right] - xs[right - 1]);
    return ys[right - 1] + share * (ys[right] - ys[right - 1]);
  }
}
