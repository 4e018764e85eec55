package evensun.raytrace.geometry;

import java.util.ArrayList;
import java.util.List;

/**
 * Convex solids that stand on a floor, overlapping as they may, in a square cell that repeats. The
 * surface is the upper hull of solids and floor.
 */
final class Union implements Relief {

  private static final int MEAN_SAMPLES = 256;

  /** A line that crosses so many fields within a relief runs level; it counts as lost. */
  private static final int MOST_STEPS = 100_000;

  /**
   * A solid at its place.
   *
   * @param solid the body
   * @param x centre in µm
   * @param y centre in µm
   */
  record Placed(Solid solid, double x, double y) {}

  private final double period;
  private final double feature;
  private final double high;
  private final double mean;
  private final int fields; // along each side of the cell
  private final double width; // of a field
  private final Placed[][] inField; // [row * fields + column] solids and images above it
  private final ThreadLocal<Crossing> crossings = ThreadLocal.withInitial(Crossing::new);

  /**
   * A surface.
   *
   * @param periodUm side of the cell
   * @param featureUm width of a typical solid
   * @param solids what stands in the cell
   */
  Union(double periodUm, double featureUm, List<Placed> solids) {
    period = periodUm;
    feature = featureUm;
    fields = solids.size() == 1 ? 1 : (int) Math.max(1, Math.ceil(2 * periodUm / featureUm));
    width = periodUm / fields;
    inField = new Placed[fields * fields][];
    for (int f = 0; f < inField.length; f++) {
      inField[f] = above(f % fields, f / fields, solids);
    }
    high = solids.stream().mapToDouble(p -> p.solid().height()).max().orElse(0);
    mean = solids.isEmpty() ? 0 : average();
  }

  private Placed[] above(int column, int row, List<Placed> solids) {
    List<Placed> found = new ArrayList<>();
    for (Placed placed : solids) {
      boolean endless = Double.isInfinite(placed.solid().halfY());
      for (int i = -1; i <= 1; i++) {
        for (int j = endless ? 0 : -1; j <= (endless ? 0 : 1); j++) {
          double x = placed.x() + i * period;
          double y = placed.y() + j * period;
          if (overlaps(column, x, placed.solid().halfX())
              && (endless || overlaps(row, y, placed.solid().halfY()))) {
            found.add(new Placed(placed.solid(), x, y));
          }
        }
      }
    }
    return found.toArray(new Placed[0]);
  }

  private boolean overlaps(int field, double centre, double half) {
    double edge = 1e-9 * period;
    return centre - half < (field + 1) * width - edge && centre + half > field * width + edge;
  }

  private double average() {
    double sum = 0;
    for (int i = 0; i < MEAN_SAMPLES; i++) {
      for (int j = 0; j < MEAN_SAMPLES; j++) {
        sum += heightUm((i + 0.5) * period / MEAN_SAMPLES, (j + 0.5) * period / MEAN_SAMPLES);
      }
    }
    return sum / MEAN_SAMPLES / MEAN_SAMPLES;
  }

  @Override
  public double heightUm(double xUm, double yUm) {
    double x = xUm - Math.floor(xUm / period) * period;
    double y = yUm - Math.floor(yUm / period) * period;
    double height = 0;
    for (Placed placed : field((int) (x / width), (int) (y / width))) {
      height = Math.max(height, placed.solid().heightAt(x - placed.x(), y - placed.y()));
    }
    return height;
  }

  @Override
  public double periodXUm() {
    return period;
  }

  @Override
  public double periodYUm() {
    return period;
  }

