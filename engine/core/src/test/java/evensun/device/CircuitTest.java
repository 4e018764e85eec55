package evensun.device;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import evensun.scenario.Connection;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.ValueSource;

class CircuitTest {

  private static final double VT = BlackBody.thermalVoltageV(298.15);

  private static DeviceModel device(Connection connection, SubcellParameters... subcells) {
    return DeviceModel.of(List.of(subcells), DeviceParameters.of(connection), 1000);
  }

  private static double percent(DeviceModel model, double... currents) {
    return model.analyse(DeviceOptics.ofCurrents(currents)).electrical().efficiencyPercent();
  }

  /** Principal branch of Lambert's W by Halley's iteration, for positive arguments. */
  private static double lambertW(double x) {
    double w = Math.log1p(x);
    for (int i = 0; i < 100; i++) {
      double e = Math.exp(w);
      double f = w * e - x;
      w -= f / (e * (w + 1) - (w + 2) * f / (2 * w + 2));
    }
    return w;
  }

  /**
   * Witness: the explicit current of one diode with series resistance, J = J_ph + J₀ − (V_t/R)
   * W((J₀R/V_t) exp((V + R(J_ph + J₀))/V_t)) (A. Jain and A. Kapoor, Sol. Energy Mater. Sol. Cells
   * 81, 269 (2004)).
   */
  @ParameterizedTest
  @ValueSource(doubles = {0.1, 1, 5, 30})
  void seriesResistanceFollowsLambertsFunction(double ohmCm2) {
    DeviceModel model =
        DeviceModel.of(
            List.of(SubcellParameters.ideal("only", 1.12)),
            DeviceParameters.of(Connection.SERIES).withSeriesResistance(ohmCm2),
            1000);
    double saturation = BlackBody.aboveMaPerCm2(1.12, 298.15);
    double r = ohmCm2 * 1e-3;
    for (double v : new double[] {-0.3, 0, 0.4, 0.6, 0.7, 0.8, 0.85}) {
      double argument = saturation * r / VT * Math.exp((v + r * (40 + saturation)) / VT);
      double expected = 40 + saturation - VT / r * lambertW(argument);
      assertThat(model.currentMaPerCm2(new double[] {40}, v)[0]).isCloseTo(expected, within(1e-8));
    }
  }

  /**
   * Witness: symmetry. Two equal subcells in series double the voltage, in parallel the current.
   */
  @Test
  void equalSubcellsShareEvenly() {
    SubcellParameters cell = SubcellParameters.ideal("a", 1.3).withRecombination(0.05, 1.6);
    DeviceModel one = device(Connection.SERIES, cell);
    double alone = percent(one, 17);
    assertThat(percent(device(Connection.SERIES, cell, cell), 17, 17) / alone)
        .isCloseTo(2, within(1e-9));
    assertThat(percent(device(Connection.PARALLEL, cell, cell), 17, 17) / alone)
        .isCloseTo(2, within(1e-9));
    double single = one.currentMaPerCm2(new double[] {17}, 0.9)[0];
    double pair =
        device(Connection.SERIES, cell, cell).currentMaPerCm2(new double[] {17, 17}, 1.8)[0];
    assertThat(pair).isCloseTo(single, within(1e-9));
  }

  /** Witness: superposition, J(V) = J_ph + J_dark(V) without series resistance. */
  @Test
  void lightShiftsTheDarkCurve() {
    SubcellParameters cell = SubcellParameters.ideal("a", 1.3).withShunt(800).withBreakdown(6);
    DeviceModel model = device(Connection.SERIES, cell);
    double[] volts = {-6.2, -3, -0.2, 0, 0.5, 0.9, 1.0};
    double[] light = model.currentMaPerCm2(new double[] {25}, volts);
    double[] dark = model.currentMaPerCm2(new double[] {0}, volts);
    for (int i = 0; i < volts.length; i++) {
      assertThat(light[i] - dark[i]).isCloseTo(25, within(1e-9 * (25 + Math.abs(dark[i]))));
    }
  }

