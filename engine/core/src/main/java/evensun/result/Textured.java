package evensun.result;

import java.util.List;
import org.jspecify.annotations.Nullable;

/**
 * What shaping or scattering at boundaries does: the same stack with every boundary flat, and a few
 * rays.
 *
 * @param flat the design with flat boundaries and films of the same thickness
 * @param flatSolvers solvers that evaluated it, first of the chain first
 * @param section a vertical section with rays; null where the solver draws none
 */
public record Textured(Outcome flat, List<String> flatSolvers, @Nullable Section section) {

  public Textured {
    flatSolvers = List.copyOf(flatSolvers);
  }

  /**
   * A vertical section through the stack. Lengths in µm; x along the section, z downwards from the
   * mean plane of the first boundary.
   *
   * @param wavelengthNm wavelength of the rays in nm
   * @param outlines boundaries of thick media, in the order light meets them
   * @param paths straight pieces of rays, in the order of travel
   */
  public record Section(double wavelengthNm, List<Outline> outlines, List<RayPath> paths) {

    public Section {
      outlines = List.copyOf(outlines);
      paths = List.copyOf(paths);
    }
  }

  /**
   * A boundary cut by the section.
   *
   * @param above medium above
   * @param below medium below
   * @param xUm corners, increasing
   * @param zUm corners
   */
  public record Outline(String above, String below, List<Double> xUm, List<Double> zUm) {}

  /**
   * A straight piece of a ray.
   *
   * @param ray number of the ray that entered
   * @param startXUm start
   * @param startZUm start
   * @param endXUm end
   * @param endZUm end
   * @param startShare share of the ray's light at the start
   * @param endShare share of the ray's light at the end
   */
  public record RayPath(
      int ray,
      double startXUm,
      double startZUm,
      double endXUm,
      double endZUm,
      double startShare,
      double endShare) {}
}
