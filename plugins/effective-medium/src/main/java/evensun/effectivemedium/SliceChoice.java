package evensun.effectivemedium;

import evensun.spi.Design;
import evensun.spi.OpticalSolver;
import evensun.spi.Response;
import evensun.spi.Services;

/**
 * How many slices a graded layer needs: so many that finer ones change R, T and every absorptance
 * by less than the tolerance, in the stack as drawn and with the graded layers twice as thick, so
 * that a search has room.
 */
final class SliceChoice {

  private static final int FEWEST = 4;

  /** Beyond this number of slices the tolerance is given up, with a finding. */
  static final int MOST = 512;

  /** Thickness of a graded layer that is drawn absent, in nm. */
  private static final double ABSENT_NM = 100;

  private final Planner planner;
  private final Design start;
  private final OpticalSolver solver;
  private final Services services;

  SliceChoice(Planner planner, Design start, OpticalSolver solver, Services services) {
    this.planner = planner;
    this.start = start;
    this.solver = solver;
    this.services = services;
  }

  /** Number of slices; 1 where no layer is graded. */
  int count() {
    if (!planner.hasGrading()) {
      return 1;
    }
    double tolerance = planner.tolerance();
    Design thick = thick();
    int count = FEWEST;
    while (count < MOST && !services.cancelled()) {
      if (remainder(start, count) <= tolerance && remainder(thick, count) <= tolerance) {
        return count;
      }
      // 4, 6, 8, 12, 16, 24, ...
      count = Integer.bitCount(count) == 1 ? count + count / 2 : count / 3 * 4;
    }
    return MOST;
  }

  /**
   * Largest change of R, T and any absorptance that infinitely fine slices would make. Slices
   * converge with the square of their thickness, so all further halvings together change a third of
   * what the first one does.
   *
   * @param design a design
   * @param count number of slices
   */
  double remainder(Design design, int count) {
    Response coarse = spectra(design, count);
    Response fine = spectra(design, 2 * count);
    double change = difference(coarse.reflectance, fine.reflectance);
    change = Math.max(change, difference(coarse.transmittance, fine.transmittance));
    change = Math.max(change, difference(coarse.absorptance, fine.absorptance));
    return change * 4 / 3;
  }

  private Response spectra(Design design, int count) {
    try (Chain chain = Chain.of(planner.plan(count), design, solver, services)) {
      return chain.spectra(design);
    }
  }

  private static double difference(double[][] a, double[][] b) {
    double largest = 0;
    for (int r = 0; r < a.length; r++) {
      for (int w = 0; w < a[r].length; w++) {
        largest = Math.max(largest, Math.abs(a[r][w] - b[r][w]));
      }
    }
    return largest;
  }

  private Design thick() {
    Design thick = Design.of(planner.problem());
    thick.copyFrom(start);
    Plan plan = planner.plan(1);
    for (int l = 0; l < plan.bodies().size(); l++) {
      if (plan.body(l) instanceof Body.Graded) {
        double drawn = start.thicknessNm[l];
        thick.thicknessNm[l] = drawn > 0 ? 2 * drawn : ABSENT_NM;
      }
    }
    return thick;
  }
}
