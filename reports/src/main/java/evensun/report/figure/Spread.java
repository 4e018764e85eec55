package evensun.report.figure;

import java.util.Arrays;

/** Moves labels apart along a line, keeping their order and moving each as little as it can. */
final class Spread {

  private Spread() {}

  /**
   * Positions at least their half sizes apart, inside the interval as far as it is wide enough.
   *
   * @param wanted where each label would stand, ascending
   * @param size room that each needs
   * @param low lower end of the interval
   * @param high upper end
   */
  static double[] apart(double[] wanted, double[] size, double low, double high) {
    int n = wanted.length;
    double[] at = Arrays.copyOf(wanted, n);
    for (int pass = 0; pass < 200; pass++) {
      boolean moved = false;
      for (int i = 0; i + 1 < n; i++) {
        double overlap = (size[i] + size[i + 1]) / 2 - (at[i + 1] - at[i]);
        if (overlap > 1e-6) {
          at[i] -= overlap / 2;
          at[i + 1] += overlap / 2;
          moved = true;
        }
      }
      moved |= clamp(at, size, low, high);
      if (!moved) {
        break;
      }
    }
    settle(at, size, low);
    return at;
  }

  private static boolean clamp(double[] at, double[] size, double low, double high) {
    boolean moved = false;
    for (int i = 0; i < at.length; i++) {
      double inside = Math.max(low + size[i] / 2, Math.min(high - size[i] / 2, at[i]));
      moved |= Math.abs(inside - at[i]) > 1e-6;
      at[i] = inside;
    }
    return moved;
  }

  /** Last pass from the low end, so that no two overlap even where there is too little room. */
  private static void settle(double[] at, double[] size, double low) {
    double edge = low;
    for (int i = 0; i < at.length; i++) {
      at[i] = Math.max(at[i], edge + size[i] / 2);
      edge = at[i] + size[i] / 2;
    }
  }
}
