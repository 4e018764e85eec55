package evensun.verify;

import evensun.spi.Design;
import evensun.spi.Evaluator;
import evensun.spi.Feature;
import evensun.spi.IdealFace;
import evensun.spi.Incidence;
import evensun.spi.Layer;
import evensun.spi.OpticalSolver;
import evensun.spi.Parameter;
import evensun.spi.PreparedSolver;
import evensun.spi.Problem;
import evensun.spi.Response;
import evensun.spi.Samples;
import evensun.spi.Services;
import evensun.spi.Side;
import evensun.spi.Texture;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/** Asks a solver of rays about one thick slab in air, on an exit medium of its own material. */
final class RayProbe {

  /** Angle of {111} facets to a {100} surface. */
  static final double FACET_DEG = Math.toDegrees(Math.atan(Math.sqrt(2)));

  private final OpticalSolver rays;
  private final Services services;

  RayProbe(OpticalSolver rays, Services services) {
    this.rays = rays;
    this.services = services;
  }

  /**
   * Current that a slab between ideal faces absorbs.
   *
   * @param nm wavelengths in nm
   * @param bins photon current of each in mA cm⁻²
   * @param n index of the slab
   * @param k extinction coefficient of the slab
   * @param widthUm thickness in µm
   * @return mA cm⁻²
   */
  double idealCurrent(double[] nm, double[] bins, double[] n, double[] k, double widthUm) {
    List<Feature> ideal = List.of(new IdealFace(Side.FRONT), new IdealFace(Side.REAR));
    Map<String, String> few = Map.of("rays", "16");
    double[] absorptance = answer(nm, bins, n, k, widthUm, ideal, few).absorptance[0];
    double sum = 0;
    for (int w = 0; w < bins.length; w++) {
      sum += bins[w] * absorptance[w];
    }
    return sum;
  }

  /** Reflectance of regular pyramids of a material that lets no light come back, at 600 nm. */
  double pyramids(double n, double k) {
    Texture pyramids =
        new Texture(
            Texture.Shape.PYRAMID,
            Texture.Direction.UP,
            Texture.Arrangement.GRID,
            Parameter.fixed(FACET_DEG),
            5,
            Optional.empty(),
            Side.FRONT);
    double[] one = {1};
    return answer(
            new double[] {600},
            one,
            new double[] {n},
            new double[] {k},
            1e4,
            List.of(pyramids),
            Map.of("rays", "8192"))
        .reflectance[0][0];
  }

  private Response answer(
      double[] nm,
      double[] bins,
      double[] n,
      double[] k,
      double widthUm,
      List<Feature> features,
      Map<String, String> options) {
    Problem problem =
        new Problem(
            Samples.of(nm),
            Samples.of(bins),
            List.of(new Layer("slab", false, features)),
            0,
            1,
            2,
            0,
            List.of(Incidence.normal()),
            1,
            0.01,
            options);
    Design design = Design.of(problem);
    java.util.Arrays.fill(design.n[0], 1);
    System.arraycopy(n, 0, design.n[1], 0, n.length);
    System.arraycopy(k, 0, design.k[1], 0, k.length);
    design.revision[0] = Design.nextRevision();
    design.revision[1] = Design.nextRevision();
    design.material[0] = 1;
    design.thicknessNm[0] = 1000 * widthUm;
    try (PreparedSolver prepared = rays.prepare(problem, design, services);
        Evaluator evaluator = prepared.newEvaluator()) {
      Response response = Response.spectra(1, prepared.channels().size(), nm.length);
      evaluator.evaluate(design, response);
      return response;
    }
  }
}
