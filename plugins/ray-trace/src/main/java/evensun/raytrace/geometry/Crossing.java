package evensun.raytrace.geometry;

/** The piece of a straight line inside a solid; a workspace that is reused. */
final class Crossing {

  /** Where the line enters, in lengths of its direction. */
  double in;

  /** Where it leaves. */
  double out;

  /** Normal of the facet it enters by, outwards. */
  double inX;

  /** Normal. */
  double inY;

  /** Normal. */
  double inZ;

  /** Normal of the facet it leaves by, outwards. */
  double outX;

  /** Normal. */
  double outY;

  /** Normal. */
  double outZ;

  void whole() {
    in = Double.NEGATIVE_INFINITY;
    out = Double.POSITIVE_INFINITY;
  }

  void none() {
    in = Double.POSITIVE_INFINITY;
    out = Double.NEGATIVE_INFINITY;
  }

  void enter(double at, double x, double y, double z) {
    in = at;
    inX = x;
    inY = y;
    inZ = z;
  }

  void leave(double at, double x, double y, double z) {
    out = at;
    outX = x;
    outY = y;
    outZ = z;
  }
}
