package evensun.report.decision;

import evensun.result.WhatIf;
import java.util.Optional;

/**
 * The stretch of a curve around a value where it stays above a floor.
 *
 * @param low lower end
 * @param high upper end
 */
record Window(double low, double high) {

  /**
   * Walks from the found value to both sides until the curve falls below the floor, linearly
   * between its points.
   *
   * @param curve values ascending
   * @param found where to start
   * @param floor least aim
   */
  static Optional<Window> around(WhatIf curve, double found, double floor) {
    int n = curve.value().size();
    if (n < 2 || found < curve.value().get(0) || found > curve.value().get(n - 1)) {
      return Optional.empty();
    }
    int above = 0;
    while (above < n - 1 && curve.value().get(above) < found) {
      above++;
    }
    return Optional.of(
        new Window(
            end(curve, above, -1, found, floor),
            end(curve, Math.max(0, above - 1), 1, found, floor)));
  }

  private static double end(WhatIf curve, int from, int step, double found, double floor) {
    double inside = found;
    for (int i = from + step; i >= 0 && i < curve.value().size(); i += step) {
      double aim = curve.aim().get(i);
      if (aim < floor) {
        double before = curve.aim().get(i - step);
        double part =
            before > aim ? Math.max(0, Math.min(1, (before - floor) / (before - aim))) : 0;
        double at = curve.value().get(i - step);
        double crossing = at + part * (curve.value().get(i) - at);
        return step < 0 ? Math.min(found, crossing) : Math.max(found, crossing);
      }
      inside = curve.value().get(i);
    }
    return inside;
  }
}
