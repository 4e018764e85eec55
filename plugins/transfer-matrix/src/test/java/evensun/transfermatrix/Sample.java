package evensun.transfermatrix;

import evensun.spi.Design;
import evensun.spi.Evaluator;
import evensun.spi.Incidence;
import evensun.spi.Layer;
import evensun.spi.OpticalSolver;
import evensun.spi.Polarisation;
import evensun.spi.Problem;
import evensun.spi.Response;
import evensun.spi.Samples;
import evensun.spi.Services;
import evensun.spi.Side;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.SplittableRandom;

/**
 * A stack under test: every medium is a material of its own, material j for medium j, where medium
 * 0 is in front and medium L + 1 behind. Indices are the same at all wavelengths unless set.
 */
final class Sample {

  static final Services NONE =
      new Services() {
        @Override
        public Optional<OpticalSolver> solver(String id) {
          return Optional.empty();
        }

        @Override
        public boolean cancelled() {
          return false;
        }
      };

  final Problem problem;
  final Design design;

  private Sample(Problem problem) {
    this.problem = problem;
    design = Design.of(problem);
  }

  /** Coherent layers of thickness zero, all of index 1. */
  static Sample of(int layers, double... wavelengthNm) {
    return of(new boolean[layers], wavelengthNm);
  }

  static Sample of(boolean[] incoherent, double... wavelengthNm) {
    List<Layer> plain = new ArrayList<>();
    for (int l = 0; l < incoherent.length; l++) {
      plain.add(Layer.plain("layer-" + (l + 1), !incoherent[l]));
    }
    double[] ones = new double[wavelengthNm.length];
    Arrays.fill(ones, 1);
    Sample sample =
        new Sample(
            new Problem(
                Samples.of(wavelengthNm),
                Samples.of(ones),
                plain,
                0,
                incoherent.length + 1,
                incoherent.length + 2,
                0,
                List.of(Incidence.normal()),
                1,
                0.01,
                Map.of()));
    for (int l = 0; l < incoherent.length; l++) {
      sample.design.material[l] = l + 1;
    }
    for (int m = 0; m < incoherent.length + 2; m++) {
      sample.medium(m, 1, 0);
    }
    return sample;
  }

  /** Sets the index of medium m at all wavelengths. */
  Sample medium(int m, double n, double k) {
    Arrays.fill(design.n[m], n);
    Arrays.fill(design.k[m], k);
    design.revision[m] = Design.nextRevision();
    return this;
  }

  /** Sets layer l, counted from 0. */
  Sample layer(int l, double n, double k, double thicknessNm) {
    design.thicknessNm[l] = thicknessNm;
    return medium(l + 1, n, k);
  }

  int layers() {
    return problem.layerCount();
  }

  int wavelengths() {
    return problem.wavelengthCount();
  }

  static Incidence at(double angleDeg, Polarisation polarisation) {
    return new Incidence(angleDeg, polarisation, Side.FRONT);
  }

  /** All spectra for one incidence with the named kernel. */
  Response solve(String kernel, Incidence incidence) {
    try (Evaluator evaluator = evaluator(kernel, incidence)) {
      Response response = Response.spectra(1, layers(), wavelengths());
      evaluator.evaluate(design, response);
      return response;
    }
  }

  Evaluator evaluator(String kernel, Incidence... incidences) {
    return new TransferMatrixSolver()
        .prepare(
            problem.withIncidences(List.of(incidences)).withOptions(Map.of("kernel", kernel)),
            design,
            NONE)
        .newEvaluator();
  }

  /** What is missing from R + T + ΣA = 1 at wavelength w. */
  static double gap(Response response, int w) {
    double total = response.reflectance[0][w] + response.transmittance[0][w];
    for (double[] row : response.absorptance) {
      total += row[w];
    }
    return 1 - total;
  }

  /** Layers from a wide choice: glasses, oxides, absorbers, metals, 1 to 400 nm thick. */
  static Sample random(SplittableRandom random, int layers, double... wavelengthNm) {
    Sample sample = of(layers, wavelengthNm);
    sample.medium(0, 1 + 0.6 * random.nextDouble(), 0);
    for (int l = 0; l < layers; l++) {
      sample.layer(l, 1, 0, 1 + 400 * random.nextDouble());
      sample.randomMedium(random, l + 1);
    }
    sample.randomMedium(random, layers + 1);
    return sample;
  }

  void randomMedium(SplittableRandom random, int m) {
    double kind = random.nextDouble();
    if (kind < 0.4) {
      medium(m, 1.3 + 2.5 * random.nextDouble(), 0);
    } else if (kind < 0.85) {
      medium(m, 1.3 + 3 * random.nextDouble(), Math.pow(10, -4 + 4 * random.nextDouble()));
    } else {
      medium(m, 0.05 + random.nextDouble(), 1 + 5 * random.nextDouble());
    }
  }
}
