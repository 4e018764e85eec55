package evensun.raytrace.trace;

import evensun.raytrace.geometry.Ray;

/** Where light goes from a facet. */
final class Directions {

  private Directions() {}

  /** Turns the frame of polarisation into the plane of incidence; the share that stays. */
  static double turn(Leg leg) {
    Ray ray = leg.ray;
    double x = ray.dy * ray.normalZ - ray.dz * ray.normalY;
    double y = ray.dz * ray.normalX - ray.dx * ray.normalZ;
    double z = ray.dx * ray.normalY - ray.dy * ray.normalX;
    double length = Math.sqrt(x * x + y * y + z * z);
    if (length < 1e-9) {
      return leg.mixed ? 0.5 : 1;
    }
    double same = (leg.sx * x + leg.sy * y + leg.sz * z) / length;
    leg.sx = x / length;
    leg.sy = y / length;
    leg.sz = z / length;
    return leg.mixed ? 0.5 : Math.min(1, same * same);
  }

  /** Mirrors a leg at the facet its ray met. */
  static void reflect(Leg leg, Ray facet) {
    Ray ray = leg.ray;
    double along = ray.dx * facet.normalX + ray.dy * facet.normalY + ray.dz * facet.normalZ;
    leg.point(
        ray.dx - 2 * along * facet.normalX,
        ray.dy - 2 * along * facet.normalY,
        ray.dz - 2 * along * facet.normalZ);
  }

  /**
   * Refracts a leg at the facet its ray met. Where no real angle exists, light that gets through
   * (into a metal) goes straight in.
   *
   * @param leg still with the direction and the side it came from
   * @param ratio index it comes from over index it goes to
   * @param cosine of the angle of incidence
   */
  static void refract(Leg leg, Ray facet, double ratio, double cosine) {
    double side = leg.above ? 1 : -1;
    double square = 1 - ratio * ratio * (1 - cosine * cosine);
    double along = square <= 0 ? 0 : ratio;
    double across = square <= 0 ? -1 : ratio * cosine - Math.sqrt(square);
    Ray ray = leg.ray;
    double x = along * ray.dx + across * side * facet.normalX;
    double y = along * ray.dy + across * side * facet.normalY;
    double z = along * ray.dz + across * side * facet.normalZ;
    double length = Math.sqrt(x * x + y * y + z * z);
    leg.point(x / length, y / length, z / length);
    leg.above = !leg.above;
  }

  /**
   * Sends a leg off at an angle to the mean plane, its polarisation lost.
   *
   * @param cosine of the angle to the normal
   * @param turn angle about the normal, in radians
   * @param up whether upwards
   */
  static void around(Leg leg, double cosine, double turn, boolean up) {
    double sine = Math.sqrt(Math.max(0, 1 - cosine * cosine));
    leg.point(sine * Math.cos(turn), sine * Math.sin(turn), up ? cosine : -cosine);
    leg.sx = -Math.sin(turn);
    leg.sy = Math.cos(turn);
    leg.sz = 0;
    leg.mixed = true;
  }

  /**
   * Turns a leg a little, as a height profile of normal distribution does: the tangential wave
   * vector is shifted by a normal deviate of √2 over the correlation length in each direction. A
   * leg that would leave its side keeps its direction.
   *
   * @param waveNumber 2πn/λ per µm in the medium of the leg
   */
  static void blur(Leg leg, Ray facet, double perUm, double waveNumber, double u, double v) {
    double size = Math.sqrt(-2 * Math.log(1 - u)) * perUm / waveNumber;
    double alongS = size * Math.cos(2 * Math.PI * v);
    double alongT = size * Math.sin(2 * Math.PI * v);
    Ray ray = leg.ray;
    double normal = ray.dx * facet.normalX + ray.dy * facet.normalY + ray.dz * facet.normalZ;
    double tx = facet.normalY * leg.sz - facet.normalZ * leg.sy;
    double ty = facet.normalZ * leg.sx - facet.normalX * leg.sz;
    double tz = facet.normalX * leg.sy - facet.normalY * leg.sx;
    double x = ray.dx - normal * facet.normalX + alongS * leg.sx + alongT * tx;
    double y = ray.dy - normal * facet.normalY + alongS * leg.sy + alongT * ty;
    double z = ray.dz - normal * facet.normalZ + alongS * leg.sz + alongT * tz;
    double left = 1 - x * x - y * y - z * z;
    if (left > 0) {
      double up = Math.copySign(Math.sqrt(left), normal);
      leg.point(x + up * facet.normalX, y + up * facet.normalY, z + up * facet.normalZ);
      leg.mixed = true;
    }
  }
}
