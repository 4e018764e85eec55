package evensun.raytrace.geometry;

/** Straight light on its way; a workspace that is reused. Lengths in µm, z towards the light. */
public final class Ray {

  /** Place. */
  public double x;

  /** Place. */
  public double y;

  /** Height above the level the relief counts from. */
  public double z;

  /** Direction, of length 1. */
  public double dx;

  /** Direction. */
  public double dy;

  /** Direction; negative is down. */
  public double dz;

  /** Normal of the facet that was met, of length 1, towards the upper medium. */
  public double normalX;

  /** Normal. */
  public double normalY;

  /** Normal. */
  public double normalZ;

  /** Length of the last piece of the way. */
  public double travelledUm;

  /** Goes on along the direction. */
  void advance(double lengthUm) {
    x += lengthUm * dx;
    y += lengthUm * dy;
    z += lengthUm * dz;
    travelledUm = lengthUm;
  }

  void meet(double nx, double ny, double nz) {
    normalX = nx;
    normalY = ny;
    normalZ = nz;
  }

  /** Turns the world upside down, normals towards the other medium. */
  void flip() {
    z = -z;
    dz = -dz;
    normalX = -normalX;
    normalY = -normalY;
  }
}
