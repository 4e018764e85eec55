package evensun.scenario;

/**
 * What a scenario says about the electrical side of the whole device.
 *
 * @param seriesResistanceOhmCm2 series resistance in Ω cm², at least 0
 * @param temperatureK cell temperature in K, in [50, 1000]
 * @param saturation where the radiative saturation currents come from
 * @param place where it stands
 */
public record DeviceSpec(
    double seriesResistanceOhmCm2, double temperatureK, Saturation saturation, Place place) {

  /** Cell temperature where none is written, in K. */
  public static final double TEMPERATURE_K = 298.15;

  /** Nothing said. */
  public static DeviceSpec byDefault(Place place) {
    return new DeviceSpec(0, TEMPERATURE_K, Saturation.AUTOMATIC, place);
  }
}
