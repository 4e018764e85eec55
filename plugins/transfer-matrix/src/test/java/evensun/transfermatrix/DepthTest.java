package evensun.transfermatrix;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.within;

import evensun.spi.Channel;
import evensun.spi.DepthProfile;
import evensun.spi.Evaluator;
import evensun.spi.Incidence;
import evensun.spi.Polarisation;
import evensun.spi.Response;
import evensun.spi.Side;
import org.apache.commons.math3.analysis.integration.gauss.GaussIntegrator;
import org.apache.commons.math3.analysis.integration.gauss.GaussIntegratorFactory;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class DepthTest {

  private static Sample device() {
    Sample sample = Sample.of(new boolean[] {false, false, true, false}, 400, 650, 900);
    sample.layer(0, 1.9, 0.05, 90).layer(1, 2.4, 0.3, 450);
    sample.layer(2, 3.6, 0.002, 20000).layer(3, 1.8, 0.1, 80);
    return sample.medium(5, 0.1, 5);
  }

  private static double[][] profile(
      Sample sample, Incidence incidence, int layer, double[] depthNm) {
    double[][] into = new double[depthNm.length][sample.wavelengths()];
    try (Evaluator evaluator = sample.evaluator("fast", incidence)) {
      evaluator
          .ability(DepthProfile.class)
          .orElseThrow()
          .evaluate(sample.design, 0, Channel.of(layer), depthNm, into);
    }
    return into;
  }

  // Witness: the absorptance of the layer, by Gauss-Legendre quadrature on panels of a tenth of a
  // fringe or so.
  @ParameterizedTest
  @CsvSource({
    "0, UNPOLARISED, FRONT",
    "55, S, FRONT",
    "55, P, FRONT",
    "70, UNPOLARISED, FRONT",
    "40, UNPOLARISED, REAR"
  })
  void theIntegralIsTheAbsorptance(double angleDeg, Polarisation polarisation, Side side) {
    Sample sample = device();
    if (side == Side.REAR) {
      sample.medium(5, 1.5, 0);
    }
    Incidence incidence = new Incidence(angleDeg, polarisation, side);
    Response response = sample.solve("fast", incidence);
    GaussIntegrator rule = new GaussIntegratorFactory().legendre(12);
    for (int l = 0; l < 4; l++) {
      int panels = (int) Math.ceil(sample.design.thicknessNm[l] / 25);
      double width = sample.design.thicknessNm[l] / panels;
      double[] integral = new double[3];
      double[] depthNm = new double[panels * 12];
      for (int i = 0; i < depthNm.length; i++) {
        depthNm[i] = width * (i / 12 + (1 + rule.getPoint(i % 12)) / 2);
      }
      double[][] found = profile(sample, incidence, l, depthNm);
      for (int i = 0; i < depthNm.length; i++) {
        for (int w = 0; w < 3; w++) {
          integral[w] += found[i][w] * rule.getWeight(i % 12) * width / 2;
        }
      }
      for (int w = 0; w < 3; w++) {
        assertThat(integral[w]).isCloseTo(response.absorptance[l][w], within(1e-9));
      }
    }
  }

  // Witness: what a thinner layer would absorb has no part in it; the profile inside is that of
  // two layers drawn where there was one, each with its share.
  @Test
  void splittingALayerSplitsItsProfile() {
    Sample whole = Sample.of(1, 600).layer(0, 2.5, 0.2, 300).medium(2, 0.1, 4);
    Sample split = Sample.of(2, 600).layer(0, 2.5, 0.2, 120).layer(1, 2.5, 0.2, 180);
    split.medium(3, 0.1, 4);
    Incidence oblique = Sample.at(30, Polarisation.P);
    double[][] a = profile(whole, oblique, 0, new double[] {60, 170, 300});
    assertThat(profile(split, oblique, 0, new double[] {60})[0][0])
        .isCloseTo(a[0][0], within(1e-14));
    double[][] lower = profile(split, oblique, 1, new double[] {50, 180});
    assertThat(lower[0][0]).isCloseTo(a[1][0], within(1e-14));
    assertThat(lower[1][0]).isCloseTo(a[2][0], within(1e-14));
  }

  // Witness: Beer-Lambert, with nothing coming back from an opaque layer.
  @Test
  void lightDecaysExponentiallyInAnOpaqueLayer() {
    Sample sample = Sample.of(1, 500).layer(0, 2, 0.1, 50000).medium(2, 1, 0);
    double[][] found = profile(sample, Incidence.normal(), 0, new double[] {0, 1000});
    double alpha = 4 * Math.PI * 0.1 / 500;
    double entering = 1 - (1 + 0.01) / (9 + 0.01);
    assertThat(found[0][0]).isCloseTo(alpha * entering, within(1e-15));
    assertThat(found[1][0]).isCloseTo(alpha * entering * Math.exp(-1000 * alpha), within(1e-15));
  }

  @Test
  void anAbsentLayerAbsorbsNowhere() {
    Sample sample = Sample.of(2, 500).layer(0, 2, 0.1, 0).layer(1, 2, 0.1, 100);
    assertThat(profile(sample, Incidence.normal(), 0, new double[] {0})[0]).containsExactly(0);
  }

  @Test
  void aDepthOutsideTheLayerIsRefused() {
    Sample sample = Sample.of(1, 500).layer(0, 2, 0.1, 100);
    assertThatIllegalArgumentException()
        .isThrownBy(() -> profile(sample, Incidence.normal(), 0, new double[] {101}))
        .withMessage("depthNm must be in [0, 100.0] nm but was 101.0");
  }
}
