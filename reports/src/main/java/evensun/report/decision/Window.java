package evensun.report.decision;

import evensun.result.WhatIf;
import java.util.ArrayList;
import java.util.List;
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
   * between its points, of which the found value is one.
   *
   * @param curve values ascending
   * @param found where to start
   * @param aimFound aim there
   * @param floor least aim
   */
  static Optional<Window> around(WhatIf curve, double found, double aimFound, double floor) {
    int n = curve.value().size();
    if (n < 2 || found < curve.value().get(0) || found > curve.value().get(n - 1)) {
      return Optional.empty();
    }
    List<double[]> below = new ArrayList<>();
    List<double[]> above = new ArrayList<>();
    for (int i = 0; i < n; i++) {
      double[] point = {curve.value().get(i), curve.aim().get(i)};
      if (point[0] < found) {
        below.add(0, point);
      } else if (point[0] > found) {
        above.add(point);
      }
    }
    double[] start = {found, aimFound};
    return Optional.of(new Window(end(start, below, floor), end(start, above, floor)));
  }

  private static double end(double[] start, List<double[]> points, double floor) {
    double[] inside = start;
    for (double[] point : points) {
      if (point[1] < floor) {
        double part = (inside[1] - floor) / (inside[1] - point[1]);
        return inside[0] + part * (point[0] - inside[0]);
      }
      inside = point;
    }
    return inside[0];
  }
}
