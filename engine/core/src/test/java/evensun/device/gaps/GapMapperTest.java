package evensun.device.gaps;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import evensun.device.DeviceParameters;
import evensun.device.gaps.GapOptions.Junction;
import evensun.light.Spectra;
import evensun.light.Spectrum;
import evensun.result.BandgapMap;
import evensun.scenario.Connection;
import java.util.List;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;

class GapMapperTest {

  private static final Spectrum GLOBAL = Spectra.named("AM1.5G");
  private static final Junction IDEAL = Junction.IDEAL;

  private static BandgapMap map(Connection connection, double from, double to, Junction... pile) {
    return GapMapper.map(
        new GapOptions(List.of(pile), GLOBAL, DeviceParameters.of(connection), from, to, 0.01),
        2,
        share -> {});
  }

  /** Witness: 45.7 % near 1.60 and 0.94 eV (from memory), 45.7 to 45.9 % by tables and years. */
  @Test
  void bestPairIsThePublishedOne() {
    BandgapMap map = map(Connection.SERIES, 0.8, 1.9, IDEAL, IDEAL);
    assertThat(map.optimum().efficiencyPercent()).isBetween(45.7, 45.9);
    assertThat(map.optimum().gapsEv().get(0)).isCloseTo(1.60, within(0.011));
    assertThat(map.optimum().gapsEv().get(1)).isCloseTo(0.94, within(0.011));
  }

  /** Witness: 45.1 % near 1.73 eV on a bottom cell of 1.12 eV (from memory). */
  @Test
  void bestPartnerOfSiliconIsThePublishedOne() {
    BandgapMap map = map(Connection.SERIES, 1.2, 2.2, IDEAL, IDEAL.fixedAt(1.12));
    assertThat(map.optimum().efficiencyPercent()).isCloseTo(45.1, within(0.1));
    assertThat(map.optimum().gapsEv()).containsExactly(1.73, 1.12);
    assertThat(map.axes()).containsExactly("top");
    assertThat(map.ridge())
        .allSatisfy(
            point ->
                assertThat(point.efficiencyPercent())
                    .isGreaterThanOrEqualTo(0.99 * map.optimum().efficiencyPercent()));
  }

  /**
   * Witness: 51.70 % at 1.90, 1.37 and 0.93 eV on this mesh, computed by an independent program.
   */
  @Test
  void bestTripleIsTheIndependentlyComputedOne() {
    BandgapMap map = map(Connection.SERIES, 0.85, 2.0, IDEAL, IDEAL, IDEAL);
    assertThat(map.optimum().efficiencyPercent()).isCloseTo(51.70, within(0.01));
    assertThat(map.optimum().gapsEv()).containsExactly(1.90, 1.37, 0.93);
    assertThat(map.bestOver()).isEqualTo("middle");
  }

  /** Witness: a junction that absorbs a given part emits and takes that part; one absorbing all. */
  @Test
  void halfTransparentTopsWantALowerGap() {
    Junction thin = new Junction(OptionalDouble.empty(), 1, 0, 0.85);
    double thick =
        map(Connection.SERIES, 1.2, 2.2, IDEAL, IDEAL.fixedAt(1.12)).optimum().gapsEv().get(0);
    double through =
        map(Connection.SERIES, 1.2, 2.2, thin, IDEAL.fixedAt(1.12)).optimum().gapsEv().get(0);
    assertThat(through).isLessThan(thick);
  }

  /** Witness: V_t ln of the efficiency per junction lowers every point of the map. */
  @Test
  void recombinationLowersTheMap() {
    Junction real = new Junction(OptionalDouble.empty(), 0.01, 0, 1);
    double ideal = map(Connection.SERIES, 0.9, 1.8, IDEAL, IDEAL).optimum().efficiencyPercent();
    double lower = map(Connection.SERIES, 0.9, 1.8, real, real).optimum().efficiencyPercent();
    assertThat(ideal - lower).isBetween(3.0, 6.0);
  }

  @Test
  void independentJunctionsAreNeverWorse() {
    BandgapMap series = map(Connection.SERIES, 0.9, 1.4, IDEAL, IDEAL);
    BandgapMap independent = map(Connection.INDEPENDENT, 0.9, 1.4, IDEAL, IDEAL);
    for (int row = 0; row < series.efficiencyPercent().size(); row++) {
      for (int column = 0; column < row; column++) {
        assertThat(series.efficiencyPercent().get(row).get(column))
            .isLessThanOrEqualTo(independent.efficiencyPercent().get(row).get(column) + 1e-9);
      }
    }
  }

  @Test
  void theWrongOrderIsLeftOut() {
    BandgapMap map = map(Connection.SERIES, 1.0, 1.2, IDEAL, IDEAL);
    for (int row = 0; row < map.efficiencyPercent().size(); row++) {
      for (int column = 0; column < map.efficiencyPercent().get(row).size(); column++) {
        assertThat(map.efficiencyPercent().get(row).get(column) == null).isEqualTo(column >= row);
      }
    }
  }

  @Test
  void threadsDoNotChangeABit() {
    GapOptions options =
        new GapOptions(
            List.of(IDEAL, IDEAL, IDEAL.fixedAt(0.67)),
            GLOBAL,
            DeviceParameters.of(Connection.SERIES),
            0.7,
            2.0,
            0.05);
    assertThat(GapMapper.map(options, 1, share -> {}))
        .isEqualTo(GapMapper.map(options, 3, share -> {}));
  }

  @Test
  void gapsThatCannotFallAreRefused() {
    assertThatThrownBy(() -> map(Connection.SERIES, 0.5, 0.9, IDEAL, IDEAL.fixedAt(1.12)))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessageContaining("fall from the top to the bottom");
  }
}
