package evensun.scenario.reader;

import evensun.scenario.LightSpec;
import evensun.scenario.tree.Fields;
import evensun.scenario.tree.Interval;
import evensun.scenario.tree.Node;
import evensun.scenario.tree.Node.Mapping;
import evensun.scenario.tree.Values;
import evensun.spi.Polarisation;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;

/** Binds {@code light}. */
final class LightBinder {

  /** Spectra that come with the program. */
  private static final String[] SPECTRA = {"AM1.5G", "AM1.5D", "AM0"};

  private LightBinder() {}

  static LightSpec bind(Fields root) {
    root.require("light", "write light: {spectrum: AM1.5G}");
    Optional<Fields> light = root.section("light");
    if (light.isEmpty()) {
      return new LightSpec(
          "", Optional.empty(), Double.NaN, Polarisation.UNPOLARISED, root.place("light"));
    }
    Fields fields = light.get();
    Optional<String> table = table(fields);
    LightSpec spec =
        new LightSpec(
            table.isPresent() ? "" : spectrum(fields),
            table,
            fields.number("angleDeg", Interval.below(0, 90, "degrees")).orElse(0),
            fields.choice("polarisation", polarisations()).orElse(Polarisation.UNPOLARISED),
            fields.place("spectrum"));
    fields.finish();
    return spec;
  }

  private static Optional<String> table(Fields light) {
    light.require("spectrum", "AM1.5G, AM1.5D, AM0, or {table: file.csv}");
    Optional<Node> spectrum = light.node("spectrum");
    if (spectrum.isEmpty() || !(spectrum.get() instanceof Mapping mapping)) {
      return Optional.empty();
    }
    Fields fields = new Fields("light.spectrum", mapping, light.faults());
    Optional<String> table = fields.requiredText("table", "the name of a CSV file");
    fields.finish();
    return Optional.of(table.orElse(""));
  }

  private static String spectrum(Fields light) {
    Map<String, String> known = new LinkedHashMap<>();
    for (String name : SPECTRA) {
      known.put(name, name);
    }
    return light
        .node("spectrum")
        .flatMap(n -> Values.choice("light: spectrum", n, known, light.faults()))
        .orElse("");
  }

  private static Map<String, Polarisation> polarisations() {
    Map<String, Polarisation> choices = new LinkedHashMap<>();
    choices.put("unpolarised", Polarisation.UNPOLARISED);
    choices.put("s", Polarisation.S);
    choices.put("p", Polarisation.P);
    return choices;
  }
}
