package evensun.verify;

import evensun.spi.Design;
import evensun.spi.Evaluator;
import evensun.spi.Incidence;
import evensun.spi.Layer;
import evensun.spi.OpticalSolver;
import evensun.spi.Polarisation;
import evensun.spi.PreparedSolver;
import evensun.spi.Problem;
import evensun.spi.Response;
import evensun.spi.Samples;
import evensun.spi.Services;
import evensun.spi.Side;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;

/** Asks a solver for the reflectance of simple stacks in air at 600 nm. */
final class ThinFilmProbe {

  private static final double WAVELENGTH_NM = 600;

  private final OpticalSolver solver;
  private final Services services;

  ThinFilmProbe(OpticalSolver solver, Services services) {
    this.solver = solver;
    this.services = services;
  }

  double bare(double substrate) {
    return reflectance(new double[0], new double[0], substrate, Incidence.normal());
  }

  double oblique(double substrate, double angleDeg, Polarisation polarisation) {
    Incidence incidence = new Incidence(angleDeg, polarisation, Side.FRONT);
    return reflectance(new double[0], new double[0], substrate, incidence);
  }

  double coated(double film, double thicknessNm, double substrate) {
    return reflectance(
        new double[] {film}, new double[] {thicknessNm}, substrate, Incidence.normal());
  }

  /** Pairs of quarter waves, the higher index towards the light. */
  double mirror(double high, double low, int pairs, double substrate) {
    double[] index = new double[2 * pairs];
    double[] thicknessNm = new double[2 * pairs];
    for (int i = 0; i < index.length; i++) {
      index[i] = i % 2 == 0 ? high : low;
      thicknessNm[i] = WAVELENGTH_NM / (4 * index[i]);
    }
    return reflectance(index, thicknessNm, substrate, Incidence.normal());
  }

  private double reflectance(
      double[] index, double[] thicknessNm, double substrate, Incidence incidence) {
    List<Layer> layers = new ArrayList<>();
    for (int l = 0; l < index.length; l++) {
      layers.add(Layer.plain("film" + l, true));
    }
    int materials = index.length + 2;
    Problem problem =
        new Problem(
            Samples.of(WAVELENGTH_NM),
            Samples.of(1),
            layers,
            0,
            materials - 1,
            materials,
            0,
            List.of(incidence),
            1,
            0.01,
            Map.of());
    Design design = Design.of(problem);
    for (int m = 0; m < materials; m++) {
      design.n[m][0] = m == 0 ? 1 : m == materials - 1 ? substrate : index[m - 1];
      design.revision[m] = Design.nextRevision();
    }
    for (int l = 0; l < index.length; l++) {
      design.material[l] = l + 1;
      design.thicknessNm[l] = thicknessNm[l];
    }
    try (PreparedSolver prepared = solver.prepare(problem, design, services);
        Evaluator evaluator = prepared.newEvaluator()) {
      Response response = Response.spectra(1, prepared.channels().size(), 1);
      evaluator.evaluate(design, response);
      return response.reflectance[0][0];
    }
  }
}