  /** Witness: an operating point of the series device is open to independent subcells as well. */
  @Test
  void independentSubcellsAreNeverWorse() {
    Random random = new Random(11);
    for (int i = 0; i < 300; i++) {
      SubcellParameters[] cells = new SubcellParameters[2 + i % 3];
      double[] currents = new double[cells.length];
      for (int j = 0; j < cells.length; j++) {
        double coupling = i % 2 == 0 ? 0 : 0.4 * random.nextDouble();
        cells[j] =
            SubcellParameters.ideal("s" + j, 2.2 - 0.5 * j)
                .withRecombination(
                    Math.pow(10, -4 * random.nextDouble()) * 0.5, 1 + random.nextDouble())
                .withShunt(i % 5 == 0 ? 50 + 1e4 * random.nextDouble() : Double.POSITIVE_INFINITY)
                .withCoupling(coupling);
        currents[j] = 1 + 19 * random.nextDouble();
      }
      double independent = percent(device(Connection.INDEPENDENT, cells), currents);
      assertThat(percent(device(Connection.SERIES, cells), currents))
          .isLessThanOrEqualTo(independent * (1 + 1e-9));
      assertThat(percent(device(Connection.PARALLEL, cells), currents))
          .isLessThanOrEqualTo(independent * (1 + 1e-9));
    }
  }

  /** Witness: a brute scan of the device's own curve. */
  @ParameterizedTest
  @EnumSource(
      value = Connection.class,
      names = {"SERIES", "PARALLEL"})
  void maximumIsThatOfTheCurve(Connection connection) {
    Random random = new Random(3);
    for (int i = 0; i < 30; i++) {
      SubcellParameters top =
          SubcellParameters.ideal("t", 1.7)
              .withRecombination(0.01, 1.5)
              .withShunt(20 + 2000 * random.nextDouble())
              .withBreakdown(i % 3 == 0 ? 0.4 + 3 * random.nextDouble() : Double.POSITIVE_INFINITY);
      SubcellParameters bottom =
          SubcellParameters.ideal("b", 1.1).withRecombination(0.02, 1).withCoupling(0);
      DeviceModel model =
          DeviceModel.of(
              List.of(top.withCoupling(0.3), bottom),
              DeviceParameters.of(connection).withSeriesResistance(5 * random.nextDouble()),
              1000);
      double[] currents = {25 * random.nextDouble(), 25 * random.nextDouble()};
      double best = 0;
      for (double v = 0; v < 2.2; v += 0.01) {
        best = Math.max(best, v * model.currentMaPerCm2(currents, v)[0]);
      }
      double found = model.analyse(DeviceOptics.ofCurrents(currents)).electrical().powerMwPerCm2();
      assertThat(found).isGreaterThanOrEqualTo(best * (1 - 1e-12)).isLessThan(best * 1.02 + 1e-9);
    }
  }

  /** Witness: the definition of luminescent coupling, at the operating point found. */
  @ParameterizedTest
  @EnumSource(Connection.class)
  void theNextSubcellReceivesItsPartOfTheRecombination(Connection connection) {
    SubcellParameters top =
        SubcellParameters.ideal("t", 1.7).withRecombination(0.2, 1.4).withCoupling(0.5);
    DeviceModel model = device(connection, top, SubcellParameters.ideal("b", 1.1));
    var subcells = model.analyse(DeviceOptics.ofCurrents(22, 15)).electrical().subcells();
    double recombined = 22 - subcells.get(0).operatingMaPerCm2();
    assertThat(subcells.get(1).luminescenceMaPerCm2()).isCloseTo(0.5 * recombined, within(1e-7));
  }

  /** Witness: a saturated subcell carries its light current and no more, at any voltage below. */
  @Test
  void aStarvedSubcellSetsTheCurrentDeepIntoReverse() {
    DeviceModel model =
        device(
            Connection.SERIES,
            SubcellParameters.ideal("t", 1.7),
            SubcellParameters.ideal("m", 1.3),
            SubcellParameters.ideal("b", 0.9));
    double[] currents = model.currentMaPerCm2(new double[] {20, 0.01, 20}, -40, -1, 0, 1);
    for (double current : currents) {
      assertThat(current).isCloseTo(0.01, within(1e-9));
    }
    var cells = model.analyse(DeviceOptics.ofCurrents(20, 0.01, 20)).electrical().subcells();
    double others = cells.get(0).shortCircuitVoltageV() + cells.get(2).shortCircuitVoltageV();
    assertThat(cells.get(1).shortCircuitVoltageV()).isCloseTo(-others, within(1e-9));
  }
}
