package evensun.device;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import evensun.data.DataFile;
import evensun.light.Blackbody;
import evensun.light.Spectra;
import evensun.light.Spectrum;
import evensun.result.Electrical;
import evensun.scenario.Connection;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;

class DetailedBalanceTest {

  private static final Spectrum GLOBAL = Spectra.named("AM1.5G");

  static Electrical ideal(Spectrum spectrum, DeviceParameters device, double... gaps) {
    List<SubcellParameters> subcells = new ArrayList<>();
    for (int i = 0; i < gaps.length; i++) {
      subcells.add(SubcellParameters.ideal("subcell-" + i, gaps[i]));
    }
    return DeviceModel.of(subcells, device, spectrum)
        .analyse(DeviceOptics.ofCurrents(StepCurrents.maPerCm2(spectrum, gaps)))
        .electrical();
  }

  private static double best(Spectrum spectrum, double gap, double temperatureK) {
    DeviceParameters device = DeviceParameters.of(Connection.SERIES).withTemperature(temperatureK);
    return ideal(spectrum, device, gap).efficiencyPercent();
  }

  /** Witness: the table beside this test, with its source. */
  @Test
  void singleJunctionsAgreeWithTheTable() {
    DataFile table = DataFile.resource(DetailedBalanceTest.class, "single-junctions.csv");
    double[] gaps = table.column(0);
    assertThat(gaps).hasSize(4);
    for (int i = 0; i < gaps.length; i++) {
      Electrical found = ideal(GLOBAL, DeviceParameters.of(Connection.SERIES), gaps[i]);
      assertThat(found.jscMaPerCm2() / table.column(1)[i]).isCloseTo(1, within(1e-3));
      assertThat(found.vocV() / table.column(2)[i]).isCloseTo(1, within(1e-3));
      assertThat(found.fillFactor() / table.column(3)[i]).isCloseTo(1, within(1e-3));
      assertThat(found.efficiencyPercent() / table.column(4)[i]).isCloseTo(1, within(1e-3));
    }
  }

  /** Witness: 33.7 % at 1.34 eV, S. Rühle, Sol. Energy 130, 139 (2016). */
  @Test
  void bestSingleJunctionIsThatOfTheTabulatedValues() {
    double bestGap = 0;
    double best = 0;
    for (double gap = 0.9; gap < 2; gap += 0.005) {
      double value = best(GLOBAL, gap, 298.15);
      bestGap = value > best ? gap : bestGap;
      best = Math.max(best, value);
    }
    assertThat(best).isCloseTo(33.7, within(0.1));
    assertThat(bestGap).isCloseTo(1.34, within(0.011));
  }

  /**
   * Witness: 31.0 % for one and 42.9 % for two junctions, sun of 6000 K (A. De Vos, J. Phys. D 13,
   * 839 (1980) and later tables of the same limit; from memory, hence half a percent).
   */
  @Test
  void blackBodyLimitsAreThoseOfDeVos() {
    double radius = 1 / Math.sqrt(46_200); // sine of half the angle the sun fills, from memory
    Spectrum sun = Blackbody.at(6000).times(radius * radius, "at the distance of the earth");
    DeviceParameters device = DeviceParameters.of(Connection.INDEPENDENT).withTemperature(300);
    double one = 0;
    double two = 0;
    for (double low = 0.8; low <= 1.5; low += 0.02) {
      one = Math.max(one, best(sun, low, 300));
      for (double high = low + 0.4; high <= 2.3; high += 0.04) {
        two = Math.max(two, ideal(sun, device, high, low).efficiencyPercent());
      }
    }
    assertThat(one).isCloseTo(31.0, within(0.5));
    assertThat(two).isCloseTo(42.9, within(0.5));
  }

  /** Witness: V_t ln C, and no change of the radiative efficiency's meaning, under C suns. */
  @Test
  void concentrationRaisesTheVoltageByItsLogarithm() {
    DeviceParameters one = DeviceParameters.of(Connection.SERIES);
    List<SubcellParameters> cell =
        List.of(SubcellParameters.ideal("only", 1.4).withRecombination(0.01, 1));
    double low =
        DeviceModel.of(cell, one, 1000).analyse(DeviceOptics.ofCurrents(30)).electrical().vocV();
    double high =
        DeviceModel.of(cell, one.withSuns(100), 100_000)
            .analyse(DeviceOptics.ofCurrents(3000))
            .electrical()
            .vocV();
    assertThat(high - low)
        .isCloseTo(BlackBody.thermalVoltageV(298.15) * Math.log(100), within(1e-9));
  }
}
