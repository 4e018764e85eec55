package evensun.cli;

import evensun.data.DecimalText;
import evensun.data.TableFormatException;
import evensun.light.Spectra;
import evensun.light.Spectrum;
import evensun.material.table.Bandgap;
import evensun.material.table.Examination;
import evensun.material.table.OpticalTable;
import evensun.material.table.OpticalTableReader;
import evensun.material.table.RawTable;
import evensun.material.table.TableHints;
import evensun.scenario.InputException;
import evensun.scenario.InputFiles;
import evensun.scenario.Place;
import evensun.spi.Finding;
import java.io.PrintStream;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.TreeMap;
import tools.jackson.databind.json.JsonMapper;

/** Examines a table of the user's own and says how to use it. */
final class TableCheck {

  private static final double FROM_NM = 300;
  private static final double TO_NM = 1200;

  private TableCheck() {}

  /**
   * Examines a file and prints what was understood, what is doubtful, and the lines to paste.
   *
   * @return exit status: 2 when the table cannot be used
   */
  static int run(Path file, TableForm form, boolean json, PrintStream out) {
    RawTable raw = read(file, form);
    Spectrum spectrum = Spectra.named("AM1.5G");
    List<Finding> findings =
        new ArrayList<>(Examination.form(file.getFileName().toString(), raw, spectrum));
    boolean usable = findings.isEmpty();
    if (usable) {
      findings.addAll(
          Examination.content(
              file.getFileName().toString(), raw.table(), spectrum, FROM_NM, TO_NM));
    }
    findings.sort(Comparator.comparing(Finding::severity).reversed());
    if (json) {
      out.println(
          JsonMapper.builder()
              .build()
              .writeValueAsString(
                  Map.of(
                      "understood", raw.understood(),
                      "usable", usable,
                      "findings", findings.stream().map(TableCheck::fields).toList())));
    } else {
      print(raw, findings, usable, out);
      if (usable) {
        paste(file, form, findings, out);
      }
    }
    return usable ? ExitStatus.DONE : ExitStatus.WRONG_INPUT;
  }

  private static Map<String, String> fields(Finding finding) {
    Map<String, String> fields = new TreeMap<>();
    fields.put("severity", finding.severity().name().toLowerCase(Locale.ROOT));
    fields.put("code", finding.code());
    fields.put("where", finding.where());
    fields.put("message", finding.message());
    return fields;
  }

  private static RawTable read(Path file, TableForm form) {
    Place place = Place.option("--check");
    InputFiles files = new InputFiles(Path.of(""));
    TableHints hints = form.hints();
    try {
      String text = files.text(file.toString(), place);
      return form.extinctionTable == null
          ? OpticalTableReader.read(text, hints)
          : OpticalTableReader.read(
              text, files.text(form.extinctionTable.toString(), place), hints);
    } catch (TableFormatException e) {
      throw new InputException(new Place(file.toString(), e.line(), 1, ""), e.getMessage());
    }
  }

  private static void print(RawTable raw, List<Finding> findings, boolean usable, PrintStream out) {
    out.println("Understood");
    raw.understood().forEach(line -> out.println("  " + line));
    if (usable) {
      OpticalTable table = raw.table();
      out.printf(
          Locale.ROOT,
          "  %d points, %s to %s nm%n",
          table.size(),
          DecimalText.of(table.fromNm(), 6),
          DecimalText.of(table.toNm(), 6));
      Bandgap.of(table).ifPresent(ev -> out.printf(Locale.ROOT, "  bandgap %.3f eV%n", ev));
    }
    out.println();
    out.println(findings.isEmpty() ? "Nothing doubtful found." : "Findings");
    for (Finding finding : findings) {
      out.println(
          "  "
              + finding.severity().name().toLowerCase(Locale.ROOT)
              + " ["
              + finding.code()
              + "] "
              + finding.message());
    }
  }

  private static void paste(Path file, TableForm form, List<Finding> findings, PrintStream out) {
    out.println();
    out.println("To use it, paste into a scenario in this folder (elsewhere write the path as it");
    out.println("is seen from the scenario):");
    out.println();
    out.println("materials:");
    out.println("  " + name(file) + ":");
    out.println("    table: " + yaml(file));
    if (form.extinctionTable != null) {
      out.println("    extinctionTable: " + yaml(form.extinctionTable));
    }
    if (form.wavelengthUnit != null) {
      out.println("    wavelengthUnit: " + form.wavelengthUnit);
    }
    if (form.extinction != null) {
      out.println("    extinction: " + form.extinction);
    }
    if (has(findings, "table-range")) {
      out.println("    extrapolate: hold    # n and k beyond the table are then guesses");
    }
    if (has(findings, "table-floor-below-gap")) {
      out.println(
          "    clean: urbach        # leave it out if the absorption below the gap is real");
    }
  }

  /** A path as a scenario holds it, in quotes where YAML would read something else. */
  private static String yaml(Path path) {
    String text = path.toString().replace('\\', '/');
    return text.matches("[A-Za-z0-9_./-]+") ? text : "'" + text.replace("'", "''") + "'";
  }

  private static boolean has(List<Finding> findings, String code) {
    return findings.stream().anyMatch(finding -> finding.code().equals(code));
  }

  private static String name(Path file) {
    String base = file.getFileName().toString().replaceAll("\\.[A-Za-z]+$", "");
    String name =
        base.toLowerCase(Locale.ROOT).replaceAll("[^a-z0-9.-]+", "-").replaceAll("^[.-]+", "");
    return name.isEmpty() ? "my-material" : name;
  }
}
