package evensun.raytrace;

import evensun.spi.Design;
import evensun.spi.Problem;
import evensun.spi.Services;

/**
 * How many rays are traced.
 *
 * @param perReplicate rays of each replicate and wavelength
 */
record RayCount(int perReplicate) {

  private static final int PILOT = 16;
  private static final int MOST = 1024;

  /**
   * As many as set; else as many as the wanted error takes, judged on the stack as drawn: the error
   * falls at least as the square root of their number.
   */
  static RayCount choose(Problem problem, Design start, Options options, Services services) {
    if (options.rays().isPresent()) {
      return new RayCount(options.rays().getAsInt() / Options.REPLICATES);
    }
    int rays = PILOT;
    double error = error(problem, start, services, rays);
    double lacking = error / problem.wantedErrorMaPerCm2();
    while (rays < MOST && rays < PILOT * lacking * lacking) {
      rays *= 2;
    }
    return new RayCount(rays);
  }

  private static double error(Problem problem, Design start, Services services, int rays) {
    try (RayEvaluator pilot = new RayEvaluator(problem, services, new Traces(problem, rays))) {
      return Current.largestError(problem, pilot.estimate(start, 0));
    }
  }
}
