package evensun.raytrace.kernel;

/** Where in tables of coatings the meetings of one wavelength look up; immutable. */
public final class Nodes {

  /** [event] the lower of two neighbouring nodes. */
  public final int[] index;

  /** [event] weight of the upper one, in [0, 1]. */
  public final float[] share;

  /** Takes the arrays over. */
  public Nodes(int[] index, float[] share) {
    this.index = index;
    this.share = share;
  }
}
