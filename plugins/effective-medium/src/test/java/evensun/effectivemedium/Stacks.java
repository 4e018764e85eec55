package evensun.effectivemedium;

import evensun.spi.Design;
import evensun.spi.Feature;
import evensun.spi.Incidence;
import evensun.spi.Knob;
import evensun.spi.Layer;
import evensun.spi.Mixture;
import evensun.spi.OpticalSolver;
import evensun.spi.Parameter;
import evensun.spi.Polarisation;
import evensun.spi.PreparedSolver;
import evensun.spi.Problem;
import evensun.spi.Response;
import evensun.spi.Samples;
import evensun.spi.Services;
import evensun.spi.Side;
import evensun.transfermatrix.TransferMatrixSolver;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/** Builds stacks for tests: dispersion-free materials, layers with features, a solver below. */
final class Stacks {

  final List<double[]> materials = new ArrayList<>();
  final List<Layer> layers = new ArrayList<>();
  final List<double[]> sizes = new ArrayList<>();
  final List<Double> knobs = new ArrayList<>();
  double[] wavelengthNm = {400, 500, 600, 700, 800, 900};
  Incidence incidence = Incidence.normal();
  Map<String, String> options = Map.of();
  int exit;

  /** A stack in air (material 0) on an exit medium (material 1). */
  static Stacks on(double exitN, double exitK) {
    Stacks stacks = new Stacks();
    stacks.material(1, 0);
    stacks.exit = stacks.material(exitN, exitK);
    return stacks;
  }

  Stacks at(double... wavelengths) {
    wavelengthNm = wavelengths;
    return this;
  }

  Stacks oblique(double angleDeg, Polarisation polarisation) {
    incidence = new Incidence(angleDeg, polarisation, Side.FRONT);
    return this;
  }

  int material(double n, double k) {
    materials.add(new double[] {n, k});
    return materials.size() - 1;
  }

  Stacks layer(String name, double n, double k, double thicknessNm, Feature... features) {
    return layer(name, true, n, k, thicknessNm, features);
  }

  Stacks layer(
      String name, boolean coherent, double n, double k, double thicknessNm, Feature... features) {
    int material = material(n, k);
    layers.add(new Layer(name, coherent, List.of(features)));
    sizes.add(new double[] {material, thicknessNm});
    return this;
  }

  /** A knob with a value as drawn. */
  Parameter knob(double drawn) {
    knobs.add(drawn);
    return Parameter.moved(drawn, new Knob(knobs.size() - 1, "fraction", "", 0, 1));
  }

  /** A mixture of the material of a layer to come with air. */
  static Mixture porous(int solid, double porosity) {
    return Mixture.bruggeman(
        List.of(
            Mixture.Component.fixed("solid", solid, 1 - porosity),
            Mixture.Component.fixed("pores", 0, porosity)));
  }

  Problem problem() {
    double[] light = new double[wavelengthNm.length];
    Arrays.fill(light, 1);
    return new Problem(
        Samples.of(wavelengthNm),
        Samples.of(light),
        layers,
        0,
        exit,
        materials.size(),
        knobs.size(),
        List.of(incidence),
        1,
        0.01,
        options);
  }

  Design design() {
    Design design = Design.of(problem());
    for (int m = 0; m < materials.size(); m++) {
      Arrays.fill(design.n[m], materials.get(m)[0]);
      Arrays.fill(design.k[m], materials.get(m)[1]);
      design.revision[m] = Design.nextRevision();
    }
    for (int l = 0; l < sizes.size(); l++) {
      design.material[l] = (int) sizes.get(l)[0];
      design.thicknessNm[l] = sizes.get(l)[1];
    }
    for (int i = 0; i < knobs.size(); i++) {
      design.knob[i] = knobs.get(i);
    }
    return design;
  }

  PreparedSolver prepare() {
    return new EffectiveMediumSolver().prepare(problem(), design(), services());
  }

  Response spectra() {
    return spectra(prepare(), design());
  }

  Response spectra(PreparedSolver prepared, Design design) {
    Response response = Response.spectra(1, prepared.channels().size(), wavelengthNm.length);
    prepared.newEvaluator().evaluate(design, response);
    return response;
  }

  /** Services that know transfer-matrix and some others. */
  static Services services(OpticalSolver... others) {
    return new Services() {
      @Override
      public Optional<OpticalSolver> solver(String id) {
        List<OpticalSolver> known = new ArrayList<>(List.of(others));
        known.add(new TransferMatrixSolver());
        known.add(new EffectiveMediumSolver());
        return known.stream().filter(solver -> solver.id().equals(id)).findFirst();
      }

      @Override
      public boolean cancelled() {
        return false;
      }
    };
  }
}
