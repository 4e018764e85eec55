package evensun.raytrace;

import evensun.spi.Design;
import evensun.spi.Feature;
import evensun.spi.Layer;
import evensun.spi.Problem;
import evensun.spi.Roughness;
import evensun.spi.UnsupportedProblem;

/** Rough faces that rays can follow. */
final class Roughnesses {

  /**
   * Least correlation length, in wavelengths in the layer: the geometric mean of a tenth, below
   * which a rough face is a mixed layer, and one, above which it scatters (common practice).
   */
  private static final double LEAST_WAVELENGTHS = Math.sqrt(0.1);

  private Roughnesses() {}

  /**
   * Refuses faces too fine to scatter.
   *
   * @throws UnsupportedProblem naming the layer, both lengths and the remedy
   */
  static void requireCoarse(Problem problem, Design start) {
    for (int l = 0; l < problem.layerCount(); l++) {
      for (Feature feature : problem.layers().get(l).features()) {
        if (feature instanceof Roughness rough) {
          requireCoarse(problem, start, l, rough);
        }
      }
    }
  }

  private static void requireCoarse(Problem problem, Design start, int l, Roughness rough) {
    Layer layer = problem.layers().get(l);
    int middle = problem.wavelengthCount() / 2;
    double nm = problem.wavelengthNm().at(middle);
    double ratio = rough.correlationLengthNm() * start.n[start.material[l]][middle] / nm;
    if (ratio < LEAST_WAVELENGTHS) {
      throw new UnsupportedProblem(
          Words.of(
              "layer \"%s\": roughness with a correlation length of %s nm is too fine for rays, which need %s wavelengths in the layer or more; leave solver out, or name effective-medium with the option next: ray-trace",
              layer.name(), rough.correlationLengthNm(), LEAST_WAVELENGTHS));
    }
  }
}
