package evensun.stack;

import evensun.light.WavelengthGrid;
import evensun.scenario.InputException;
import evensun.scenario.LayerSpec;
import evensun.spi.Finding;
import evensun.spi.Severity;
import java.util.Optional;

/** When interference inside a layer is too fine for the grid to show. */
final class CoherenceRule {

  /** Fringes finer than this many grid steps are not resolved. */
  private static final double STEPS_PER_FRINGE = 4;

  /** Fringes whose round trip keeps less than this share of the amplitude do not count. */
  private static final double VISIBLE_AMPLITUDE = 0.05;

  private CoherenceRule() {}

  /**
   * Spacing of the finest visible fringes of a layer, λ²/(2nd), in nm; infinite where it absorbs
   * too much to show any.
   *
   * @param grid the wavelengths
   * @param n [w] refractive index
   * @param k [w] extinction coefficient
   * @param thicknessNm thickness in nm
   */
  static double finestFringeNm(WavelengthGrid grid, double[] n, double[] k, double thicknessNm) {
    double[] wavelengthNm = grid.wavelengthNm();
    double finest = Double.POSITIVE_INFINITY;
    for (int w = 0; w < wavelengthNm.length; w++) {
      double roundTrip = Math.exp(-4 * Math.PI * k[w] * thicknessNm / wavelengthNm[w]);
      if (roundTrip > VISIBLE_AMPLITUDE) {
        finest = Math.min(finest, wavelengthNm[w] * wavelengthNm[w] / (2 * n[w] * thicknessNm));
      }
    }
    return finest;
  }

  /**
   * Checks a coherent layer.
   *
   * @return a finding where the scenario insists on coherence although the grid is too coarse
   * @throws InputException where the scenario does not say and the grid is too coarse
   */
  static Optional<Finding> check(
      LayerSpec layer, WavelengthGrid grid, double[] n, double[] k, double thicknessNm) {
    if (grid.size() == 1 || !layer.coherence().interferes()) {
      return Optional.empty();
    }
    double fringe = finestFringeNm(grid, n, k, thicknessNm);
    boolean written = layer.coherence() == LayerSpec.Coherence.COHERENT;
    if (fringe < STEPS_PER_FRINGE * grid.stepNm() && !written) {
      throw new InputException(
          layer.place(),
          "layer \"%s\": %s nm is too thick to be coherent on a %s nm grid (fringes %.1f nm); write coherence: incoherent"
              .formatted(layer.name(), plain(thicknessNm), plain(grid.stepNm()), fringe));
    }
    return written ? Optional.of(finding(layer, grid, fringe)) : Optional.empty();
  }

  private static Finding finding(LayerSpec layer, WavelengthGrid grid, double fringe) {
    boolean coarse = fringe < STEPS_PER_FRINGE * grid.stepNm();
    return new Finding(
        "coherence-written",
        coarse ? Severity.SERIOUS : Severity.WARNING,
        layer.name(),
        coarse
            ? "the scenario insists that this layer is coherent, but its fringes (%.2f nm) are finer than the grid of %s nm can show; write coherence: incoherent"
                .formatted(fringe, plain(grid.stepNm()))
            : "the scenario says that this layer is coherent; its fringes count fully in the headline");
  }

  private static String plain(double value) {
    return value == Math.rint(value) ? Long.toString((long) value) : Double.toString(value);
  }
}
