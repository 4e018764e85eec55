package evensun.raytrace;

import evensun.spi.Design;
import evensun.spi.Problem;

/** Finds the thick layer that light is trapped in. */
final class Absorber {

  private Absorber() {}

  /**
   * The thick layer that takes most of the light on a single way through; the exit medium where no
   * layer is thick.
   */
  static int first(Problem problem, Device device, Design design) {
    int best = device.mediaCount() - 1;
    double most = 0;
    for (int m = 1; m < device.mediaCount() - 1; m++) {
      double taken = 0;
      for (int w = 0; w < problem.wavelengthCount(); w++) {
        taken += -Math.expm1(-depth(problem, device, design, m, w));
      }
      if (taken > most) {
        most = taken;
        best = m;
      }
    }
    return best;
  }

  /** Optical depth of one way through a medium along the normal. */
  static double depth(Problem problem, Device device, Design design, int medium, int w) {
    double k = design.k[device.material(design, medium)][w];
    double nm = 1000 * device.thicknessUm(design, medium);
    return 4 * Math.PI * k * nm / problem.wavelengthNm().at(w);
  }
}
