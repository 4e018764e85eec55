package evensun.transfermatrix;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import evensun.spi.Evaluator;
import evensun.spi.Gradient;
import evensun.spi.Incidence;
import evensun.spi.Polarisation;
import evensun.spi.Response;
import evensun.spi.Side;
import java.util.List;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;

class GradientTest {

  private static Sample device(SplittableRandom random, int layers, double thickShare) {
    double[] nm = new double[9];
    for (int w = 0; w < nm.length; w++) {
      nm[w] = 350 + 90 * w;
    }
    boolean[] thick = new boolean[layers];
    for (int l = 0; l < layers; l++) {
      thick[l] = random.nextDouble() < thickShare;
    }
    Sample sample = Sample.of(thick, nm);
    for (int l = 0; l < layers; l++) {
      double d = thick[l] ? 2e3 + 5e4 * random.nextDouble() : 10 + 250 * random.nextDouble();
      double k = random.nextInt(3) == 0 ? 0 : Math.pow(10, -3 + 3 * random.nextDouble());
      sample.layer(l, 1.3 + 2.5 * random.nextDouble(), thick[l] ? k * 1e-2 : k, d);
    }
    sample.randomMedium(random, layers + 1);
    return sample;
  }

  /** Two subcells of one and two layers, the second also the exit medium. */
  private static Response sums(Sample sample, SplittableRandom random) {
    int layers = sample.layers();
    double[] weight = new double[sample.wavelengths()];
    for (int w = 0; w < weight.length; w++) {
      weight[w] = 0.5 + random.nextDouble();
    }
    Response response = Response.sums(3, layers);
    response.weight[random.nextInt(layers)] = weight;
    response.weight[layers + random.nextInt(layers)] = weight;
    response.weight[layers + random.nextInt(layers)] = weight.clone();
    response.transmittanceWeight[1] = weight;
    for (int l = 0; l < layers; l++) {
      response.weight[2 * layers + l] = weight; // all that is not reflected
    }
    response.transmittanceWeight[2] = weight;
    return response;
  }

  // Witness: fourth-order central differences of the sums themselves.
  @Test
  void agreesWithDifferences() {
    SplittableRandom random = new SplittableRandom(8);
    int compared = 0;
    for (int trial = 0; trial < 60; trial++) {
      int layers = 1 + random.nextInt(10);
      Sample sample = device(random, layers, trial % 2 == 0 ? 0 : 0.3);
      Side side = trial % 5 == 4 ? Side.REAR : Side.FRONT;
      if (side == Side.REAR) {
        sample.medium(layers + 1, 1.5, 0);
      }
      Incidence incidence =
          new Incidence(
              trial % 3 == 0 ? 0 : 75 * random.nextDouble(),
              List.of(Polarisation.values()).get(random.nextInt(3)),
              side);
      Response response = sums(sample, random);
      double[] found = new double[3 * layers];
      try (Evaluator evaluator = sample.evaluator("fast", incidence)) {
        gradient(evaluator).evaluate(sample.design, response, found);
        for (int l = 0; l < layers; l++) {
          double[] expected = differences(evaluator, sample, response, l);
          for (int s = 0; s < 3; s++) {
            double slope = found[s * layers + l];
            // 1e-7 relative; sums of order one are rounded to 1e-15 or so, which a step of 0.05 nm
            // turns into 1e-13.
            assertThat(slope).isCloseTo(expected[s], within(1e-7 * Math.abs(slope) + 1e-12));
            compared++;
          }
        }
      }
    }
    assertThat(compared).isGreaterThan(600);
  }

  private static double[] differences(
      Evaluator evaluator, Sample sample, Response response, int l) {
    double[] slope = new double[3];
    double h = 0.05;
    double[] factor = {8, -8, -1, 1};
    double[] offset = {h, -h, 2 * h, -2 * h};
    double drawn = sample.design.thicknessNm[l];
    for (int i = 0; i < 4; i++) {
      sample.design.thicknessNm[l] = drawn + offset[i];
      evaluator.evaluate(sample.design, response);
      for (int s = 0; s < 3; s++) {
        slope[s] += factor[i] * response.sum[s] / (12 * h);
      }
    }
    sample.design.thicknessNm[l] = drawn;
    return slope;
  }

  private static Gradient gradient(Evaluator evaluator) {
    return evaluator.ability(Gradient.class).orElseThrow();
  }

  // Witness: what is absorbed or passed on is what is not reflected; dR = -d(ΣA + T).
  @Test
  void fillsTheResponseAsAnEvaluationDoes() {
    SplittableRandom random = new SplittableRandom(9);
    Sample sample = device(random, 7, 0.3);
    Incidence oblique = Sample.at(50, Polarisation.UNPOLARISED);
    try (Evaluator evaluator = sample.evaluator("fast", oblique, Incidence.normal())) {
      Response a = Response.spectra(2, 7, 9);
      Response b = Response.spectra(2, 7, 9);
      Response weights = sums(sample, random);
      a.weight = weights.weight;
      b.weight = weights.weight;
      a.sum = new double[3];
      b.sum = new double[3];
      evaluator.evaluate(sample.design, a);
      gradient(evaluator).evaluate(sample.design, b, new double[21]);
      assertThat(b.sum).containsExactly(a.sum);
      for (int i = 0; i < 2; i++) {
        assertThat(b.reflectance[i]).containsExactly(a.reflectance[i]);
        assertThat(b.transmittance[i]).containsExactly(a.transmittance[i]);
      }
      for (int row = 0; row < 14; row++) {
        assertThat(b.absorptance[row]).containsExactly(a.absorptance[row]);
      }
    }
  }

  // Witness: one-sided difference from the bare stack.
  @Test
  void aLayerAboutToAppearHasADerivative() {
    Sample sample = Sample.of(3, 500, 700);
    sample.layer(0, 1.4, 0, 80).layer(1, 2.2, 0.1, 0).layer(2, 3.3, 0.3, 200).medium(4, 0.1, 4);
    Response response = Response.sums(1, 3);
    response.weight[2] = new double[] {1, 1};
    double[] slope = new double[3];
    try (Evaluator evaluator = sample.evaluator("fast", Incidence.normal())) {
      gradient(evaluator).evaluate(sample.design, response, slope);
      double bare = response.sum[0];
      sample.design.thicknessNm[1] = 1e-6;
      evaluator.evaluate(sample.design, response);
      assertThat(slope[1]).isCloseTo((response.sum[0] - bare) / 1e-6, within(1e-8));
      assertThat(Math.abs(slope[1])).isGreaterThan(1e-4);
    }
  }

  @Test
  void theReferenceKernelOffersNone() {
    Sample sample = Sample.of(1, 500);
    assertThat(sample.evaluator("reference", Incidence.normal()).ability(Gradient.class)).isEmpty();
  }
}
