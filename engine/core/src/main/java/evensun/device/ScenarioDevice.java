package evensun.device;

import evensun.light.Spectrum;
import evensun.result.DepthLayer;
import evensun.scenario.DiodeSpec;
import evensun.scenario.Scenario;
import evensun.scenario.SubcellSpec;
import evensun.spi.Finding;
import evensun.spi.Severity;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.jspecify.annotations.Nullable;

/**
 * The electrical side as a scenario describes it, with defaults for what it leaves out.
 *
 * @param model the device
 * @param findings which defaults were taken
 */
public record ScenarioDevice(DeviceModel model, List<Finding> findings) {

  public ScenarioDevice {
    findings = List.copyOf(findings);
  }

  /**
   * The device of a scenario.
   *
   * @param scenario the scenario
   * @param absorberMaterial [subcell] material of the first absorber of each subcell
   * @param bandgapEv [subcell] bandgap in eV, 0 where the absorber has none
   * @param spectrum the light
   * @param depth generation against depth by layer, or null when the solver offers none
   * @return empty when a subcell has no bandgap, and so no voltage
   */
  public static Optional<ScenarioDevice> of(
      Scenario scenario,
      List<String> absorberMaterial,
      double[] bandgapEv,
      Spectrum spectrum,
      @Nullable List<DepthLayer> depth) {
    List<SubcellParameters> subcells = new ArrayList<>();
    List<Finding> findings = new ArrayList<>();
    for (int i = 0; i < scenario.subcells().size(); i++) {
      if (!(bandgapEv[i] > 0)) {
        return Optional.empty();
      }
      SubcellSpec spec = scenario.subcells().get(i);
      double collected = collected(spec, depth, findings);
      subcells.add(subcell(spec, bandgapEv[i], absorberMaterial.get(i), collected, findings));
    }
    DeviceParameters device =
        new DeviceParameters(
            scenario.connection(),
            scenario.device().seriesResistanceOhmCm2(),
            scenario.device().temperatureK(),
            scenario.device().saturation(),
            scenario.light().concentrationSuns().orElse(1));
    return subcells.isEmpty() || !(spectrum.totalWPerM2() > 0)
        ? Optional.empty()
        : Optional.of(new ScenarioDevice(DeviceModel.of(subcells, device, spectrum), findings));
  }

  private static SubcellParameters subcell(
      SubcellSpec spec,
      double bandgapEv,
      String material,
      double collected,
      List<Finding> findings) {
    DiodeSpec diode = spec.diode();
    RecombinationDefaults.Usual usual = RecombinationDefaults.of(material);
    double coupling = diode.luminescentCouplingFraction().orElse(0);
    double efficiency =
        diode.externalRadiativeEfficiency().orElse(Math.min(usual.efficiency(), 1 - coupling));
    double ideality = diode.idealityFactor().orElse(usual.ideality());
    if (diode.externalRadiativeEfficiency().isEmpty()) {
      findings.add(assumed(spec.name(), usual, efficiency, ideality));
    }
    return new SubcellParameters(
        spec.name(),
        bandgapEv,
        efficiency,
        ideality,
        diode.shuntOhmCm2().orElse(Double.POSITIVE_INFINITY),
        collected,
        diode.reverseBreakdownV().orElse(Double.POSITIVE_INFINITY),
        coupling);
  }

  private static Finding assumed(
      String subcell, RecombinationDefaults.Usual usual, double efficiency, double ideality) {
    return new Finding(
        "radiative-efficiency-assumed",
        Severity.NOTE,
        subcell,
        "an external radiative efficiency of %s with ideality %s is assumed, usual for %s; set externalRadiativeEfficiency from a measurement"
            .formatted(plain(efficiency), plain(ideality), usual.kind()));
  }

  private static String plain(double value) {
    return java.math.BigDecimal.valueOf(value).stripTrailingZeros().toPlainString();
  }

  private static double collected(
      SubcellSpec spec, @Nullable List<DepthLayer> depth, List<Finding> findings) {
    DiodeSpec diode = spec.diode();
    if (diode.diffusionLengthNm().isEmpty() || diode.collectingFace().isEmpty()) {
      return diode.collectionFraction().orElse(1);
    }
    List<DepthLayer> layers =
        depth == null
            ? List.of()
            : depth.stream().filter(layer -> spec.absorbers().contains(layer.layer())).toList();
    if (layers.size() < spec.absorbers().size()) {
      findings.add(
          new Finding(
              "collection-without-depth",
              Severity.WARNING,
              spec.name(),
              "the solver gives no generation against depth for it, so its diffusion length is not used and everything is collected"));
      return 1;
    }
    return CollectionProfile.fraction(
        layers, diode.diffusionLengthNm().getAsDouble(), diode.collectingFace().get());
  }
}
