package evensun.device;

import java.util.List;

/**
 * Everything that fixes a device's curve: photocurrents, saturation currents, and the light under
 * which the radiative efficiencies hold.
 *
 * @param subcells in the order the light meets them
 * @param device the whole device
 * @param saturation radiative saturation current of each subcell in mA cm⁻²
 * @param oneSun collected current of each subcell under one sun in mA cm⁻², which fixes the
 *     non-radiative branch
 * @param irradianceWPerM2 incident irradiance in W m⁻²
 */
record DeviceState(
    List<SubcellParameters> subcells,
    DeviceParameters device,
    List<Double> saturation,
    List<Double> oneSun,
    double irradianceWPerM2) {

  DeviceState {
    subcells = List.copyOf(subcells);
    saturation = List.copyOf(saturation);
    oneSun = List.copyOf(oneSun);
  }

  DeviceState withDevice(DeviceParameters other) {
    return new DeviceState(subcells, other, saturation, oneSun, irradianceWPerM2);
  }

  DeviceState withSubcells(List<SubcellParameters> others) {
    return new DeviceState(others, device, saturation, oneSun, irradianceWPerM2);
  }

  DeviceState withSaturation(List<Double> others) {
    return new DeviceState(subcells, device, others, oneSun, irradianceWPerM2);
  }

  DeviceState withOneSun(List<Double> others) {
    return new DeviceState(subcells, device, saturation, others, irradianceWPerM2);
  }

  /** A circuit of this device under {@code collected} currents in mA cm⁻². */
  Circuit circuit(double[] collected) {
    Circuit circuit = Circuits.of(subcells, device);
    double thermalV = BlackBody.thermalVoltageV(device.temperatureK());
    for (int i = 0; i < collected.length; i++) {
      Circuits.set(circuit.diodes[i], subcells.get(i), thermalV, saturation.get(i), oneSun.get(i));
      circuit.photocurrent[i] = collected[i];
    }
    return circuit;
  }

  /** The circuit at its maximum power. */
  Circuit atMaximum(double[] collected) {
    Circuit circuit = circuit(collected);
    circuit.maximise();
    return circuit;
  }

  /** Efficiency at maximum power in percent. */
  double efficiencyPercent(double[] collected) {
    return PowerModel.percent(atMaximum(collected).power, irradianceWPerM2);
  }

  /** What the subcells collect of the light they absorb, mA cm⁻². */
  double[] collected(double[] photocurrent) {
    double[] collected = new double[photocurrent.length];
    for (int i = 0; i < collected.length; i++) {
      collected[i] = Math.max(0, photocurrent[i]) * subcells.get(i).collectionFraction();
    }
    return collected;
  }
}
