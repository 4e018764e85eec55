package evensun.device;

import java.util.List;

/**
 * Efficiency from photocurrents and bandgaps or saturation currents alone, for a search; a smooth
 * function of them.
 *
 * <p>Saturation currents come from the step edge of each bandgap, or are given. One worker belongs
 * to one thread and allocates nothing per call.
 */
public final class PowerModel {

  private final List<SubcellParameters> subcells;
  private final double temperatureK;
  private final double thermalV;
  private final double irradianceWPerM2;
  private final double suns;
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
    this.suns = device.suns();
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
      set(
          i,
          collected(photocurrentMaPerCm2, i),
          BlackBody.aboveMaPerCm2(bandgapEv[i], temperatureK));
    }
    circuit.maximise();
    return percent(circuit.power, irradianceWPerM2);
  }

  /**
   * Efficiency at maximum power with saturation currents of the subcells' own absorptance.
   *
   * @param photocurrentMaPerCm2 [subcell] absorbed light in mA cm⁻², before collection; negative
   *     counts as 0
   * @param saturationMaPerCm2 [subcell] radiative saturation currents in mA cm⁻²; an absorber that
   *     takes nothing has none
   * @return percent of the incident irradiance, at least 0
   */
  public double reciprocalEfficiencyPercent(
      double[] photocurrentMaPerCm2, double[] saturationMaPerCm2) {
    for (int i = 0; i < saturationMaPerCm2.length; i++) {
      set(
          i,
          collected(photocurrentMaPerCm2, i),
          Math.max(Double.MIN_NORMAL, saturationMaPerCm2[i]));
    }
    circuit.maximise();
    return percent(circuit.power, irradianceWPerM2);
  }

  private double collected(double[] photocurrentMaPerCm2, int i) {
    return Math.max(0, photocurrentMaPerCm2[i]) * subcells.get(i).collectionFraction();
  }

  /**
   * Efficiency at maximum power for given saturation currents.
   *
   * @param collectedMaPerCm2 [subcell] collected currents in mA cm⁻², at least 0
   * @param saturationMaPerCm2 [subcell] radiative saturation currents in mA cm⁻², greater than 0
   * @return percent of the incident irradiance, at least 0
   */
  public double efficiencyPercentAt(double[] collectedMaPerCm2, double[] saturationMaPerCm2) {
    for (int i = 0; i < saturationMaPerCm2.length; i++) {
      set(i, collectedMaPerCm2[i], saturationMaPerCm2[i]);
    }
    circuit.maximise();
    return percent(circuit.power, irradianceWPerM2);
  }

  private void set(int i, double collected, double radiative) {
    Circuits.set(circuit.diodes[i], subcells.get(i), thermalV, radiative, collected / suns);
    circuit.photocurrent[i] = collected;
  }

  /** Efficiency in percent of a power in mW cm⁻² (1 mW cm⁻² is 10 W m⁻²). */
  static double percent(double powerMwPerCm2, double irradianceWPerM2) {
    return 1000 * powerMwPerCm2 / irradianceWPerM2;
  }
}
