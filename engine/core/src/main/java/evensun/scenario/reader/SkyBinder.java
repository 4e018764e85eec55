package evensun.scenario.reader;

import evensun.light.SkyConditions;
import evensun.scenario.LightSpec;
import evensun.scenario.tree.Fields;
import evensun.scenario.tree.Interval;
import java.util.List;
import java.util.Optional;

/** Binds the keys of {@code spectrum: clear-sky}; what is not written is as in the reference. */
final class SkyBinder {

  private static final List<String> KEYS =
      List.of(
          "airMass",
          "solarZenithDeg",
          "ozoneCm",
          "precipitableWaterCm",
          "aerosolDepth500Nm",
          "pressureHpa",
          "groundAlbedoFraction",
          "tiltDeg");

  private SkyBinder() {}

  static Optional<SkyConditions> bind(Fields light, String spectrum) {
    if (!spectrum.equals(LightSpec.CLEAR_SKY)) {
      for (String key : KEYS) {
        if (light.has(key)) {
          light.fault(light.place(key), "" + key + " belongs to spectrum: clear-sky");
          light.know(key);
        }
      }
      return Optional.empty();
    }
    int before = light.faults().count();
    double airMass = airMass(light);
    SkyConditions usual = SkyConditions.REFERENCE;
    double ozone = number(light, "ozoneCm", 0, 1, "cm", usual.ozoneCm());
    double water = number(light, "precipitableWaterCm", 0, 20, "cm", usual.precipitableWaterCm());
    double depth = number(light, "aerosolDepth500Nm", 0, 3, "", usual.aerosolDepth500Nm());
    double pressure = number(light, "pressureHpa", 100, 1100, "hPa", usual.pressureHpa());
    double albedo = number(light, "groundAlbedoFraction", 0, 1, "", usual.groundAlbedoFraction());
    double tilt = number(light, "tiltDeg", 0, 90, "degrees", usual.tiltDeg());
    return light.faults().count() > before
        ? Optional.empty()
        : Optional.of(new SkyConditions(airMass, ozone, water, depth, pressure, albedo, tilt));
  }

  private static double airMass(Fields light) {
    boolean both = light.has("airMass") && light.has("solarZenithDeg");
    double airMass = number(light, "airMass", 0, 38, "", SkyConditions.REFERENCE.airMass());
    if (airMass > 0 && airMass < 1) {
      light.fault(
          light.place("airMass"),
          "airMass must be 0 (outside the atmosphere) or in [1, 38] but was " + airMass);
    }
    double zenith = number(light, "solarZenithDeg", 0, 89, "degrees", Double.NaN);
    if (both) {
      light.fault(
          light.place("solarZenithDeg"),
          "airMass and solarZenithDeg say the same in two ways; keep one");
    }
    return light.has("solarZenithDeg") && !Double.isNaN(zenith)
        ? Math.max(1, SkyConditions.airMass(zenith))
        : airMass;
  }

  private static double number(
      Fields light, String key, double low, double high, String unit, double otherwise) {
    return light.number(key, Interval.closed(low, high, unit)).orElse(otherwise);
  }
}
