package evensun.material;

import evensun.data.TableFormatException;
import evensun.light.Constants;
import evensun.light.Spectrum;
import evensun.material.table.Examination;
import evensun.material.table.OpticalTable;
import evensun.material.table.RawTable;
import evensun.material.table.UrbachTail;
import evensun.spi.Finding;
import evensun.spi.Severity;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;

/**
 * A table of the user's own: taken as given, examined, cleaned only when asked.
 *
 * @param name name in the scenario
 * @param path file or files it came from
 * @param raw what was read
 * @param hold whether the end values hold beyond the table
 * @param clean whether absorption below the gap gives way to an Urbach tail
 */
public record OwnTable(String name, String path, RawTable raw, boolean hold, boolean clean) {

  private static final String HAZARDS =
      "Hazards not known: a material of the user's own; see its safety data sheet.";

  /**
   * The material with what was found about it.
   *
   * @param spectrum light by which currents are judged
   * @param gridFromNm first wavelength it is needed at, in nm
   * @param gridToNm last wavelength it is needed at, in nm
   * @throws TableFormatException when a point is impossible, or there is no gap to clean below
   */
  public TableMaterial material(Spectrum spectrum, double gridFromNm, double gridToNm) {
    OpticalTable table = raw.table();
    List<Finding> findings = new ArrayList<>(reading());
    if (clean) {
      UrbachTail.Cleaned cleaned =
          UrbachTail.clean(table, UrbachTail.DEFAULT_EV)
              .orElseThrow(
                  () ->
                      new TableFormatException(
                          0,
                          "has no absorption edge with a steepest point, so that clean: urbach has"
                              + " no gap to start from; take the key away"));
      table = cleaned.table();
      findings.add(cleaning(cleaned));
    }
    for (Finding finding : Examination.content(name, table, spectrum, gridFromNm, gridToNm)) {
      if (!finding.code().equals("table-range")) {
        findings.add(finding);
      }
    }
    return TableMaterial.of(record(table), table, hold).withFindings(findings);
  }

  /** How the file was read, unless it was written exactly as the program writes its own. */
  private List<Finding> reading() {
    String said = String.join("; ", raw.understood());
    boolean plain =
        !said.contains("judged")
            && !said.contains("decimal comma")
            && !said.contains("turned round")
            && !said.contains("joined")
            && !said.contains("no extinction");
    return plain
        ? List.of()
        : List.of(new Finding("table-read", Severity.NOTE, name, path + ": " + said));
  }

  private Finding cleaning(UrbachTail.Cleaned cleaned) {
    return new Finding(
        "table-cleaned",
        Severity.NOTE,
        name,
        String.format(
            Locale.ROOT,
            "a floor of k = %.3g was taken off and absorption below %.3f eV follows an Urbach tail"
                + " of %.0f meV, as asked",
            cleaned.floor(),
            cleaned.joinEv(),
            1000 * UrbachTail.DEFAULT_EV));
  }

  private MaterialRecord record(OpticalTable table) {
    return new MaterialRecord(
        name,
        name,
        "own table",
        "as measured by the user",
        "table " + path,
        0,
        table.fromNm(),
        table.toNm(),
        Constants.CELL_TEMPERATURE_K,
        false,
        List.of(HAZARDS),
        raw.understood(),
        List.of());
  }
}
