package evensun.transfermatrix.kernel;

/**
 * A plane wave in the medium it comes from.
 *
 * @param cosine cosine of the angle to the normal, in (0, 1]
 * @param s share of the intensity that is s-polarised, in [0, 1]
 * @param p share of the intensity that is p-polarised, in [0, 1]; 0 along the normal, where both
 *     are one
 */
public record Beam(double cosine, double s, double p) {

  /** Whether the wave travels along the normal. */
  public boolean normal() {
    return cosine == 1;
  }

  /** As equals, but free of boxing. */
  boolean same(Beam other) {
    return other != null && cosine == other.cosine && s == other.s && p == other.p;
  }
}
