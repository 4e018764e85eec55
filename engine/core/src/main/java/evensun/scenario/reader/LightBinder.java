package evensun.scenario.reader;

import evensun.light.SpectrumReader.Quantity;
import evensun.scenario.LightSpec;
import evensun.scenario.tree.Fields;
import evensun.scenario.tree.Interval;
import evensun.scenario.tree.Node;
import evensun.scenario.tree.Node.Mapping;
import evensun.scenario.tree.Values;
import evensun.spi.Polarisation;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;

/** Binds {@code light}. */
final class LightBinder {

  /** Spectra that come with the program. */
  private static final String[] SPECTRA = {
    "AM1.5G", "AM1.5D", "AM0", LightSpec.CLEAR_SKY, LightSpec.BLACKBODY
  };

  private LightBinder() {}

  static LightSpec bind(Fields root) {
    root.require("light", "write light: {spectrum: AM1.5G}");
    Optional<Fields> light = root.section("light");
    if (light.isEmpty()) {
      return new LightSpec(
          "", Optional.empty(), Double.NaN, Polarisation.UNPOLARISED, root.place("light"));
    }
    Fields fields = light.get();
    Optional<TableSource> table = table(fields);
    String spectrum = table.isPresent() ? "" : spectrum(fields);
    LightSpec spec =
        new LightSpec(
            spectrum,
            table.map(TableSource::path),
            table.flatMap(TableSource::quantity),
            SkyBinder.bind(fields, spectrum),
            temperature(fields, spectrum),
            fields.number("irradianceWPerM2", Interval.above(0, 1e8, "W per m²")),
            fields.number("concentrationSuns", Interval.above(0, 1e5, "suns")),
            fields.number("angleDeg", Interval.below(0, 90, "degrees")).orElse(0),
            fields.choice("polarisation", polarisations()).orElse(Polarisation.UNPOLARISED),
            diffuse(fields),
            fields.place("spectrum"));
    if (fields.has("irradianceWPerM2") && fields.has("concentrationSuns")) {
      fields.fault(
          fields.place("concentrationSuns"),
          "irradianceWPerM2 and concentrationSuns both scale the spectrum; keep one");
    }
    fields.finish();
    return spec;
  }

  private static boolean diffuse(Fields light) {
    boolean diffuse = light.flag("diffuse");
    if (diffuse) {
      for (String key : List.of("angleDeg", "polarisation")) {
        FeatureBinder.refuse(light, key, "says nothing about diffuse light");
      }
    }
    return diffuse;
  }

  private static OptionalDouble temperature(Fields fields, String spectrum) {
    if (spectrum.equals(LightSpec.BLACKBODY)) {
      return OptionalDouble.of(
          fields.requiredNumber("temperatureK", Interval.closed(100, 20000, "K")));
    }
    if (fields.has("temperatureK")) {
      fields.fault(fields.place("temperatureK"), "temperatureK belongs to spectrum: blackbody");
      fields.know("temperatureK");
    }
    return OptionalDouble.empty();
  }

  private record TableSource(String path, Optional<Quantity> quantity) {}

  private static Optional<TableSource> table(Fields light) {
    light.require("spectrum", "AM1.5G, AM1.5D, AM0, clear-sky, blackbody, or {table: file.csv}");
    Optional<Node> spectrum = light.node("spectrum");
    if (spectrum.isEmpty() || !(spectrum.get() instanceof Mapping mapping)) {
      return Optional.empty();
    }
    Fields fields = new Fields("light.spectrum", mapping, light.faults());
    Optional<String> table = fields.requiredText("table", "the name of a CSV file");
    Map<String, Quantity> quantities = new LinkedHashMap<>();
    for (Quantity quantity : Quantity.values()) {
      quantities.put(quantity.key(), quantity);
    }
    Optional<Quantity> quantity = fields.choice("quantity", quantities);
    fields.finish();
    return Optional.of(new TableSource(table.orElse(""), quantity));
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
