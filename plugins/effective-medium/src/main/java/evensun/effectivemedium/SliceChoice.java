package evensun.effectivemedium;

import evensun.spi.Design;
import evensun.spi.OpticalSolver;
import evensun.spi.Response;
import evensun.spi.Services;

/**
 * How many slices a graded layer needs: doubled until R, T and every absorptance of the stack as
 * drawn change by less than the tolerance, both at the drawn thickness of the graded layers and at
 * twice that, so that a search has room.
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
      if (change(start, count) <= tolerance && change(thick, count) <= tolerance) {
        return 2 * count;
      }
      count *= 2;
    }
    return MOST;
  }

  /**
   * Largest change of R, T and any absorptance from so many slices to twice as many.
   *
   * @param design a design
   * @param count number of slices
   */
  double change(Design design, int count) {
    Response coarse = spectra(design, count);
    Response fine = spectra(design, 2 * count);
    double change = difference(coarse.reflectance, fine.reflectance);
    change = Math.max(change, difference(coarse.transmittance, fine.transmittance));
    return Math.max(change, difference(coarse.absorptance, fine.absorptance));
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
