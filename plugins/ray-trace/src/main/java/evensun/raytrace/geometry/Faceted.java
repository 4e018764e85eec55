package evensun.raytrace.geometry;

/** A pyramid or a ridge: plane facets of one slope. */
final class Faceted implements Solid {

  private static final double[] ALONG_X = {1, -1, 0, 0};
  private static final double[] ALONG_Y = {0, 0, 1, -1};

  private final double half;
  private final double slope;
  private final double scale;
  private final int facets;

  private Faceted(double half, double slope, int facets) {
    this.half = half;
    this.slope = slope;
    this.facets = facets;
    scale = 1 / Math.hypot(1, slope);
  }

  /** A pyramid on a square. */
  static Faceted pyramid(double baseUm, double slope) {
    return new Faceted(baseUm / 2, slope, 4);
  }

  /** A ridge along y. */
  static Faceted ridge(double baseUm, double slope) {
    return new Faceted(baseUm / 2, slope, 2);
  }

  @Override
  public double halfX() {
    return half;
  }

  @Override
  public double halfY() {
    return facets == 2 ? Double.POSITIVE_INFINITY : half;
  }

  @Override
  public double height() {
    return half * slope;
  }

  @Override
  public void cross(double x, double y, double z, Ray line, Crossing into) {
    into.whole();
    for (int f = 0; f < facets; f++) {
      double sx = slope * ALONG_X[f];
      double sy = slope * ALONG_Y[f];
      double above = z + sx * x + sy * y - half * slope;
      double rate = line.dz + sx * line.dx + sy * line.dy;
      if (rate > 0) {
        if (-above < into.out * rate) {
          into.leave(-above / rate, sx * scale, sy * scale, scale);
        }
      } else if (rate < 0) {
        if (-above < into.in * rate) {
          into.enter(-above / rate, sx * scale, sy * scale, scale);
        }
      } else if (above > 0) {
        into.none();
        return;
      }
    }
  }

  @Override
  public double heightAt(double x, double y) {
    double away = facets == 2 ? Math.abs(x) : Math.max(Math.abs(x), Math.abs(y));
    return slope * (half - away);
  }
}
