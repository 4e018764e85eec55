package evensun.raytrace.trace;

import evensun.raytrace.geometry.Ray;

/** A piece of light on its way from one meeting to the next. */
final class Leg {

  final Ray ray = new Ray();

  /** Direction of s polarisation, of length 1, across the ray. */
  double sx;

  double sy;
  double sz;

  /** Whether the polarisation is lost: s and p are then alike. */
  boolean mixed;

  /** Guessed power in s and p, of 1 that the ray brought. */
  double guessS;

  double guessP;

  /** 2 · event + leg of the tree it belongs to, −1 for light from outside. */
  int parent = -1;

  /** 1 over the chance at which it was followed. */
  double factor = 1;

  /** Meetings before it. */
  int meetings;

  /** Boundary it is at or comes to. */
  int face;

  /** Whether it is in the medium above that boundary. */
  boolean above;

  /** Whether it is between the lowest and the highest point of that boundary. */
  boolean inRelief;

  /** Whether it has never been beyond the boundary it first came to. */
  boolean fresh = true;

  /** Deepest medium it has been in. */
  int deepest;

  /** What its ray draws from, how much of that is used, and the key of its lots. */
  double[] point;

  int dimension;
  long key;

  /** What the way adds up to, see {@link evensun.raytrace.kernel.LightTree}. */
  double fixedUm;

  double perThickness;
  int slot;

  /** Draws a number in [0, 1). */
  double draw() {
    int d = dimension++;
    return d < point.length ? point[d] : Draws.unit(Draws.mixed(key + Draws.STEP * d));
  }

  /** Medium it is in. */
  int medium() {
    return above ? face : face + 1;
  }

  /** A leg that goes on from here. */
  Leg next(int event, int which, double s, double p) {
    Leg leg = new Leg();
    leg.ray.x = ray.x;
    leg.ray.y = ray.y;
    leg.ray.z = ray.z;
    leg.ray.dx = ray.dx;
    leg.ray.dy = ray.dy;
    leg.ray.dz = ray.dz;
    leg.sx = sx;
    leg.sy = sy;
    leg.sz = sz;
    leg.guessS = s;
    leg.guessP = p;
    leg.parent = 2 * event + which;
    leg.meetings = meetings + 1;
    leg.face = face;
    leg.above = above;
    leg.inRelief = inRelief;
    leg.fresh = fresh && which == 0;
    leg.deepest = deepest;
    leg.point = point;
    leg.dimension = dimension;
    leg.key = Draws.mixed(key + which);
    return leg;
  }

  /** Points it along a direction in the frame of a facet. */
  void point(double x, double y, double z) {
    ray.dx = x;
    ray.dy = y;
    ray.dz = z;
  }

  /** Moves it off the facet, to the side of its medium. */
  void leave(double nx, double ny, double nz, double byUm) {
    double way = above ? byUm : -byUm;
    ray.x += way * nx;
    ray.y += way * ny;
    ray.z += way * nz;
  }
}
