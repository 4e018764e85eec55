package evensun.device;

import evensun.light.Constants;
import evensun.scenario.Connection;
import evensun.scenario.Saturation;

/**
 * The electrical side of the whole device.
 *
 * @param connection how the subcells are connected
 * @param seriesResistanceOhmCm2 series resistance in Ω cm², at least 0: of the two terminals; with
 *     independent subcells it lies in the circuit of each
 * @param temperatureK temperature in K, in [50, 1000]
 * @param saturation where the radiative saturation currents come from
 * @param suns concentration of the light, greater than 0; radiative efficiencies hold at one sun
 */
public record DeviceParameters(
    Connection connection,
    double seriesResistanceOhmCm2,
    double temperatureK,
    Saturation saturation,
    double suns) {

  /** Lowest temperature at which saturation currents are still ordinary numbers, in K. */
  public static final double LOWEST_TEMPERATURE_K = 50;

  /** Highest temperature in K. */
  public static final double HIGHEST_TEMPERATURE_K = 1000;

  public DeviceParameters {
    if (!(seriesResistanceOhmCm2 >= 0) || Double.isInfinite(seriesResistanceOhmCm2)) {
      throw new IllegalArgumentException(
          "seriesResistanceOhmCm2 must be at least 0 Ω cm² but was " + seriesResistanceOhmCm2);
    }
    if (!(temperatureK >= LOWEST_TEMPERATURE_K && temperatureK <= HIGHEST_TEMPERATURE_K)) {
      throw new IllegalArgumentException(
          "temperatureK must be in [50, 1000] K but was " + temperatureK);
    }
    if (!(suns > 0) || Double.isInfinite(suns)) {
      throw new IllegalArgumentException("suns must be greater than 0 but was " + suns);
    }
  }

  /** Without resistance, at 298.15 K. */
  public static DeviceParameters of(Connection connection) {
    return new DeviceParameters(
        connection, 0, Constants.CELL_TEMPERATURE_K, Saturation.AUTOMATIC, 1);
  }

  /** The same with another connection. */
  public DeviceParameters withConnection(Connection other) {
    return new DeviceParameters(other, seriesResistanceOhmCm2, temperatureK, saturation, suns);
  }

  /** The same with another series resistance in Ω cm². */
  public DeviceParameters withSeriesResistance(double ohmCm2) {
    return new DeviceParameters(connection, ohmCm2, temperatureK, saturation, suns);
  }

  /** The same at another temperature in K. */
  public DeviceParameters withTemperature(double kelvin) {
    return new DeviceParameters(connection, seriesResistanceOhmCm2, kelvin, saturation, suns);
  }

  /** The same under concentrated light. */
  public DeviceParameters withSuns(double factor) {
    return new DeviceParameters(
        connection, seriesResistanceOhmCm2, temperatureK, saturation, factor);
  }

  /** The same with saturation currents from elsewhere. */
  public DeviceParameters withSaturation(Saturation other) {
    return new DeviceParameters(connection, seriesResistanceOhmCm2, temperatureK, other, suns);
  }
}
