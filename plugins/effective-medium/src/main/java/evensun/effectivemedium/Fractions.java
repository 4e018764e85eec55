package evensun.effectivemedium;

import evensun.spi.Design;
import evensun.spi.EvaluationFailed;
import evensun.spi.Mixture;
import evensun.spi.Parameter;
import java.util.List;

/**
 * The volume fractions of a mixture in a design: moved ones as they are, fixed ones share the rest.
 */
final class Fractions {

  /** How far moved fractions may exceed one by rounding. */
  private static final double ROUNDING = 1e-12;

  private Fractions() {}

  /**
   * Fills the fractions.
   *
   * @param mixture the mixture
   * @param layer its layer, for the message
   * @param design the candidate
   * @param into [c] out: fractions of sum 1
   * @throws EvaluationFailed where the moved fractions leave [0, 1] or exceed 1 together
   */
  static void fill(Mixture mixture, String layer, Design design, double[] into) {
    List<Mixture.Component> components = mixture.components();
    double moved = 0;
    double fixed = 0;
    for (int c = 0; c < into.length; c++) {
      Parameter fraction = components.get(c).fraction();
      into[c] = fraction.in(design);
      if (!(into[c] >= 0 && into[c] <= 1)) {
        throw new EvaluationFailed(
            "layer \"%s\": the fraction of %s must be in [0, 1] but was %s"
                .formatted(layer, components.get(c).name(), into[c]));
      }
      moved += fraction.knob().isPresent() ? into[c] : 0;
      fixed += fraction.knob().isPresent() ? 0 : into[c];
    }
    if (moved > 1 + ROUNDING) {
      throw new EvaluationFailed(
          "layer \"%s\": the fractions that vary must not exceed 1 together but sum to %s"
              .formatted(layer, moved));
    }
    double scale = Math.max(0, 1 - moved) / fixed;
    for (int c = 0; c < into.length; c++) {
      into[c] *= components.get(c).fraction().knob().isPresent() ? 1 : scale;
    }
  }
}
