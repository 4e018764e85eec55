package evensun.transfermatrix;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import evensun.spi.Evaluator;
import evensun.spi.Gradient;
import evensun.spi.Polarisation;
import evensun.spi.Response;
import java.util.SplittableRandom;
import org.apache.commons.math3.dfp.Dfp;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Rounding errors and derivatives against 60-digit arithmetic. */
class PrecisionTest {

  private static Sample device(SplittableRandom random, boolean incoherent) {
    boolean[] thick = new boolean[6];
    thick[3] = incoherent;
    thick[0] = incoherent && random.nextBoolean();
    Sample sample = Sample.of(thick, 420, 800);
    for (int l = 0; l < 6; l++) {
      double nm = thick[l] ? 5000 + 1e5 * random.nextDouble() : 20 + 200 * random.nextDouble();
      double k = random.nextInt(3) == 0 ? 0 : Math.pow(10, -3 + 2.5 * random.nextDouble());
      double n = 1.4 + 2.2 * random.nextDouble();
      sample.layer(l, n, thick[l] ? k * 1e-3 : k, nm);
    }
    return sample.medium(7, 0.14, 4.1);
  }

  private static double angleDeg(int trial) {
    return trial % 3 == 0 ? 0 : 25.0 * (trial % 4);
  }

  // Witness: the same stack in 60-digit arithmetic.
  @ParameterizedTest
  @ValueSource(strings = {"fast", "reference"})
  void roundingStaysBelowTheTwelfthDigit(String kernel) {
    SplittableRandom random = new SplittableRandom(2);
    for (int trial = 0; trial < 16; trial++) {
      Sample sample = device(random, trial % 2 == 1);
      boolean p = trial % 4 > 1;
      double angleDeg = angleDeg(trial);
      Response found =
          sample.solve(kernel, Sample.at(angleDeg, p ? Polarisation.P : Polarisation.S));
      for (int w = 0; w < 2; w++) {
        HighPrecision expected = new HighPrecision(sample, w, angleDeg, p, -1, null);
        assertThat(found.reflectance[0][w])
            .isCloseTo(expected.reflectance.toDouble(), within(1e-12));
        assertThat(found.transmittance[0][w])
            .isCloseTo(expected.transmittance.toDouble(), within(1e-12));
        for (int l = 0; l < 6; l++) {
          assertThat(found.absorptance[l][w])
              .isCloseTo(expected.absorptance[l].toDouble(), within(1e-12));
        }
      }
    }
  }

  // Witness: differences over 2e-15 nm in 60-digit arithmetic, whose error is below 1e-25.
  @Test
  void derivativesAreRightToTheTwelfthDigit() {
    SplittableRandom random = new SplittableRandom(4);
    for (int trial = 0; trial < 6; trial++) {
      Sample sample = device(random, trial % 2 == 1);
      boolean p = trial % 4 > 1;
      double angleDeg = angleDeg(trial);
      double[] weight = {1.7, 0.6};
      Response response = Response.sums(2, 6);
      response.weight[2] = weight;
      response.weight[6 + 3] = weight;
      response.transmittanceWeight[1] = weight;
      double[] found = new double[12];
      try (Evaluator evaluator =
          sample.evaluator("fast", Sample.at(angleDeg, p ? Polarisation.P : Polarisation.S))) {
        evaluator.ability(Gradient.class).orElseThrow().evaluate(sample.design, response, found);
      }
      double[][] expected = new double[6][];
      for (int l = 0; l < 6; l++) {
        expected[l] = derivatives(sample, angleDeg, p, l, weight);
      }
      for (int s = 0; s < 2; s++) {
        double largest = 0;
        for (double[] slopes : expected) {
          largest = Math.max(largest, Math.abs(slopes[s]));
        }
        assertThat(largest).isPositive().isFinite();
        for (int l = 0; l < 6; l++) {
          assertThat(found[6 * s + l]).isCloseTo(expected[l][s], within(1e-12 * largest));
        }
      }
    }
  }

  private static double[] derivatives(
      Sample sample, double angleDeg, boolean p, int l, double[] weight) {
    Dfp step = HighPrecision.big(1e-15);
    double[] sums = new double[2];
    for (int w = 0; w < 2; w++) {
      HighPrecision more = new HighPrecision(sample, w, angleDeg, p, l, step);
      HighPrecision less = new HighPrecision(sample, w, angleDeg, p, l, step.negate());
      sums[0] += weight[w] * slope(more.absorptance[2], less.absorptance[2], step);
      sums[1] += weight[w] * slope(more.absorptance[3], less.absorptance[3], step);
      sums[1] += weight[w] * slope(more.transmittance, less.transmittance, step);
    }
    return sums;
  }

  private static double slope(Dfp more, Dfp less, Dfp step) {
    return more.subtract(less).divide(step.multiply(2)).toDouble();
  }
}
