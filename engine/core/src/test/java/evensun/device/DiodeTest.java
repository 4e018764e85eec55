package evensun.device;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class DiodeTest {

  private static final double VT = BlackBody.thermalVoltageV(298.15);
  private static final double NONE = Double.POSITIVE_INFINITY;

  private static Diode diode(
      double gapEv, double efficiency, double ideality, double shunt, double breakdown) {
    double radiative = BlackBody.aboveMaPerCm2(gapEv, 298.15);
    Diode diode = new Diode();
    double other = Diode.nonRadiativeMaPerCm2(VT, radiative, efficiency, ideality, 20);
    diode.set(VT, radiative, other, ideality, shunt, breakdown);
    return diode;
  }

  /** Witness: the definition, current(voltage(current)) = current, over twenty decades. */
  @Test
  void voltageInvertsCurrentWhateverTheBranches() {
    Random random = new Random(5);
    for (int i = 0; i < 2000; i++) {
      double shunt = i % 3 == 0 ? NONE : Math.pow(10, 6 * random.nextDouble());
      double breakdown = i % 4 == 0 ? 0.5 + 10 * random.nextDouble() : NONE;
      double ideality = 0.6 + 2 * random.nextDouble();
      double efficiency = Math.pow(10, -8 * random.nextDouble());
      Diode diode = diode(0.5 + 2 * random.nextDouble(), efficiency, ideality, shunt, breakdown);
      double wanted = Math.pow(10, -10 + 12 * random.nextDouble());
      wanted = i % 2 == 0 || diode.saturates() ? wanted : -wanted;
      diode.solve(wanted);
      diode.at(diode.voltage);
      assertThat(diode.current / wanted).isCloseTo(1, within(1e-8));
    }
  }

  /** Witness: bisection of the sum of both exponentials, against the closed forms for 1 and 2. */
  @ParameterizedTest
  @ValueSource(doubles = {1, 2, 1.5})
  void closedFormsAgreeWithBisection(double ideality) {
    Diode diode = diode(1.3, 1e-3, ideality, NONE, NONE);
    double low = 0;
    double high = 2;
    for (int i = 0; i < 200; i++) {
      double middle = 0.5 * (low + high);
      diode.at(middle);
      if (diode.current > 12.5) {
        high = middle;
      } else {
        low = middle;
      }
    }
    diode.solve(12.5);
    assertThat(diode.voltage).isCloseTo(low, within(1e-13));
  }

  /** Witness: the definition of the external radiative efficiency at open circuit. */
  @ParameterizedTest
  @CsvSource({"0.01, 1", "0.01, 1.5", "1e-6, 2", "0.5, 0.7", "0.999, 2"})
  void radiativePartHoldsAtOpenCircuit(double efficiency, double ideality) {
    double radiative = BlackBody.aboveMaPerCm2(1.6, 298.15);
    Diode diode = diode(1.6, efficiency, ideality, NONE, NONE);
    diode.solve(20);
    assertThat(radiative * Math.expm1(diode.voltage / VT) / 20).isCloseTo(efficiency, within(1e-9));
    // closed form: the loss of voltage is V_t ln of the efficiency, whatever the ideality
    assertThat(diode.voltage)
        .isCloseTo(VT * Math.log1p(20 / radiative) + VT * Math.log(efficiency), within(1e-9));
    assertThat(diode.voltage).isLessThan(1.6);
  }

  /** Witness: calculus, by central differences. */
  @Test
  void slopeIsTheDerivative() {
    Diode diode = diode(1.1, 0.02, 1.7, 500, 3);
    for (double v : new double[] {-2.9, -0.5, 0.1, 0.6, 0.8}) {
      diode.at(v + 1e-6);
      double up = diode.current;
      diode.at(v - 1e-6);
      double down = diode.current;
      diode.at(v);
      assertThat(diode.slope / ((up - down) / 2e-6)).isCloseTo(1, within(1e-5));
    }
  }

  @Test
  void reverseCurrentSaturatesOrBreaksThrough() {
    Diode ideal = diode(1.1, 1, 1, NONE, NONE);
    ideal.solve(-1);
    assertThat(ideal.voltage).isEqualTo(Double.NEGATIVE_INFINITY);
    Diode broken = diode(1.1, 1, 1, NONE, 4);
    broken.solve(-Diode.BREAKDOWN_MA_PER_CM2);
    assertThat(broken.voltage).isCloseTo(-4, within(1e-6));
  }

  /** Witness: the limit of little light of the closed form, taken at a small current. */
  @Test
  void withoutLightTheNonRadiativeBranchStaysDefined() {
    double radiative = BlackBody.aboveMaPerCm2(1.2, 298.15);
    double dark = Diode.nonRadiativeMaPerCm2(VT, radiative, 0.01, 2, 0);
    double faint = Diode.nonRadiativeMaPerCm2(VT, radiative, 0.01, 2, 1e-6 * radiative);
    assertThat(dark / faint).isCloseTo(1, within(1e-4));
  }
}
