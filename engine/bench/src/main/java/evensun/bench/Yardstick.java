package evensun.bench;

import evensun.spi.Design;
import evensun.spi.Evaluator;
import evensun.spi.Gradient;
import evensun.spi.Incidence;
import evensun.spi.Layer;
import evensun.spi.Polarisation;
import evensun.spi.Problem;
import evensun.spi.Response;
import evensun.spi.Samples;
import evensun.spi.Side;
import evensun.transfermatrix.TransferMatrixSolver;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Map;

/**
 * The yardstick: a stack of dispersive, partly absorbing layers between air and an absorber, all
 * spectra and two weighted sums wanted, every thickness changed from one evaluation to the next.
 */
final class Yardstick {

  private static final int DESIGNS = 64;

  final int layers;
  final int wavelengths;
  private final Design[] designs = new Design[DESIGNS];
  private final Response response;
  private final Evaluator evaluator;
  private final Gradient gradient;
  private final double[] slopes;
  private int next;

  /**
   * A yardstick.
   *
   * @param incoherent index of the one incoherent layer, or -1
   * @param angleDeg angle of unpolarised light
   */
  Yardstick(int layers, int wavelengths, int incoherent, double angleDeg) {
    this.layers = layers;
    this.wavelengths = wavelengths;
    Problem problem = problem(incoherent, angleDeg);
    designs[0] = drawn(problem, incoherent);
    for (int i = 1; i < DESIGNS; i++) {
      designs[i] = varied(problem, designs[0], i);
    }
    response = Response.spectra(1, layers, wavelengths);
    response.weight = new double[2 * layers][];
    response.weight[layers / 2] = ramp(wavelengths, 0.2, 0.4);
    response.weight[layers + layers * 3 / 4] = ramp(wavelengths, 0.4, 0.2);
    response.sum = new double[2];
    evaluator =
        new TransferMatrixSolver().prepare(problem, designs[0], new NoServices()).newEvaluator();
    gradient = evaluator.ability(Gradient.class).orElseThrow();
    slopes = new double[2 * layers];
  }

  private Problem problem(int incoherent, double angleDeg) {
    List<Layer> plain = new ArrayList<>();
    for (int l = 0; l < layers; l++) {
      plain.add(Layer.plain("layer-" + l, l != incoherent));
    }
    return new Problem(
        Samples.of(ramp(wavelengths, 300, 1200)),
        Samples.of(ramp(wavelengths, 0.2, 0.3)),
        plain,
        0,
        layers + 1,
        layers + 2,
        0,
        List.of(new Incidence(angleDeg, Polarisation.UNPOLARISED, Side.FRONT)),
        1,
        0.01,
        Map.of());
  }

  private static double[] ramp(int count, double from, double to) {
    double[] row = new double[count];
    for (int i = 0; i < count; i++) {
      row[i] = from + (to - from) * i / Math.max(1, count - 1);
    }
    return row;
  }

  /** Invented media: normal dispersion, every third one absorbing at short wavelengths. */
  private Design drawn(Problem problem, int incoherent) {
    Design design = Design.of(problem);
    for (int m = 0; m < layers + 2; m++) {
      double n = m == 0 ? 1 : 1.4 + 2.2 * ((m * 7) % 10) / 10.0;
      double k = m % 3 == 2 || m == layers + 1 ? 0.4 : 0;
      for (int w = 0; w < wavelengths; w++) {
        double x = problem.wavelengthNm().at(w) / 300;
        design.n[m][w] = m == 0 ? 1 : n + 0.2 / (x * x);
        design.k[m][w] = k * Math.exp(1 - x);
      }
      design.revision[m] = Design.nextRevision();
    }
    for (int l = 0; l < layers; l++) {
      design.material[l] = l + 1;
      design.thicknessNm[l] = l == incoherent ? 1e5 : 20 + 37 * (l % 6);
    }
    return design;
  }

  private Design varied(Problem problem, Design drawn, int i) {
    Design design = Design.of(problem);
    design.copyFrom(drawn);
    for (int l = 0; l < layers; l++) {
      design.thicknessNm[l] *= 1 + 1e-3 * ((7 * i + 3 * l) % DESIGNS);
    }
    return design;
  }

  private Design design() {
    next = (next + 1) % DESIGNS;
    return designs[next];
  }

  double[] evaluate() {
    evaluator.evaluate(design(), response);
    return response.sum;
  }

  double[] differentiate() {
    gradient.evaluate(design(), response, slopes);
    return slopes;
  }

  /** Wants the two sums alone from now on, as a search does. */
  Yardstick sumsOnly() {
    response.reflectance = null;
    response.transmittance = null;
    response.absorptance = null;
    return this;
  }

  /** One material gets another gap with every design. */
  double[] evaluateNewMaterial() {
    Design design = design();
    int m = layers / 2 + 1;
    Arrays.fill(design.n[m], 0, wavelengths / 8, 2 + 0.001 * next);
    design.revision[m] = Design.nextRevision();
    evaluator.evaluate(design, response);
    return response.sum;
  }
}
