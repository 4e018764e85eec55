package evensun.raytrace.kernel;

/**
 * What the light of one wavelength did, without how much of it there was: meetings with facets,
 * each after the one it came from. Immutable.
 *
 * <p>From a meeting two legs start, 0 reflected and 1 transmitted. Light of a leg is absorbed on
 * its way, and what is left comes to the next meeting or leaves.
 */
public final class LightTree {

  /** Number of meetings. */
  public final int count;

  /** [event] 2 · event + leg that the light came by, −1 for light that comes from outside. */
  public final int[] parent;

  /**
   * [event] share of the power that stays in its polarisation when the plane of incidence turns.
   */
  public final float[] kept;

  /** [event] 1 over the chance at which this piece was followed, where that was decided by lot. */
  public final float[] factor;

  /**
   * [event] index of the table: 2 · boundary, 1 more for light from below; after all of these one
   * for light that has never been beyond its first boundary.
   */
  public final byte[] table;

  /** [event] cosine of the angle of incidence. */
  public final double[] cosine;

  /** [2 · event + leg] where light of the leg is booked; 0 where it is not. */
  public final byte[] slot;

  /** [2 · event + leg] length in µm whatever the thickness; infinite where all light is booked. */
  public final float[] fixedUm;

  /**
   * [2 · event + leg] further length per thickness of the layer that is crossed; 0 where the leg
   * stays at its boundary.
   */
  public final float[] perThickness;

  /** [replicate] first event; one more entry closes the last. */
  public final int[] start;

  /** Rays of each replicate. */
  public final int rays;

  /** Takes the arrays over. */
  public LightTree(
      int[] parent,
      float[] kept,
      float[] factor,
      byte[] table,
      double[] cosine,
      byte[] slot,
      float[] fixedUm,
      float[] perThickness,
      int[] start,
      int rays) {
    count = parent.length;
    this.parent = parent;
    this.kept = kept;
    this.factor = factor;
    this.table = table;
    this.cosine = cosine;
    this.slot = slot;
    this.fixedUm = fixedUm;
    this.perThickness = perThickness;
    this.start = start;
    this.rays = rays;
  }
}
