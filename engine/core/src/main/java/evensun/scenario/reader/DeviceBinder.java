package evensun.scenario.reader;

import evensun.scenario.DeviceSpec;
import evensun.scenario.Saturation;
import evensun.scenario.tree.Fields;
import evensun.scenario.tree.Interval;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;

/** Binds {@code device}. */
final class DeviceBinder {

  private static final Interval RESISTANCE = Interval.closed(0, 1000, "Ω cm²");
  private static final Interval TEMPERATURE = Interval.closed(50, 1000, "K");

  private DeviceBinder() {}

  static DeviceSpec bind(Fields root) {
    Optional<Fields> device = root.section("device");
    if (device.isEmpty()) {
      return DeviceSpec.byDefault(root.place("device"));
    }
    Fields fields = device.get();
    Map<String, Saturation> choices = new LinkedHashMap<>();
    choices.put("automatic", Saturation.AUTOMATIC);
    choices.put("step-edge", Saturation.STEP_EDGE);
    choices.put("reciprocity", Saturation.RECIPROCITY);
    DeviceSpec spec =
        new DeviceSpec(
            fields.number("seriesResistanceOhmCm2", RESISTANCE).orElse(0),
            fields.number("temperatureK", TEMPERATURE).orElse(DeviceSpec.TEMPERATURE_K),
            fields.choice("saturation", choices).orElse(Saturation.AUTOMATIC),
            fields.place());
    fields.finish();
    return spec;
  }
}
