package evensun.raytrace.geometry;

import evensun.spi.HeightMap;

/**
 * A measured surface: squares of two triangles each, cut along the diagonal on which the surface
 * bends less, so that ridges and valleys along a diagonal stay sharp.
 */
final class HeightField implements Relief {

  private static final int MOST_STEPS = 100_000;

  private final int columns;
  private final int rows;
  private final double pitch;
  private final double[] height;
  private final boolean[] rising; // [square] cut from its near to its far corner
  private final double low;
  private final double high;
  private final double mean;
  private final double feature;

  HeightField(HeightMap map) {
    columns = map.columns();
    rows = map.rows();
    pitch = map.pitchUm();
    height = map.heightUm().toArray();
    rising = new boolean[height.length];
    double sum = 0;
    double least = Double.POSITIVE_INFINITY;
    double most = Double.NEGATIVE_INFINITY;
    for (int i = 0; i < height.length; i++) {
      int column = i % columns;
      int row = i / columns;
      rising[i] = bend(column, row, 1) <= bend(column + 1, row, -1);
      sum += height[i];
      least = Math.min(least, height[i]);
      most = Math.max(most, height[i]);
    }
    low = least;
    high = most;
    mean = sum / height.length;
    feature = correlationUm();
  }

  /** Second difference along a diagonal, two points beyond the square at both ends. */
  private double bend(int column, int row, int step) {
    return Math.abs(
        at(column - step, row - 1)
            - at(column, row)
            - at(column + step, row + 1)
            + at(column + 2 * step, row + 2));
  }

  private double at(int column, int row) {
    return height[Math.floorMod(row, rows) * columns + Math.floorMod(column, columns)];
  }

  /**
   * Twice the distance between neighbouring crossings of the mean height: the width of a shape that
   * stands out.
   */
  private double correlationUm() {
    int crossings = 0;
    for (int i = 0; i < height.length; i++) {
      boolean above = height[i] > mean;
      crossings += above != at(i % columns + 1, i / columns) > mean ? 1 : 0;
    }
    return crossings == 0 ? columns * pitch : 2 * pitch * height.length / crossings;
  }

  @Override
  public double periodXUm() {
    return columns * pitch;
  }

  @Override
  public double periodYUm() {
    return rows * pitch;
  }

  @Override
  public double lowUm() {
    return low;
  }

  @Override
  public double highUm() {
    return high;
  }

  @Override
  public double meanUm() {
    return mean;
  }

  @Override
  public double featureUm() {
    return feature;
  }

  @Override
  public double heightUm(double xUm, double yUm) {
    int column = (int) Math.floor(xUm / pitch);
    int row = (int) Math.floor(yUm / pitch);
    double u = xUm / pitch - column;
    double v = yUm / pitch - row;
    boolean first = isFirst(column, row, u, v);
    return at(column, row)
        + offset(column, row, first)
        + u * slopeX(column, row, first)
        + v * slopeY(column, row, first);
  }

  /** Whether a place in a square belongs to its first triangle, the one at larger x. */
  private boolean isFirst(int column, int row, double u, double v) {
    return isRising(column, row) ? u >= v : u + v >= 1;
  }

  private boolean isRising(int column, int row) {
    return rising[Math.floorMod(row, rows) * columns + Math.floorMod(column, columns)];
  }

  /** Height of a triangle's plane at the near corner of its square, above that corner. */
  private double offset(int column, int row, boolean first) {
    if (isRising(column, row) || !first) {
      return 0;
    }
    return at(column + 1, row) + at(column, row + 1) - at(column + 1, row + 1) - at(column, row);
  }

  /** Rise of a triangle's plane from column to column. */
  private double slopeX(int column, int row, boolean first) {
    boolean near = first == isRising(column, row);
    int side = near ? row : row + 1;
    return at(column + 1, side) - at(column, side);
  }

  /** Rise of a triangle's plane from row to row. */
  private double slopeY(int column, int row, boolean first) {
    int side = first ? column + 1 : column;
    return at(side, row + 1) - at(side, row);
  }

  @Override
  public boolean next(Ray ray, boolean above) {
    ray.x -= Math.floor(ray.x / periodXUm()) * periodXUm();
    ray.y -= Math.floor(ray.y / periodYUm()) * periodYUm();
    double limit = end(ray);
    int column = (int) Math.floor(ray.x / pitch);
    int row = (int) Math.floor(ray.y / pitch);
    double from = 0;
    for (int step = 0; step < MOST_STEPS; step++) {
      double nextX = border(ray.x, ray.dx, column);
      double nextY = border(ray.y, ray.dy, row);
      double reach = Math.min(limit, Math.min(nextX, nextY));
      if (meets(ray, column, row, from, reach, above)) {
        return true;
      }
      if (reach >= limit) {
        break;
      }
      from = reach;
      if (nextX <= nextY) {
        column += ray.dx > 0 ? 1 : -1;
      } else {
        row += ray.dy > 0 ? 1 : -1;
      }
    }
    ray.advance(limit);
    return false;
  }

  private double end(Ray ray) {
    if (ray.dz == 0) {
      return Double.MAX_VALUE;
    }
    return Math.max(0, ((ray.dz < 0 ? low : high) - ray.z) / ray.dz);
  }

  private double border(double at, double direction, int square) {
    if (direction == 0) {
      return Double.POSITIVE_INFINITY;
    }
    return ((square + (direction > 0 ? 1 : 0)) * pitch - at) / direction;
  }

  private boolean meets(Ray ray, int column, int row, double from, double reach, boolean above) {
    double a = meeting(ray, column, row, true, from, reach, above);
    double b = meeting(ray, column, row, false, from, reach, above);
    double nearest = Math.min(a, b);
    if (nearest == Double.POSITIVE_INFINITY) {
      return false;
    }
    boolean first = a <= b;
    double sx = slopeX(column, row, first) / pitch;
    double sy = slopeY(column, row, first) / pitch;
    double scale = 1 / Math.sqrt(1 + sx * sx + sy * sy);
    ray.meet(-sx * scale, -sy * scale, scale);
    ray.advance(nearest);
    return true;
  }

  /** Where the line goes through a triangle towards the other medium; infinity where it misses. */
  private double meeting(
      Ray ray, int column, int row, boolean first, double from, double reach, boolean above) {
    double sx = slopeX(column, row, first) / pitch;
    double sy = slopeY(column, row, first) / pitch;
    double rate = ray.dz - sx * ray.dx - sy * ray.dy;
    if (above ? rate >= 0 : rate <= 0) {
      return Double.POSITIVE_INFINITY;
    }
    double gap =
        ray.z
            - at(column, row)
            - offset(column, row, first)
            - sx * (ray.x - column * pitch)
            - sy * (ray.y - row * pitch);
    double at = Math.max(-gap / rate, 0);
    double slack = 1e-9 * pitch;
    if (at < from - slack || at > reach + slack) {
      return Double.POSITIVE_INFINITY;
    }
    double u = (ray.x + at * ray.dx) / pitch - column;
    double v = (ray.y + at * ray.dy) / pitch - row;
    double into = isRising(column, row) ? u - v : u + v - 1;
    return (first ? into >= -1e-9 : into <= 1e-9) ? at : Double.POSITIVE_INFINITY;
  }
}
