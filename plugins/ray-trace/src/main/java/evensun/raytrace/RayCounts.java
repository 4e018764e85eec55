package evensun.raytrace;

import evensun.raytrace.kernel.LightTree;
import evensun.raytrace.trace.Beam;
import evensun.spi.Design;
import evensun.spi.EvaluationFailed;
import evensun.spi.Problem;
import evensun.spi.Services;
import java.util.Arrays;
import java.util.List;

/** How many rays are traced at each wavelength. */
final class RayCounts {

  private static final int PILOT = 16;
  private static final int LEAST = 8;
  private static final int MOST = 1024;

  /** Bands of the spectrum, as rays of neighbouring wavelengths make up for each other. */
  private static final int BANDS = 20;

  private RayCounts() {}

  /**
   * As many as set; else as many as the wanted error takes, judged on the stack as drawn.
   *
   * <p>A sum over wavelengths is cheapest for its error where their rays go as the root of the
   * variance over the cost of a ray (Neyman's allocation). Light that is trapped for long costs the
   * most and counts little.
   *
   * @return [w] rays of each replicate
   * @throws EvaluationFailed where the stack as drawn cannot be traced
   */
  static int[] choose(Problem problem, Design start, Options options, Services services) {
    int[] rays = new int[problem.wavelengthCount()];
    if (options.rays().isPresent()) {
      Arrays.fill(rays, options.rays().getAsInt() / Options.REPLICATES);
      return rays;
    }
    Arrays.fill(rays, PILOT);
    try (RayEvaluator pilot = new RayEvaluator(problem, services, new Traces(problem, rays))) {
      double[] variance = variance(problem, pilot.estimate(start, 0));
      Beam beam = Beam.of(problem.incidences().get(0));
      List<LightTree> trees = pilot.ready(start, beam).traced().forest().trees();
      return allocate(variance, trees, problem.wantedErrorMaPerCm2());
    }
  }

  /**
   * [w] of all that is transmitted or absorbed, of the pilot rays, in (mA cm⁻²)²: that of a band,
   * shared among its wavelengths.
   */
  private static double[] variance(Problem problem, Estimate estimate) {
    double[] variance = new double[problem.wavelengthCount()];
    int width = (variance.length + BANDS - 1) / BANDS;
    for (int from = 0; from < variance.length; from += width) {
      int to = Math.min(variance.length, from + width);
      double sum = 0;
      for (int row = LitDevice.TRANSMITTED; row < estimate.mean.length; row++) {
        double error = Current.of(problem, estimate, row, from, to).error();
        sum += error * error;
      }
      Arrays.fill(variance, from, to, sum / (to - from));
    }
    return variance;
  }

  private static int[] allocate(double[] variance, List<LightTree> trees, double wantedError) {
    double[] share = new double[variance.length];
    double sum = 0; // of variance over rays, with the shares as numbers of rays
    for (int w = 0; w < share.length; w++) {
      share[w] = Math.sqrt(variance[w] / Math.max(1, trees.get(w).count));
      sum += share[w] > 0 ? PILOT * variance[w] / share[w] : 0;
    }
    double scale = sum / (wantedError * wantedError);
    int[] rays = new int[share.length];
    Arrays.setAll(rays, w -> (int) Math.min(MOST, Math.max(LEAST, Math.ceil(scale * share[w]))));
    return rays;
  }
}
