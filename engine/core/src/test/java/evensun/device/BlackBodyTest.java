package evensun.device;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import evensun.light.Constants;
import org.apache.commons.math3.analysis.integration.IterativeLegendreGaussIntegrator;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class BlackBodyTest {

  /** Witness: Planck's integral by Gauss quadrature of another library, in SI units. */
  @ParameterizedTest
  @CsvSource({"0.3, 298.15", "1.12, 298.15", "1.68, 298.15", "1.12, 400", "0.5, 1000", "2.5, 77"})
  void seriesAgreesWithQuadrature(double gapEv, double temperatureK) {
    double kT = Constants.BOLTZMANN_J_PER_K * temperatureK;
    double h = Constants.PLANCK_JS;
    double c = Constants.LIGHT_SPEED_M_PER_S;
    double from = gapEv * Constants.ELEMENTARY_CHARGE_C / kT;
    double integral =
        new IterativeLegendreGaussIntegrator(32, 1e-12, 1e-300)
            .integrate(100_000, x -> x * x / Math.expm1(x), from, from + 60);
    double amperePerM2 =
        2 * Math.PI * Constants.ELEMENTARY_CHARGE_C * kT * kT * kT / (h * h * h * c * c) * integral;
    double found = BlackBody.aboveMaPerCm2(gapEv, temperatureK);
    assertThat(found / (0.1 * amperePerM2)).isCloseTo(1, within(1e-10));
  }

  /** Witness: zeta(3), the photon number of the whole black body: ∫ x²/(eˣ − 1) dx = 2 ζ(3). */
  @Test
  void wholeSpectrumHoldsTwiceZetaOfThree() {
    double kT = BlackBody.thermalVoltageV(6000);
    double h = Constants.PLANCK_JS / Constants.ELEMENTARY_CHARGE_C;
    double c = Constants.LIGHT_SPEED_M_PER_S;
    double all =
        0.1
            * 2
            * Math.PI
            * Constants.ELEMENTARY_CHARGE_C
            * kT
            * kT
            * kT
            / (h * h * h * c * c)
            * 2
            * 1.2020569031595943;
    assertThat(BlackBody.aboveMaPerCm2(1e-3, 6000) / all).isCloseTo(1, within(1e-5));
  }

  @Test
  void partsAddUp() {
    double whole = BlackBody.aboveMaPerCm2(1.0, 298.15);
    double parts =
        BlackBody.betweenMaPerCm2(1.0, 1.1, 298.15) + BlackBody.aboveMaPerCm2(1.1, 298.15);
    assertThat(parts / whole).isCloseTo(1, within(1e-14));
  }
}
