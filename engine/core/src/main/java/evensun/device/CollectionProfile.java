package evensun.device;

import evensun.result.DepthLayer;
import evensun.scenario.DiodeSpec.CollectingFace;
import java.util.List;

/**
 * Collected part of the generation in an absorber, for carriers that diffuse to one face and are
 * reflected by the other.
 *
 * <p>The probability at the distance x from the collecting face of an absorber of thickness d is
 * cosh((d − x)/L)/cosh(d/L): the solution of the diffusion equation with a perfect sink at one face
 * and no recombination at the other (common practice; by reciprocity of charge collection, C.
 * Donolato, Appl. Phys. Lett. 46, 270 (1985)).
 */
final class CollectionProfile {

  private CollectionProfile() {}

  /**
   * Collected part of the generation.
   *
   * @param layers the absorber's layers in the order the light meets them; they touch
   * @param lengthNm diffusion length in nm, greater than 0
   * @param face collecting face
   * @return in [0, 1]; 1 where nothing is generated
   */
  static double fraction(List<DepthLayer> layers, double lengthNm, CollectingFace face) {
    double thicknessNm = 0;
    for (DepthLayer layer : layers) {
      thicknessNm += thicknessNm(layer);
    }
    double generated = 0;
    double collected = 0;
    double above = 0;
    for (DepthLayer layer : layers) {
      for (int z = 1; z < layer.depthNm().size(); z++) {
        double from = layer.depthNm().get(z - 1);
        double to = layer.depthNm().get(z);
        double first = layer.generationPerCm3S().get(z - 1);
        double last = layer.generationPerCm3S().get(z);
        generated += 0.5 * (first + last) * (to - from);
        collected +=
            0.5
                * (first * probability(above + from, thicknessNm, lengthNm, face)
                    + last * probability(above + to, thicknessNm, lengthNm, face))
                * (to - from);
      }
      above += thicknessNm(layer);
    }
    return generated > 0 ? collected / generated : 1;
  }

  private static double thicknessNm(DepthLayer layer) {
    return layer.depthNm().isEmpty() ? 0 : layer.depthNm().get(layer.depthNm().size() - 1);
  }

  /** cosh(a)/cosh(b) with a ≤ b, written so that it cannot overflow. */
  static double probability(
      double depthNm, double thicknessNm, double lengthNm, CollectingFace face) {
    double reach = face == CollectingFace.FRONT ? thicknessNm - depthNm : depthNm;
    double a = reach / lengthNm;
    double b = thicknessNm / lengthNm;
    return Math.exp(a - b) * (1 + Math.exp(-2 * a)) / (1 + Math.exp(-2 * b));
  }
}
