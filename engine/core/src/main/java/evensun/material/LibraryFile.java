package evensun.material;

import evensun.data.DataFile;
import evensun.material.table.Bandgap;
import evensun.material.table.OpticalTable;
import evensun.spi.Finding;
import evensun.spi.Severity;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/** Makes materials of the program's own data files. */
final class LibraryFile {

  private LibraryFile() {}

  static MaterialRecord record(String resource) {
    return record(DataFile.header(LibraryFile.class, resource));
  }

  /** Whether the data are another doping or composition than those of the same family. */
  static boolean isDistinct(String resource) {
    return DataFile.header(LibraryFile.class, resource).value("distinct").isPresent();
  }

  static Material material(String resource) {
    DataFile file = DataFile.resource(LibraryFile.class, resource);
    MaterialRecord record = record(file);
    return switch (file.value("model").orElse("table")) {
      case "table" -> table(file, record);
      case "constant" -> constant(file, record);
      case "sum" -> ModelMaterial.of(record, LibraryTerms.dispersion(file), gap(file));
      case "moved-edge" -> tunable(file, record, MovedEdge.load(file.values("anchor")));
      case "alloy" -> tunable(file, record, Alloy.load(file.required("shape")));
      case "ideal" -> ideal(file, record);
      default -> throw new IllegalStateException("unknown model in " + resource);
    };
  }

  private static MaterialRecord record(DataFile file) {
    double[] range = DataFile.numbersIn(file.value("range-nm").orElse("100,100000"));
    List<String> notes = new ArrayList<>();
    for (String key : List.of("cleaned", "extended", "bandgap-note", "note")) {
      String lead = key.equals("cleaned") || key.equals("extended") ? key + " " : "";
      for (String value : file.values(key)) {
        notes.add(lead.concat(value));
      }
    }
    for (String value : file.values("largest-interpolation-error")) {
      notes.add("largest interpolation error: ".concat(value));
    }
    return new MaterialRecord(
        file.required("name"),
        file.required("title"),
        file.required("kind"),
        file.required("form"),
        file.required("source"),
        Integer.parseInt(file.required("year")),
        range[0],
        range[1],
        Double.parseDouble(file.required("temperature-k")),
        file.value("from-memory").isPresent(),
        file.values("hazard"),
        notes,
        examined(file));
  }

  /** Findings as the header holds them: code, severity, sentence. */
  private static List<Finding> examined(DataFile file) {
    List<Finding> findings = new ArrayList<>();
    for (String value : file.values("examined")) {
      String[] parts = value.split(",", 3);
      String examinedCode = parts[0];
      findings.add(
          new Finding(examinedCode, Severity.valueOf(parts[1]), file.required("name"), parts[2]));
    }
    return findings;
  }

  private static Material table(DataFile file, MaterialRecord record) {
    OpticalTable table = OpticalTable.of(file.column(0), file.column(1), file.column(2));
    return TableMaterial.of(record, table, false, gap(file));
  }

  /** The gap as the header holds it, found beforehand by {@link Bandgap}. */
  private static OptionalDouble gap(DataFile file) {
    return file.value("bandgap-ev").isPresent()
        ? OptionalDouble.of(file.numbers("bandgap-ev")[0])
        : OptionalDouble.empty();
  }

  private static Material constant(DataFile file, MaterialRecord record) {
    double[] at = {record.fromNm(), record.toNm()};
    double n = Double.parseDouble(file.required("n"));
    double k = Double.parseDouble(file.required("k"));
    OpticalTable table = OpticalTable.of(at, new double[] {n, n}, new double[] {k, k});
    return TableMaterial.of(record, table, true, OptionalDouble.empty());
  }

  private static Material tunable(DataFile file, MaterialRecord record, GapCurves curves) {
    double[] missEv = file.value("miss-ev").isPresent() ? file.numbers("miss-ev") : new double[0];
    return new TunableMaterial(
        record, tuning(file), curves, marked(file, "marked-ev"), marked(file, "weak-ev"), missEv);
  }

  private static List<TunableMaterial.MarkedRange> marked(DataFile file, String key) {
    List<TunableMaterial.MarkedRange> marked = new ArrayList<>();
    for (String value : file.values(key)) {
      marked.add(marked(value));
    }
    return marked;
  }

  private static Material ideal(DataFile file, MaterialRecord record) {
    return IdealAbsorber.of(
        record,
        tuning(file),
        Double.parseDouble(file.required("n")),
        Double.parseDouble(file.required("absorption-per-cm")));
  }

  private static Tuning tuning(DataFile file) {
    double[] tuning = file.numbers("tuning-ev");
    Optional<String> composition = file.value("composition");
    return new Tuning(
        tuning[0],
        tuning[1],
        tuning[2],
        composition.isPresent() ? Optional.of(composition(composition.get())) : Optional.empty());
  }

  /** Element and the three coefficients of the bandgap by its fraction. */
  private static Composition composition(String value) {
    String[] parts = value.split(",", 2);
    double[] ev = DataFile.numbersIn(parts[1]);
    return new Composition(parts[0], ev[0], ev[1], ev[2]);
  }

  private static TunableMaterial.MarkedRange marked(String value) {
    String[] parts = value.split(",", 3);
    return new TunableMaterial.MarkedRange(
        Double.parseDouble(parts[0]), Double.parseDouble(parts[1]), parts[2]);
  }
}
