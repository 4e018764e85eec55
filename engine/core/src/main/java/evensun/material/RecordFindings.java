package evensun.material;

import evensun.spi.Finding;
import evensun.spi.Severity;
import java.util.ArrayList;
import java.util.List;

/** What the record of a built-in material says to whoever uses it on a grid. */
final class RecordFindings {

  private static final String EXTENDED = "extended ";

  private RecordFindings() {}

  static List<Finding> of(MaterialRecord record, double[] wavelengthNm) {
    List<Finding> findings = new ArrayList<>(record.examined());
    if (record.fromMemory()) {
      findings.add(
          new Finding(
              "material-from-memory",
              Severity.WARNING,
              record.name(),
              "the optical constants of "
                  + record.name()
                  + " were written from memory, without a source at hand: replace them by a table"
                  + " of your own film before a decision rests on this layer"));
    }
    for (String note : record.notes()) {
      if (note.startsWith(EXTENDED) && reaches(note, wavelengthNm)) {
        findings.add(
            new Finding(
                "material-extended",
                Severity.NOTE,
                record.name(),
                "part of the grid lies beyond the measured data of "
                    + record.name()
                    + ": "
                    + note));
      }
    }
    return findings;
  }

  /** Whether the grid reaches more than 1 nm into the range of "extended FROM to TO nm: …". */
  private static boolean reaches(String note, double[] wavelengthNm) {
    int to = note.indexOf(" to ");
    double fromNm = Double.parseDouble(note.substring(EXTENDED.length(), to));
    double toNm = Double.parseDouble(note.substring(to + 4, note.indexOf(" nm: ")));
    return wavelengthNm[0] < toNm - 1 && wavelengthNm[wavelengthNm.length - 1] > fromNm + 1;
  }
}
