package evensun.cli;

import evensun.material.Material;
import evensun.material.MaterialLibrary;
import evensun.material.MaterialRecord;
import evensun.material.Tuning;
import evensun.spi.Finding;
import java.util.List;
import java.util.Locale;
import tools.jackson.databind.json.JsonMapper;
import tools.jackson.databind.node.ArrayNode;
import tools.jackson.databind.node.ObjectNode;

/** The library as text, CSV and JSON. */
final class MaterialTexts {

  private static final JsonMapper JSON = JsonMapper.builder().build();
  private static final int HAZARD_WIDTH = 44;

  private MaterialTexts() {}

  /** A table, one line per material. */
  static String list(List<Material> materials, String kind) {
    int width = materials.stream().mapToInt(m -> m.record().name().length()).max().orElse(4);
    StringBuilder text = new StringBuilder();
    String form = "%-" + width + "s  %-11s  %-11s  %-11s  %-6s  %s%n";
    text.append(form.formatted("name", "kind", "gap eV", "range nm", "source", "hazard"));
    for (Material material : materials) {
      MaterialRecord record = material.record();
      text.append(
          form.formatted(
              record.name(),
              record.kind(),
              gap(material),
              range(record),
              record.fromMemory() ? "memory" : record.year() > 0 ? "" + record.year() : "-",
              cut(record.hazards().isEmpty() ? "-" : record.hazards().get(0))));
    }
    text.append(
        "%n%d materials%s. One in full: evensun materials NAME%n"
            .formatted(materials.size(), kind == null ? "" : " of kind " + kind));
    text.append("A short name stands for the first of its preparations (crystalline-silicon for ");
    text.append("crystalline-silicon.300-k);").append(System.lineSeparator());
    text.append("source: year of the paper; memory: written from memory, replace by your own.");
    return text.append(System.lineSeparator()).toString();
  }

  private static String gap(Material material) {
    if (material.tuning().isPresent()) {
      return String.format(
          Locale.ROOT,
          "%.2f-%.2f",
          material.tuning().get().lowEv(),
          material.tuning().get().highEv());
    }
    return material.bandgapEv().isPresent()
        ? String.format(Locale.ROOT, "%.3f", material.bandgapEv().getAsDouble())
        : "-";
  }

  private static String range(MaterialRecord record) {
    return String.format(
        Locale.ROOT,
        "%.0f-%s",
        record.fromNm(),
        record.toNm() >= 1e5 ? "any" : whole(record.toNm()));
  }

  private static String whole(double value) {
    return String.format(Locale.ROOT, "%.0f", value);
  }

  private static String cut(String sentence) {
    return sentence.length() <= HAZARD_WIDTH
        ? sentence
        : sentence.substring(0, sentence.lastIndexOf(' ', HAZARD_WIDTH)) + " …";
  }

  /** All there is to say about one material. */
  static String full(MaterialCurves curves) {
    MaterialRecord record = curves.material().record();
    StringBuilder text = new StringBuilder();
    line(text, record.name(), record.title());
    line(text, "  kind", record.kind() + (record.fromMemory() ? " (numbers from memory)" : ""));
    line(text, "  form", record.form());
    line(text, "  source", record.source());
    line(text, "  range", range(record) + " nm");
    line(text, "  measured at", String.format(Locale.ROOT, "%.0f K", record.temperatureK()));
    line(text, "  bandgap", gap(curves.material()) + " eV");
    record.notes().forEach(note -> line(text, "  note", note));
    record.hazards().forEach(hazard -> line(text, "  hazard", hazard));
    line(
        text,
        "  ",
        "safety data sheets, local rules and trained staff decide; this list is not complete");
    List<String> others = MaterialLibrary.builtIn().alternatives(record.name());
    if (!others.isEmpty()) {
      line(text, "  see also", String.join(", ", others));
    }
    for (Finding finding : curves.findings()) {
      line(text, "  finding", "[" + finding.code() + "] " + finding.message());
    }
    text.append("%n  %s%n".formatted(curves.label()));
    text.append("%14s %10s %12s %14s%n".formatted("wavelength nm", "n", "k", "alpha per cm"));
    for (int w = 0; w < curves.size(); w++) {
      if (Math.rint(curves.wavelengthNm().get(w) / 100) * 100 == curves.wavelengthNm().get(w)) {
        text.append(
            String.format(
                Locale.ROOT,
                "%14.0f %10.4f %12.4g %14.4g%n",
                curves.wavelengthNm().get(w),
                curves.n().get(w),
                curves.k().get(w),
                curves.alphaPerCm(w)));
      }
    }
    return text.append(System.lineSeparator()).toString();
  }

  private static void line(StringBuilder text, String key, String value) {
    text.append("%-13s %s%n".formatted(key, value));
  }

  /** Wavelength, n, k and absorption coefficient; '#' lines say what it is. */
  static String csv(List<MaterialCurves> shown) {
    StringBuilder text = new StringBuilder();
    for (MaterialCurves curves : shown) {
      MaterialRecord record = curves.material().record();
      text.append("# material: ").append(curves.label()).append('\n');
      text.append("# source: ").append(record.source()).append('\n');
      text.append("wavelength_nm,n,k,alpha_per_cm\n");
      for (int w = 0; w < curves.size(); w++) {
        text.append(
            String.format(
                Locale.ROOT,
                "%.6g,%.6g,%.6g,%.6g\n",
                curves.wavelengthNm().get(w),
                curves.n().get(w),
                curves.k().get(w),
                curves.alphaPerCm(w)));
      }
    }
    return text.toString();
  }

  /** The list as JSON. */
  static String json(List<Material> materials) {
    ArrayNode list = JSON.createArrayNode();
    materials.forEach(material -> list.add(fields(material)));
    return JSON.writeValueAsString(list) + "\n";
  }

  /** One material as JSON. */
  static String json(MaterialCurves curves) {
    ObjectNode node = fields(curves.material());
    ArrayNode nm = node.putArray("wavelengthNm");
    ArrayNode n = node.putArray("n");
    ArrayNode k = node.putArray("k");
    for (int w = 0; w < curves.size(); w++) {
      nm.add(curves.wavelengthNm().get(w));
      n.add(curves.n().get(w));
      k.add(curves.k().get(w));
    }
    return JSON.writeValueAsString(node) + "\n";
  }

  private static ObjectNode fields(Material material) {
    MaterialRecord record = material.record();
    ObjectNode node = JSON.createObjectNode();
    node.put("name", record.name());
    node.put("title", record.title());
    node.put("kind", record.kind());
    node.put("form", record.form());
    node.put("source", record.source());
    node.put("year", record.year());
    node.put("fromMemory", record.fromMemory());
    node.put("fromNm", record.fromNm());
    node.put("toNm", record.toNm());
    node.put("temperatureK", record.temperatureK());
    material.bandgapEv().ifPresent(ev -> node.put("bandgapEv", ev));
    material
        .tuning()
        .ifPresent(t -> node.putArray("bandgapRangeEv").add(t.lowEv()).add(t.highEv()));
    material
        .tuning()
        .flatMap(Tuning::composition)
        .ifPresent(c -> node.put("compositionFractionOf", c.element()));
    ArrayNode hazards = node.putArray("hazards");
    record.hazards().forEach(hazards::add);
    ArrayNode notes = node.putArray("notes");
    record.notes().forEach(notes::add);
    return node;
  }
}
