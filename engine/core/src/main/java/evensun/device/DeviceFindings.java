package evensun.device;

import evensun.result.Electrical;
import evensun.result.Electrical.SubcellElectrical;
import evensun.scenario.Connection;
import evensun.spi.Finding;
import evensun.spi.Severity;
import java.util.ArrayList;
import java.util.List;

/** What is odd about a device, or speaks against its numbers. */
final class DeviceFindings {

  private static final double DARK_MA_PER_CM2 = 1e-3;
  private static final double ROUNDING = 1e-6;

  private DeviceFindings() {}

  static List<Finding> of(DeviceState state, DeviceOptics optics, Electrical electrical) {
    List<Finding> findings = new ArrayList<>();
    dark(electrical, findings);
    order(state, findings);
    limits(electrical, findings);
    if (optics.hasSpectra()) {
      openCircuits(state, optics, electrical, findings);
    }
    reverse(electrical, findings);
    return findings;
  }

  private static void dark(Electrical electrical, List<Finding> findings) {
    long dark =
        electrical.subcells().stream().filter(s -> s.collectedMaPerCm2() < DARK_MA_PER_CM2).count();
    if (dark == electrical.subcells().size()) {
      findings.add(
          new Finding(
              "dark-device",
              Severity.SERIOUS,
              "device",
              "no subcell collects any light: the device delivers nothing"));
      return;
    }
    for (SubcellElectrical subcell : electrical.subcells()) {
      if (subcell.collectedMaPerCm2() < DARK_MA_PER_CM2) {
        findings.add(
            new Finding(
                "dark-subcell",
                Severity.SERIOUS,
                subcell.name(),
                electrical.connection().equals("series")
                    ? "it collects no light and blocks the current of the whole device"
                    : "it collects no light and delivers nothing"));
      }
    }
  }

  private static void order(DeviceState state, List<Finding> findings) {
    for (int i = 1; i < state.subcells().size(); i++) {
      SubcellParameters above = state.subcells().get(i - 1);
      SubcellParameters below = state.subcells().get(i);
      if (below.bandgapEv() >= above.bandgapEv()) {
        findings.add(
            new Finding(
                "gap-order",
                Severity.WARNING,
                below.name(),
                "its bandgap of %.3f eV is not below the %.3f eV of %s, which the light meets first"
                    .formatted(below.bandgapEv(), above.bandgapEv(), above.name())));
      }
    }
  }

  private static void limits(Electrical electrical, List<Finding> findings) {
    double limit = electrical.ladder().get(0).efficiencyPercent();
    if (electrical.efficiencyPercent() > limit + ROUNDING) {
      findings.add(
          new Finding(
              "power-above-limit",
              Severity.SERIOUS,
              "device",
              "%.2f %% is above the detailed-balance limit of these gaps, %.2f %%: a bandgap is not that of the absorption"
                  .formatted(electrical.efficiencyPercent(), limit)));
    }
  }

  /** The emission over the grid is a lower bound, so its open circuit is an upper one. */
  private static void openCircuits(
      DeviceState state, DeviceOptics optics, Electrical electrical, List<Finding> findings) {
    double temperatureK = state.device().temperatureK();
    for (int i = 0; i < optics.subcellCount(); i++) {
      SubcellElectrical subcell = electrical.subcells().get(i);
      double emitted = Reciprocity.saturationMaPerCm2(optics, i, temperatureK);
      double limit =
          BlackBody.thermalVoltageV(temperatureK)
              * Math.log1p(subcell.collectedMaPerCm2() / emitted);
      if (emitted > 0 && subcell.vocV() > limit + ROUNDING) {
        findings.add(
            new Finding(
                "voc-above-radiative-limit",
                Severity.WARNING,
                subcell.name(),
                "its open circuit of %.3f V is above the %.3f V that its own absorptance allows"
                    .formatted(subcell.vocV(), limit)));
      }
    }
  }

  private static void reverse(Electrical electrical, List<Finding> findings) {
    if (!electrical
        .connection()
        .equals(Connection.SERIES.name().toLowerCase(java.util.Locale.ROOT))) {
      return;
    }
    for (SubcellElectrical subcell : electrical.subcells()) {
      boolean lit = subcell.collectedMaPerCm2() >= DARK_MA_PER_CM2;
      if (lit && subcell.operatingVoltageV() < 0) {
        findings.add(
            new Finding(
                "subcell-in-reverse",
                Severity.WARNING,
                subcell.name(),
                "at maximum power it is driven to %.2f V and consumes power"
                    .formatted(subcell.operatingVoltageV())));
      }
    }
  }
}
