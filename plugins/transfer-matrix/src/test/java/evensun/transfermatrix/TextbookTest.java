package evensun.transfermatrix;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import evensun.spi.Incidence;
import evensun.spi.Polarisation;
import evensun.spi.Response;
import org.assertj.core.data.Offset;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/**
 * Closed forms of thin-film optics, as in Born &amp; Wolf, Principles of Optics, section 1.5-1.6.
 */
class TextbookTest {

  private static final Offset<Double> TIGHT = within(1e-14);

  @ParameterizedTest
  @ValueSource(strings = {"fast", "reference"})
  void bareGlassReflectsFourPercent(String kernel) {
    Response response = Sample.of(0, 550).medium(1, 1.5, 0).solve(kernel, Incidence.normal());
    // Fresnel: ((1.5 - 1)/(1.5 + 1))² = 0.04.
    assertThat(response.reflectance[0][0]).isCloseTo(0.04, TIGHT);
    assertThat(response.transmittance[0][0]).isCloseTo(0.96, TIGHT);
  }

  @ParameterizedTest
  @ValueSource(strings = {"fast", "reference"})
  void nothingOfPLightReturnsAtBrewstersAngle(String kernel) {
    Sample glass = Sample.of(0, 550).medium(1, 1.5, 0);
    double brewsterDeg = Math.toDegrees(Math.atan(1.5)); // Brewster: tan θ = n.
    Response p = glass.solve(kernel, Sample.at(brewsterDeg, Polarisation.P));
    Response s = glass.solve(kernel, Sample.at(brewsterDeg, Polarisation.S));
    assertThat(p.reflectance[0][0]).isCloseTo(0, TIGHT);
    // Fresnel at Brewster's angle: r_s = cos 2θ, so R_s = ((n² - 1)/(n² + 1))².
    assertThat(s.reflectance[0][0]).isCloseTo(Math.pow(1.25 / 3.25, 2), TIGHT);
  }

  @ParameterizedTest
  @ValueSource(strings = {"fast", "reference"})
  void allLightReturnsBeyondTheCriticalAngle(String kernel) {
    Sample glass = Sample.of(0, 550).medium(0, 1.5, 0);
    // Snell: critical angle arcsin(1/1.5) = 41.81°.
    for (double angleDeg : new double[] {41.9, 45, 60, 85, 89.9}) {
      Response response = glass.solve(kernel, Sample.at(angleDeg, Polarisation.UNPOLARISED));
      assertThat(response.reflectance[0][0]).isCloseTo(1, TIGHT);
      assertThat(response.transmittance[0][0]).isCloseTo(0, TIGHT);
    }
  }

  @ParameterizedTest
  @ValueSource(strings = {"fast", "reference"})
  void aThinGapPassesLightBeyondTheCriticalAngle(String kernel) {
    Sample gap = Sample.of(1, 550).medium(0, 1.5, 0).medium(2, 1.5, 0);
    gap.layer(0, 1, 0, 100);
    double angleDeg = 60;
    double sine = 1.5 * Math.sin(Math.toRadians(angleDeg));
    double decay = Math.sqrt(sine * sine - 1);
    double q = 1.5 * Math.cos(Math.toRadians(angleDeg));
    double sinh = Math.sinh(2 * Math.PI * decay * 100 / 550);
    // Tunnelling through a gap, s light: T = 1/(1 + ((q² + κ²)/(2qκ))² sinh²(κ k₀ d)).
    double expected = 1 / (1 + Math.pow((q * q + decay * decay) / (2 * q * decay) * sinh, 2));
    Response response = gap.solve(kernel, Sample.at(angleDeg, Polarisation.S));
    assertThat(response.transmittance[0][0]).isCloseTo(expected, within(1e-13));
  }

  @ParameterizedTest
  @ValueSource(strings = {"fast", "reference"})
  void aQuarterWaveOfTheGeometricMeanReflectsNothing(String kernel) {
    Sample coated = Sample.of(1, 600).medium(2, 2.25, 0);
    coated.layer(0, 1.5, 0, 600 / (4 * 1.5)); // n₁² = n₀n₂, a quarter wave.
    assertThat(coated.solve(kernel, Incidence.normal()).reflectance[0][0]).isCloseTo(0, TIGHT);
  }

  @ParameterizedTest
  @ValueSource(strings = {"fast", "reference"})
  void aQuarterWaveStackReflectsAsItsFormulaSays(String kernel) {
    for (int pairs = 1; pairs <= 20; pairs++) {
      Sample mirror = Sample.of(2 * pairs, 500).medium(2 * pairs + 1, 1.52, 0);
      for (int l = 0; l < 2 * pairs; l++) {
        double n = l % 2 == 0 ? 2.3 : 1.38;
        mirror.layer(l, n, 0, 500 / (4 * n));
      }
      // (HL)^N on n_s in air: Y = n_s (n_H/n_L)^2N, R = ((1 - Y)/(1 + Y))².
      double admittance = 1.52 * Math.pow(2.3 / 1.38, 2 * pairs);
      double expected = Math.pow((1 - admittance) / (1 + admittance), 2);
      double found = mirror.solve(kernel, Incidence.normal()).reflectance[0][0];
      assertThat(found).isCloseTo(expected, within(1e-13));
    }
  }

  @ParameterizedTest
  @ValueSource(strings = {"fast", "reference"})
  void aHalfWaveLayerIsNotSeen(String kernel) {
    Sample coated = Sample.of(1, 600).medium(2, 3.5, 0.2);
    coated.layer(0, 2, 0, 600 / (2 * 2.0));
    double bare =
        Sample.of(0, 600).medium(1, 3.5, 0.2).solve(kernel, Incidence.normal()).reflectance[0][0];
    // Closed form: exp(2iδ) = 1 for a half wave, so the coating drops out.
    assertThat(coated.solve(kernel, Incidence.normal()).reflectance[0][0])
        .isCloseTo(bare, within(1e-13));
  }

  @ParameterizedTest
  @ValueSource(strings = {"fast", "reference"})
  void aGlassPaneAddsUpItsInternalReflections(String kernel) {
    Sample pane = Sample.of(new boolean[] {true}, 550);
    double k = 1e-6;
    pane.layer(0, 1.5, k, 1e6);
    double r = (0.25 + k * k) / (6.25 + k * k);
    double a = Math.exp(-4 * Math.PI * k * 1e6 / 550);
    // Geometric series of the intensities: T = (1-R)² a/(1 - R²a²), R' = R(1 + aT).
    double t = (1 - r) * (1 - r) * a / (1 - r * r * a * a);
    Response response = pane.solve(kernel, Incidence.normal());
    assertThat(response.transmittance[0][0]).isCloseTo(t, within(1e-12));
    assertThat(response.reflectance[0][0]).isCloseTo(r * (1 + a * t), within(1e-12));
  }
}
