package evensun.device;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import evensun.light.Spectra;
import evensun.light.Spectrum;
import evensun.light.WavelengthGrid;
import evensun.result.Electrical;
import evensun.result.Electrical.LadderStep;
import evensun.result.Electrical.MismatchPoint;
import evensun.result.Outcome.Spectral;
import evensun.result.Outcome.SubcellOutcome;
import evensun.scenario.Connection;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

class LadderTest {

  private static final Spectrum GLOBAL = Spectra.named("AM1.5G");
  private static final WavelengthGrid GRID = WavelengthGrid.of(300, 1200, 5);

  /** Random optics that keep the ledger: shares of two absorbers, one parasitic layer, R and T. */
  private static DeviceOptics optics(Random random) {
    double[] bins = GLOBAL.binsMaPerCm2(GRID);
    Map<String, List<Double>> rows = new LinkedHashMap<>();
    double[][] share = new double[5][bins.length];
    for (int w = 0; w < bins.length; w++) {
      double sum = 0;
      for (double[] row : share) {
        row[w] = random.nextDouble();
        sum += row[w];
      }
      for (double[] row : share) {
        row[w] /= sum;
      }
    }
    rows.put("contact", boxed(share[0]));
    rows.put("upper", boxed(share[1]));
    rows.put("lower", boxed(share[2]));
    List<SubcellOutcome> subcells = new ArrayList<>();
    for (int s = 1; s <= 2; s++) {
      double current = 0;
      for (int w = 0; w < bins.length; w++) {
        current += bins[w] * share[s][w];
      }
      String layer = s == 1 ? "upper" : "lower";
      subcells.add(new SubcellOutcome("s" + s, List.of(layer), null, current, null, null));
    }
    Spectral spectral =
        new Spectral(
            boxed(GRID.wavelengthNm()), boxed(bins), boxed(share[3]), boxed(share[4]), rows);
    return DeviceOptics.of(spectral, subcells);
  }

  private static List<Double> boxed(double[] values) {
    return Arrays.stream(values).boxed().toList();
  }

  private static List<SubcellParameters> subcells(double coupling) {
    return List.of(
        SubcellParameters.ideal("s1", 1.68)
            .withRecombination(0.02, 1.5)
            .withShunt(900)
            .withCollection(0.95)
            .withCoupling(coupling),
        SubcellParameters.ideal("s2", 1.12).withRecombination(0.01, 1));
  }

  private static double sum(List<LadderStep> ladder) {
    return ladder.stream().mapToDouble(LadderStep::efficiencyPercent).sum();
  }

  /** Witness: the device's own efficiency and the ledger of the light. */
  @ParameterizedTest
  @EnumSource(Connection.class)
  void stepsAddUpToTheDevice(Connection connection) {
    Random random = new Random(9);
    for (int i = 0; i < 20; i++) {
      DeviceOptics optics = optics(random);
      Electrical found =
          DeviceModel.of(
                  subcells(i % 2 == 0 ? 0 : 0.3),
                  DeviceParameters.of(connection).withSeriesResistance(2),
                  GLOBAL)
              .analyse(optics)
              .electrical();
      assertThat(sum(found.ladder())).isCloseTo(found.efficiencyPercent(), within(1e-12));
      double current =
          found.ladder().stream()
              .filter(step -> step.maPerCm2() != null)
              .mapToDouble(LadderStep::maPerCm2)
              .sum();
      var cells = found.subcells();
      double first = cells.get(0).collectedMaPerCm2();
      double second = cells.get(1).collectedMaPerCm2();
      double expected =
          connection == Connection.SERIES ? 2 * Math.min(first, second) : first + second;
      assertThat(current).isCloseTo(expected, within(1e-9));
    }
  }

  /** Witness: the detailed-balance limit itself, computed apart from the ladder. */
  @Test
  void startsAtTheLimitOfTheGaps() {
    Electrical limit =
        DetailedBalanceTest.ideal(GLOBAL, DeviceParameters.of(Connection.INDEPENDENT), 1.68, 1.12);
    List<LadderStep> ladder =
        DeviceModel.of(subcells(0), DeviceParameters.of(Connection.SERIES), GLOBAL)
            .analyse(optics(new Random(1)))
            .electrical()
            .ladder();
    assertThat(ladder.get(0).efficiencyPercent())
        .isCloseTo(limit.efficiencyPercent(), within(1e-9));
    assertThat(ladder)
        .extracting(LadderStep::label)
        .containsExactly(
            "detailed-balance limit of these gaps",
            "light outside the grid",
            "incomplete absorption",
            "parasitic absorption in contact",
            "reflection",
            "mismatch",
            "non-radiative recombination",
            "incomplete collection",
            "series and shunt resistance");
  }

  /** Witness: the photon current outside the grid, straight from the spectrum. */
  @Test
  void lightOutsideTheGridIsItsPhotonCurrent() {
    List<LadderStep> ladder =
        DeviceModel.of(subcells(0), DeviceParameters.of(Connection.INDEPENDENT), GLOBAL)
            .analyse(optics(new Random(1)))
            .electrical()
            .ladder();
    assertThat(ladder.get(1).maPerCm2())
        .isCloseTo(-GLOBAL.photonCurrentMaPerCm2(0, 300), within(1e-9));
  }

  /** Witness: the fill factor of ideal diodes is smallest near matching (from memory). */
  @Test
  void mismatchRaisesTheFillFactor() {
    List<SubcellParameters> ideal =
        List.of(SubcellParameters.ideal("top", 1.68), SubcellParameters.ideal("bottom", 1.12));
    List<MismatchPoint> cost =
        DeviceModel.of(ideal, DeviceParameters.of(Connection.SERIES), GLOBAL)
            .analyse(DeviceOptics.ofCurrents(20, 20))
            .electrical()
            .mismatchCost();
    MismatchPoint least = cost.get(0);
    MismatchPoint best = cost.get(0);
    for (MismatchPoint point : cost) {
      least = point.fillFactor() < least.fillFactor() ? point : least;
      best = point.efficiencyPercent() > best.efficiencyPercent() ? point : best;
    }
    assertThat(Math.abs(least.differenceMaPerCm2())).isLessThan(0.5);
    assertThat(Math.abs(best.differenceMaPerCm2())).isLessThan(0.5);
    assertThat(cost.get(0).fillFactor()).isGreaterThan(least.fillFactor() + 0.01);
    assertThat(cost.get(cost.size() - 1).fillFactor()).isGreaterThan(least.fillFactor() + 0.01);
  }
}
