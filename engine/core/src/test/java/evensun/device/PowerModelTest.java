package evensun.device;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.sun.management.ThreadMXBean;
import evensun.result.Electrical;
import evensun.scenario.Connection;
import java.lang.management.ManagementFactory;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

class PowerModelTest {

  private static final List<SubcellParameters> TANDEM =
      List.of(
          SubcellParameters.ideal("top", 1.68).withRecombination(0.01, 1.5).withShunt(5000),
          SubcellParameters.ideal("bottom", 1.12).withRecombination(0.01, 1).withCollection(0.98));

  /** Witness: the full model, which takes another way to the same number. */
  @ParameterizedTest
  @EnumSource(Connection.class)
  void agreesWithTheFullModel(Connection connection) {
    DeviceModel model = DeviceModel.of(TANDEM, DeviceParameters.of(connection), 1000);
    double full = model.analyse(DeviceOptics.ofCurrents(19, 20)).electrical().efficiencyPercent();
    double fast =
        model.newPowerModel().efficiencyPercent(new double[] {19, 20}, new double[] {1.68, 1.12});
    assertThat(fast).isCloseTo(full, within(1e-12));
  }

  /** Witness: the JVM's own count of allocated bytes. */
  @ParameterizedTest
  @EnumSource(Connection.class)
  void allocatesNothing(Connection connection) {
    PowerModel model = new PowerModel(TANDEM, DeviceParameters.of(connection), 1000);
    double[] currents = {19, 20};
    double[] gaps = {1.68, 1.12};
    double sum = 0;
    for (int i = 0; i < 3000; i++) {
      currents[0] = 18 + 1e-3 * i;
      sum += model.efficiencyPercent(currents, gaps);
    }
    ThreadMXBean threads = (ThreadMXBean) ManagementFactory.getThreadMXBean();
    long before = threads.getCurrentThreadAllocatedBytes();
    for (int i = 0; i < 3000; i++) {
      currents[0] = 18 + 1e-3 * i;
      sum += model.efficiencyPercent(currents, gaps);
    }
    long after = threads.getCurrentThreadAllocatedBytes();
    assertThat(sum).isPositive();
    assertThat(after - before).isLessThan(3000);
  }

  /** Witness: second differences of a smooth function shrink with the square of the step. */
  @Test
  void isSmoothThroughMatching() {
    PowerModel model = new PowerModel(TANDEM, DeviceParameters.of(Connection.SERIES), 1000);
    double[] gaps = {1.68, 1.12};
    for (double centre = 18; centre < 21; centre += 0.05) {
      double h = 1e-3;
      double up = model.efficiencyPercent(new double[] {centre + h, 20}, gaps);
      double here = model.efficiencyPercent(new double[] {centre, 20}, gaps);
      double down = model.efficiencyPercent(new double[] {centre - h, 20}, gaps);
      assertThat(Math.abs(up - 2 * here + down) / (h * h)).isLessThan(10);
      assertThat(up).isGreaterThan(down);
    }
  }

  /**
   * Witness: the envelope theorem. At maximum power dP/dJ_ph of a subcell is the current times the
   * slope of its voltage, J·V_t/(J_ph − J + J₀) for an ideal diode.
   */
  @Test
  void derivativesFollowTheEnvelope() {
    List<SubcellParameters> ideal =
        List.of(SubcellParameters.ideal("top", 1.68), SubcellParameters.ideal("bottom", 1.12));
    Electrical found =
        DeviceModel.of(ideal, DeviceParameters.of(Connection.SERIES), 1000)
            .analyse(DeviceOptics.ofCurrents(19.5, 20.1))
            .electrical();
    double[] light = {19.5, 20.1};
    for (int i = 0; i < 2; i++) {
      var subcell = found.subcells().get(i);
      double j = subcell.operatingMaPerCm2();
      double expected =
          j * BlackBody.thermalVoltageV(298.15) / (light[i] - j + subcell.saturationMaPerCm2());
      assertThat(subcell.efficiencyGainPerMaPerCm2()).isCloseTo(expected, within(1e-5));
    }
  }

  @Test
  void nothingComesOfNoLight() {
    PowerModel model = new PowerModel(TANDEM, DeviceParameters.of(Connection.SERIES), 1000);
    assertThat(model.efficiencyPercent(new double[] {0, 0}, new double[] {1.68, 1.12})).isZero();
    assertThat(model.efficiencyPercent(new double[] {-1e-12, 20}, new double[] {1.68, 1.12}))
        .isBetween(0.0, 1.0);
  }
}
