package evensun.raytrace.geometry;

/** A spherical cap. */
final class Cap implements Solid {

  private final double half;
  private final double radius;
  private final double height;

  /**
   * A cap.
   *
   * @param baseUm diameter on the floor
   * @param rimDeg angle to the floor at the rim, in (0, 90)
   */
  Cap(double baseUm, double rimDeg) {
    half = baseUm / 2;
    radius = half / Math.sin(Math.toRadians(rimDeg));
    height = radius * (1 - Math.cos(Math.toRadians(rimDeg)));
  }

  @Override
  public double halfX() {
    return half;
  }

  @Override
  public double halfY() {
    return half;
  }

  @Override
  public double height() {
    return height;
  }

  @Override
  public void cross(double x, double y, double z, Ray line, Crossing into) {
    double up = z + radius - height;
    double along = x * line.dx + y * line.dy + up * line.dz;
    double square = along * along - (x * x + y * y + up * up - radius * radius);
    if (square <= 0) {
      into.none();
      return;
    }
    double root = Math.sqrt(square);
    double in = -along - root;
    double out = -along + root;
    into.enter(
        in, (x + in * line.dx) / radius, (y + in * line.dy) / radius, (up + in * line.dz) / radius);
    into.leave(
        out,
        (x + out * line.dx) / radius,
        (y + out * line.dy) / radius,
        (up + out * line.dz) / radius);
  }

  @Override
  public double heightAt(double x, double y) {
    double square = radius * radius - x * x - y * y;
    return square <= 0 ? -1 : Math.sqrt(square) - radius + height;
  }
}
