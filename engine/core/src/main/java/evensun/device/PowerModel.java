package evensun.device;

import java.util.List;

/**
 * Efficiency from photocurrents and bandgaps alone, for a search; a smooth function of both.
 *
 * <p>Saturation currents come from the step edge of each bandgap. One worker belongs to one thread
 * and allocates nothing per call.
 */
public final class PowerModel {

  private final List<SubcellParameters> subcells;
  private final double temperatureK;
  private final double thermalV;
  private final double irradianceWPerM2;
  private final Circuit circuit;

  /**
   * A worker.
   *
   * @param subcells in the order the light meets them, at least one
   * @param device the whole device
   * @param irradianceWPerM2 incident irradiance of the whole spectrum in W m⁻², greater than 0
   */
  public PowerModel(
      List<SubcellParameters> subcells, DeviceParameters device, double irradianceWPerM2) {
    if (subcells.isEmpty()) {
      throw new IllegalArgumentException("a device needs at least one subcell");
    }
    if (!(irradianceWPerM2 > 0)) {
      throw new IllegalArgumentException(
          "irradiance must be greater than 0 W m⁻² but was " + irradianceWPerM2);
    }
    this.subcells = List.copyOf(subcells);
    this.temperatureK = device.temperatureK();
    this.thermalV = BlackBody.thermalVoltageV(temperatureK);
    this.irradianceWPerM2 = irradianceWPerM2;
    this.circuit = Circuits.of(this.subcells, device);
  }

  /**
   * Efficiency at maximum power.
   *
   * @param photocurrentMaPerCm2 [subcell] absorbed light in mA cm⁻², before collection; negative
   *     counts as 0
   * @param bandgapEv [subcell] bandgaps in eV, greater than 0
   * @return percent of the incident irradiance, at least 0
   */
  public double efficiencyPercent(double[] photocurrentMaPerCm2, double[] bandgapEv) {
    for (int i = 0; i < bandgapEv.length; i++) {
      SubcellParameters subcell = subcells.get(i);
      double collected = Math.max(0, photocurrentMaPerCm2[i]) * subcell.collectionFraction();
      double radiative = BlackBody.aboveMaPerCm2(bandgapEv[i], temperatureK);
      Circuits.set(circuit.diodes[i], subcell, thermalV, radiative, collected);
      circuit.photocurrent[i] = collected;
    }
    circuit.maximise();
    return percent(circuit.power, irradianceWPerM2);
  }

  /** Efficiency in percent of a power in mW cm⁻² (1 mW cm⁻² is 10 W m⁻²). */
  static double percent(double powerMwPerCm2, double irradianceWPerM2) {
    return 1000 * powerMwPerCm2 / irradianceWPerM2;
  }
}
