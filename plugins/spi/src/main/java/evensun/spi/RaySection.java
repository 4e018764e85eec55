package evensun.spi;

import java.util.List;

/** Ability: a few rays in a vertical section through a textured stack, to be drawn. */
public interface RaySection {

  /**
   * Traces a few rays.
   *
   * @param design the candidate
   * @param incidence index of the incidence, in [0, I)
   * @param wavelength index of the wavelength, in [0, W)
   * @param rayCount how many rays enter, at least 1
   */
  View view(Design design, int incidence, int wavelength, int rayCount);

  /**
   * What to draw. Lengths in µm; x along the section, z downwards from the mean plane of the first
   * boundary.
   *
   * <p>All outlines have the same range of x, a whole number of periods where the boundaries are
   * periodic. Paths may leave it: drawings continue them on the other side.
   *
   * @param outlines the boundaries of thick media, in the order light meets them
   * @param paths pieces of rays, in the order of travel
   */
  record View(List<Outline> outlines, List<Path> paths) {

    public View {
      outlines = List.copyOf(outlines);
      paths = List.copyOf(paths);
    }
  }

  /**
   * A boundary cut by the section.
   *
   * @param above name of the medium or thick layer above
   * @param below name of the medium or thick layer below
   * @param xUm [p] corners, increasing
   * @param zUm [p] corners
   */
  record Outline(String above, String below, Samples xUm, Samples zUm) {}

  /**
   * A straight piece of a ray, projected onto the section.
   *
   * @param ray number of the ray that entered, in [0, rayCount)
   * @param startX start, µm
   * @param startZ start, µm
   * @param endX end, µm
   * @param endZ end, µm
   * @param startShare share of the ray's light at the start, in [0, 1]
   * @param endShare share of the ray's light at the end, in [0, 1]
   */
  record Path(
      int ray,
      double startX,
      double startZ,
      double endX,
      double endZ,
      double startShare,
      double endShare) {}
}
