package evensun.raytrace.geometry;

/** A convex body on the floor z = 0; what lies below the floor does not matter. */
interface Solid {

  /** Half its extent along x on the floor, in µm. */
  double halfX();

  /** Half its extent along y on the floor, in µm; infinite for what runs along y. */
  double halfY();

  /** Height in µm. */
  double height();

  /**
   * Finds where a line is inside.
   *
   * @param x a point of the line, from the centre of the body
   * @param y a point of the line, from the centre of the body
   * @param z a point of the line, above the floor
   * @param line its direction
   * @param into out
   */
  void cross(double x, double y, double z, Ray line, Crossing into);

  /** Height at a place from its centre; negative outside. */
  double heightAt(double x, double y);
}