  @Override
  public double lowUm() {
    return 0;
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
  public boolean next(Ray ray, boolean above) {
    ray.x -= Math.floor(ray.x / period) * period;
    ray.y -= Math.floor(ray.y / period) * period;
    return above ? fromAbove(ray) : fromBelow(ray);
  }

  private Placed[] field(int column, int row) {
    return inField[Math.floorMod(row, fields) * fields + Math.floorMod(column, fields)];
  }

  /** Field by field along the line, to the first solid it enters, the floor or the top. */
  private boolean fromAbove(Ray ray) {
    double limit = end(ray);
    int column = (int) Math.floor(ray.x / width);
    int row = (int) Math.floor(ray.y / width);
    for (int step = 0; step < MOST_STEPS; step++) {
      double nextX = border(ray.x, ray.dx, column);
      double nextY = border(ray.y, ray.dy, row);
      double reach = Math.min(limit, Math.min(nextX, nextY));
      if (entersBefore(ray, column, row, reach)) {
        return true;
      }
      if (reach >= limit) {
        return floorOrTop(ray, limit);
      }
      if (nextX <= nextY) {
        column += ray.dx > 0 ? 1 : -1;
      } else {
        row += ray.dy > 0 ? 1 : -1;
      }
    }
    return floorOrTop(ray, limit);
  }

  private double end(Ray ray) {
    if (ray.dz == 0) {
      return Double.MAX_VALUE;
    }
    return ray.dz < 0 ? Math.max(0, -ray.z / ray.dz) : Math.max(0, (high - ray.z) / ray.dz);
  }

  private double border(double at, double direction, int field) {
    if (direction == 0) {
      return Double.POSITIVE_INFINITY;
    }
    return ((field + (direction > 0 ? 1 : 0)) * width - at) / direction;
  }

  private static boolean floorOrTop(Ray ray, double limit) {
    ray.advance(limit);
    if (ray.dz < 0) {
      ray.meet(0, 0, 1);
      return true;
    }
    return false;
  }

  private boolean entersBefore(Ray ray, int column, int row, double reach) {
    double shiftX = Math.floorDiv(column, fields) * period;
    double shiftY = Math.floorDiv(row, fields) * period;
    Crossing crossing = crossings.get();
    double first = Double.POSITIVE_INFINITY;
    for (Placed placed : field(column, row)) {
      cross(ray, 0, placed, shiftX, shiftY, crossing);
      if (crossing.in < crossing.out && crossing.in >= 0 && crossing.in < first) {
        first = crossing.in;
        ray.meet(crossing.inX, crossing.inY, crossing.inZ);
      }
    }
    if (first > reach + slack()) {
      return false;
    }
    ray.advance(first);
    return true;
  }

  private double slack() {
    return 1e-10 * feature;
  }

  private static void cross(
      Ray ray, double at, Placed placed, double shiftX, double shiftY, Crossing into) {
    placed
        .solid()
        .cross(
            ray.x + at * ray.dx - placed.x() - shiftX,
            ray.y + at * ray.dy - placed.y() - shiftY,
            ray.z + at * ray.dz,
            ray,
            into);
  }

  /** From solid to overlapping solid, to where the line comes out of all or below the floor. */
  private boolean fromBelow(Ray ray) {
    double limit = ray.dz < 0 ? Math.max(0, -ray.z / ray.dz) : Double.MAX_VALUE;
    double at = 0;
    ray.meet(0, 0, 1);
    for (int step = 0; step < MOST_STEPS; step++) {
      double out = leaves(ray, at);
      if (out >= limit) {
        ray.advance(limit);
        return false;
      }
      if (out <= at) {
        break;
      }
      at = out;
    }
    ray.advance(at);
    return true;
  }

  /** Where the line leaves the solid that holds it longest from a point on; the point if none. */
  private double leaves(Ray ray, double at) {
    double x = ray.x + at * ray.dx;
    double y = ray.y + at * ray.dy;
    int column = (int) Math.floor(x / width);
    int row = (int) Math.floor(y / width);
    double shiftX = Math.floorDiv(column, fields) * period;
    double shiftY = Math.floorDiv(row, fields) * period;
    Crossing crossing = crossings.get();
    double last = slack();
    double found = at;
    for (Placed placed : field(column, row)) {
      cross(ray, at, placed, shiftX, shiftY, crossing);
      if (crossing.in <= slack() && crossing.out > last) {
        last = crossing.out;
        found = at + crossing.out;
        ray.meet(crossing.outX, crossing.outY, crossing.outZ);
      }
    }
    return found;
  }
}
