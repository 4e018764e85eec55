package evensun.device;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import evensun.light.Spectra;
import evensun.light.Spectrum;
import evensun.result.DepthLayer;
import evensun.scenario.Connection;
import evensun.scenario.Scenario;
import evensun.scenario.Source;
import evensun.scenario.reader.ScenarioReader;
import evensun.spi.Finding;
import java.nio.file.Path;
import java.util.List;
import org.jspecify.annotations.Nullable;
import org.junit.jupiter.api.Test;

class ScenarioDeviceTest {

  private static final Spectrum GLOBAL = Spectra.named("AM1.5G");
  private static final List<String> MATERIALS =
      List.of("lead-halide-perovskite", "crystalline-silicon");
  private static final double[] GAPS = {1.68, 1.12};

  private static Scenario scenario(String top, String rest) {
    String text =
        """
        evensun: 1
        title: Tandem
        light: {spectrum: AM1.5G}
        grid: {fromNm: 300, toNm: 1200, stepNm: 5}
        stack:
          - {medium: air}
          - {name: perovskite, material: lead-halide-perovskite, bandgapEv: 1.68, thicknessNm: 500}
          - {name: wafer, material: crystalline-silicon, thicknessNm: 180000, coherence: incoherent}
          - {name: mirror, material: silver}
        subcells:
          - {name: top, absorbers: [perovskite]%s}
          - {name: bottom, absorbers: [wafer]}
        connection: series
        %s
        """
            .formatted(top, rest);
    return ScenarioReader.read(new Source("tandem.yaml", Path.of("."), text));
  }

  private static ScenarioDevice device(Scenario scenario, @Nullable List<DepthLayer> depth) {
    return ScenarioDevice.of(scenario, MATERIALS, GAPS, GLOBAL, depth).orElseThrow();
  }

  /** Witness: the table of usual values; a result needs none of the electrical keys. */
  @Test
  void defaultsGiveACurveAndSaySo() {
    ScenarioDevice device = device(scenario("", ""), null);
    assertThat(device.findings())
        .extracting(Finding::code)
        .containsOnly("radiative-efficiency-assumed")
        .hasSize(2);
    assertThat(device.findings().get(0).message())
        .startsWith(
            "an external radiative efficiency of 0.01 with ideality 1.5 is assumed, usual for"
                + " lead-halide perovskite");
    var found = device.model().analyse(DeviceOptics.ofCurrents(19, 20)).electrical();
    assertThat(found.connection()).isEqualTo("series");
    assertThat(found.temperatureK()).isEqualTo(298.15);
    assertThat(found.curve()).hasSizeGreaterThan(100);
    assertThat(found.vocV()).isBetween(1.9, 2.1);
  }

  @Test
  void writtenValuesCount() {
    ScenarioDevice device =
        device(
            scenario(
                ", externalRadiativeEfficiency: 0.05, idealityFactor: 1.3, shuntOhmCm2: 2000,"
                    + " collectionFraction: 0.97, reverseBreakdownV: 5,"
                    + " luminescentCouplingFraction: 0.1",
                "device: {seriesResistanceOhmCm2: 1.5, temperatureK: 320, saturation: step-edge}"),
            null);
    assertThat(device.model().subcells().get(0))
        .isEqualTo(new SubcellParameters("top", 1.68, 0.05, 1.3, 2000, 0.97, 5, 0.1));
    var found = device.model().analyse(DeviceOptics.ofCurrents(19, 20)).electrical();
    assertThat(found.temperatureK()).isEqualTo(320);
    assertThat(found.pairing()).isEqualTo(Pairing.STEP_EDGE);
  }

  /** Witness: tanh(d/L)/(d/L) for even generation. */
  @Test
  void aDiffusionLengthBecomesACollectedPart() {
    Scenario scenario = scenario(", diffusionLengthNm: 500, collectingFace: rear", "");
    List<Double> depth = List.of(0.0, 100.0, 200.0, 300.0, 400.0, 500.0);
    DepthLayer even = new DepthLayer("perovskite", depth, depth.stream().map(z -> 1.0).toList());
    assertThat(device(scenario, List.of(even)).model().subcells().get(0).collectionFraction())
        .isCloseTo(Math.tanh(1), within(3e-3));
    ScenarioDevice without = device(scenario, null);
    assertThat(without.model().subcells().get(0).collectionFraction()).isEqualTo(1);
    assertThat(without.findings()).extracting(Finding::code).contains("collection-without-depth");
  }

  @Test
  void anAbsorberWithoutAGapHasNoVoltage() {
    assertThat(ScenarioDevice.of(scenario("", ""), MATERIALS, new double[] {1.68, 0}, GLOBAL, null))
        .isEmpty();
  }

  /** Odd but possible inputs give a finding and a defined result. */
  @Test
  void oddDevicesAreFindings() {
    DeviceModel model = device(scenario("", ""), null).model();
    assertThat(codes(model.analyse(DeviceOptics.ofCurrents(0, 20)))).contains("dark-subcell");
    assertThat(codes(model.analyse(DeviceOptics.ofCurrents(0, 0)))).contains("dark-device");
    DeviceAnalysis upsideDown =
        DeviceModel.of(
                List.of(SubcellParameters.ideal("a", 1.1), SubcellParameters.ideal("b", 1.7)),
                DeviceParameters.of(Connection.SERIES),
                GLOBAL)
            .analyse(DeviceOptics.ofCurrents(40, 1));
    assertThat(codes(upsideDown)).contains("gap-order");
    DeviceAnalysis tooGood =
        DeviceModel.of(
                List.of(SubcellParameters.ideal("a", 1.7)),
                DeviceParameters.of(Connection.SERIES),
                GLOBAL)
            .analyse(DeviceOptics.ofCurrents(30));
    assertThat(codes(tooGood)).contains("power-above-limit");
    DeviceAnalysis reverse =
        DeviceModel.of(
                List.of(
                    SubcellParameters.ideal("a", 1.7).withBreakdown(0.3),
                    SubcellParameters.ideal("b", 1.1)),
                DeviceParameters.of(Connection.SERIES),
                GLOBAL)
            .analyse(DeviceOptics.ofCurrents(2, 20));
    assertThat(codes(reverse)).contains("subcell-in-reverse");
  }

  private static List<String> codes(DeviceAnalysis analysis) {
    assertThat(analysis.electrical().efficiencyPercent()).isFinite().isNotNegative();
    return analysis.findings().stream().map(Finding::code).toList();
  }
}
