package evensun.raytrace.trace;

import evensun.raytrace.kernel.LightTree;
import java.util.List;
import java.util.stream.IntStream;

/**
 * What rays of one beam do in a device, wavelength by wavelength, and where their meetings look up
 * coatings; immutable.
 *
 * @param trees by wavelength
 * @param angles where coatings are tabulated
 * @param replicates independent estimates
 */
public record Forest(List<LightTree> trees, Angles angles, int replicates) {

  /**
   * Traces a beam; the result depends on the arguments alone.
   *
   * @param faces boundaries, the light from the front meets the first first
   * @param media what lies between and around them
   * @param beam where the light comes from
   * @param replicates independent estimates, at least 2
   * @param rays [w] rays of each
   * @param seed for whatever is drawn
   */
  public static Forest trace(
      List<Face> faces, Media media, Beam beam, int replicates, int[] rays, long seed) {
    int[] first = new int[rays.length + 1];
    for (int w = 0; w < rays.length; w++) {
      first[w + 1] = first[w] + rays[w];
    }
    List<LightTree> trees =
        IntStream.range(0, media.wavelengthUm().length)
            .parallel()
            .mapToObj(
                w ->
                    new Tracer(faces, media.at(w), new Draws(seed), replicates)
                        .trace(beam, replicates, rays[w], first[w]))
            .toList();
    return new Forest(trees, Angles.of(faces, media, beam, trees), replicates);
  }

  /** All meetings of all wavelengths. */
  public long meetings() {
    return trees.stream().mapToLong(tree -> tree.count).sum();
  }

  /** All rays of all wavelengths. */
  public long rays() {
    return replicates * trees.stream().mapToLong(tree -> tree.rays).sum();
  }
}
