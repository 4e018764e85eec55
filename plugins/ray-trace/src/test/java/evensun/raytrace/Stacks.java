package evensun.raytrace;

import evensun.spi.Design;
import evensun.spi.Evaluator;
import evensun.spi.Feature;
import evensun.spi.Incidence;
import evensun.spi.Layer;
import evensun.spi.OpticalSolver;
import evensun.spi.PreparedSolver;
import evensun.spi.Problem;
import evensun.spi.Response;
import evensun.spi.Samples;
import evensun.spi.Services;
import evensun.testkit.Subject;
import evensun.transfermatrix.TransferMatrixSolver;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Map;

/** Stacks for tests, layer by layer. */
final class Stacks {

  /** An index over the spectrum. */
  interface Medium {
    double n(double nm);

    double k(double nm);
  }

  private record Made(
      String name, Medium medium, double nm, boolean coherent, Feature[] features) {}

  private final double[] nm;
  private final List<Made> layers = new ArrayList<>();
  private Medium incident = constant(1, 0);
  private Medium exit = constant(1, 0);
  private List<Incidence> incidences = List.of(Incidence.normal());
  private Map<String, String> options = Map.of();
  private double wantedError = 0.01;
  private long seed = 7;

  private Stacks(double[] nm) {
    this.nm = nm;
  }

  static Stacks at(double... nm) {
    return new Stacks(nm);
  }

  static Stacks grid(double from, double to, double step) {
    int count = (int) Math.round((to - from) / step) + 1;
    double[] nm = new double[count];
    Arrays.setAll(nm, i -> from + i * step);
    return new Stacks(nm);
  }

  static Medium constant(double n, double k) {
    return new Medium() {
      @Override
      public double n(double nm) {
        return n;
      }

      @Override
      public double k(double nm) {
        return k;
      }
    };
  }

  static Medium table(String name) {
    Table table = Table.material(name);
    return new Medium() {
      @Override
      public double n(double nm) {
        return table.at(nm, 1);
      }

      @Override
      public double k(double nm) {
        return table.at(nm, 2);
      }
    };
  }

  static Medium silicon() {
    return table("crystalline-silicon.300-k");
  }

  Stacks from(Medium medium) {
    incident = medium;
    return this;
  }

  Stacks exit(Medium medium) {
    exit = medium;
    return this;
  }

  Stacks film(String name, Medium medium, double thicknessNm, Feature... features) {
    layers.add(new Made(name, medium, thicknessNm, true, features));
    return this;
  }

  Stacks thick(String name, Medium medium, double thicknessUm, Feature... features) {
    layers.add(new Made(name, medium, 1000 * thicknessUm, false, features));
    return this;
  }

  Stacks light(Incidence... others) {
    incidences = List.of(others);
    return this;
  }

  Stacks rays(int rays) {
    options = Map.of("rays", Integer.toString(rays));
    return this;
  }

  Stacks options(Map<String, String> others) {
    options = others;
    return this;
  }

  Stacks error(double maPerCm2) {
    wantedError = maPerCm2;
    return this;
  }

  Stacks seed(long other) {
    seed = other;
    return this;
  }

  Problem problem() {
    double[] light = new double[nm.length];
    Table sun = Table.light();
    for (int w = 0; w < nm.length; w++) {
      double low = w == 0 ? nm[0] : (nm[w - 1] + nm[w]) / 2;
      double high = w == nm.length - 1 ? nm[w] : (nm[w] + nm[w + 1]) / 2;
      light[w] = sun.photonsMaPerCm2(low, high);
    }
    List<Layer> finite = new ArrayList<>();
    for (Made made : layers) {
      finite.add(new Layer(made.name(), made.coherent(), List.of(made.features())));
    }
    return new Problem(
        Samples.of(nm),
        Samples.of(light),
        finite,
        0,
        1,
        layers.size() + 2,
        8,
        incidences,
        seed,
        wantedError,
        options);
  }

  Design design() {
    Design design = Design.of(problem());
    fill(design, 0, incident);
    fill(design, 1, exit);
    for (int l = 0; l < layers.size(); l++) {
      fill(design, l + 2, layers.get(l).medium());
      design.material[l] = l + 2;
      design.thicknessNm[l] = layers.get(l).nm();
    }
    return design;
  }

  private void fill(Design design, int m, Medium medium) {
    for (int w = 0; w < nm.length; w++) {
      design.n[m][w] = medium.n(nm[w]);
      design.k[m][w] = medium.k(nm[w]);
    }
    design.revision[m] = Design.nextRevision();
  }

  static Services services() {
    return Subject.with(new TransferMatrixSolver());
  }

  PreparedSolver prepare(OpticalSolver solver) {
    return solver.prepare(problem(), design(), services());
  }

  /** Everything about one stack, with sums of every layer's current. */
  Response solve() {
    return solve(new RayTraceSolver());
  }

  Response solve(OpticalSolver solver) {
    Problem problem = problem();
    try (PreparedSolver prepared = prepare(solver);
        Evaluator evaluator = prepared.newEvaluator()) {
      Response response = wanted(problem);
      evaluator.evaluate(design(), response);
      return response;
    }
  }

  /** A response that wants every spectrum, and the photocurrent of every layer as a sum. */
  static Response wanted(Problem problem) {
    int channels = problem.layerCount();
    int wavelengths = problem.wavelengthCount();
    int incidences = problem.incidences().size();
    Response response = Response.spectra(incidences, channels, wavelengths);
    response.absorptanceStandardError = new double[incidences * channels][wavelengths];
    response.weight = new double[channels * channels][];
    for (int c = 0; c < channels; c++) {
      response.weight[c * channels + c] = problem.incidentMaPerCm2().toArray();
    }
    response.sum = new double[channels];
    response.sumStandardError = new double[channels];
    return response;
  }
}
