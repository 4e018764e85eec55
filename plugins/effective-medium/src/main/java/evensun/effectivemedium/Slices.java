package evensun.effectivemedium;

import evensun.spi.Profile;

/**
 * A profile cut into slices, finer where it changes faster; each slice has the mean share over its
 * depth, so that the amount of both ends is kept.
 */
final class Slices {

  private static final int MESH = 4096;
  private static final int POINTS_PER_SLICE = 64;

  private final double[] boundary;
  private final double[] share;

  private Slices(double[] boundary, double[] share) {
    this.boundary = boundary;
    this.share = share;
  }

  /**
   * Cuts a profile. Every slice covers the same amount of depth and change together.
   *
   * @param profile share of the lower end against relative depth
   * @param count number of slices, at least 1
   */
  static Slices of(Profile profile, int count) {
    double[] boundary = boundaries(profile, count);
    double[] share = new double[count];
    for (int i = 0; i < count; i++) {
      share[i] = mean(profile, boundary[i], boundary[i + 1]);
    }
    return new Slices(boundary, share);
  }

  int count() {
    return share.length;
  }

  /** Thickness of a slice over that of the layer. */
  double width(int slice) {
    return boundary[slice + 1] - boundary[slice];
  }

  /** Share of the lower end in a slice. */
  double share(int slice) {
    return share[slice];
  }

  /** The slice at a relative depth in [0, 1]. */
  int at(double relativeDepth) {
    int slice = 0;
    while (slice < count() - 1 && boundary[slice + 1] <= relativeDepth) {
      slice++;
    }
    return slice;
  }

  private static double[] boundaries(Profile profile, int count) {
    double[] monitor = monitor(profile);
    double[] boundary = new double[count + 1];
    int cell = 1;
    for (int i = 1; i < count; i++) {
      double wanted = (double) i / count;
      while (monitor[cell] < wanted) {
        cell++;
      }
      double part = (wanted - monitor[cell - 1]) / (monitor[cell] - monitor[cell - 1]);
      boundary[i] = (cell - 1 + part) / MESH;
    }
    boundary[count] = 1;
    return boundary;
  }

  /** [i] mean of relative depth and of relative change above depth i/MESH, from 0 to 1. */
  private static double[] monitor(Profile profile) {
    double[] change = new double[MESH + 1];
    for (int i = 1; i <= MESH; i++) {
      double step = profile.at((double) i / MESH) - profile.at((double) (i - 1) / MESH);
      change[i] = change[i - 1] + Math.abs(step);
    }
    double all = change[MESH];
    for (int i = 0; i <= MESH; i++) {
      double depth = (double) i / MESH;
      change[i] = all > 0 ? 0.5 * (depth + change[i] / all) : depth;
    }
    return change;
  }

  private static double mean(Profile profile, double from, double to) {
    double sum = 0;
    for (int i = 0; i < POINTS_PER_SLICE; i++) {
      sum += profile.at(from + (to - from) * (i + 0.5) / POINTS_PER_SLICE);
    }
    return sum / POINTS_PER_SLICE;
  }
}
