package evensun.spi;

/**
 * The limit of light trapping at an outer boundary of a stack. Towards the incident medium: all
 * light couples in, direction randomised (Lambertian), and inside a share 1 − 1/n² of randomised
 * light is reflected, the rest leaves, n the index of the thick layer below. Towards the exit
 * medium: everything is reflected, direction randomised. Films of such a boundary absorb nothing.
 * Where it stands is as for {@link Texture}.
 *
 * @param face which face of the layer is meant
 */
public record IdealFace(Side face) implements Feature {

  /** The kind of this feature. */
  public static final String KIND = "ideal-face";

  @Override
  public String kind() {
    return KIND;
  }
}
