package evensun.raytrace.geometry;

/**
 * A periodic surface, single-valued in height, between two media; immutable.
 *
 * <p>Between {@link #lowUm()} and {@link #highUm()} light may meet it; above there is the upper
 * medium alone, below the lower one.
 */
public interface Relief {

  /** Period along x in µm. */
  double periodXUm();

  /** Period along y in µm. */
  double periodYUm();

  /** Lowest height in µm. */
  double lowUm();

  /** Highest height in µm. */
  double highUm();

  /** Mean height in µm, from which thicknesses of thick layers count. */
  double meanUm();

  /** Width of the smallest shape in µm, against which films and wavelengths are judged. */
  double featureUm();

  /**
   * Follows light to its next meeting with the surface.
   *
   * @param ray where it is, between low and high, and where it goes; moved to the meeting point
   *     with the facet's normal set, or to the height where it leaves
   * @param above whether it is in the upper medium
   * @return true where it meets the surface, false where it leaves upwards or downwards
   */
  boolean next(Ray ray, boolean above);

  /** Height at a place, in µm. */
  double heightUm(double xUm, double yUm);
}
