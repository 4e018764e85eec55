package evensun.material;

import evensun.spi.Finding;
import evensun.spi.Severity;
import java.util.ArrayList;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** What the record of a built-in material says to whoever uses it on a grid. */
final class RecordFindings {

  private static final Pattern RANGE = Pattern.compile("extended (\\d+) to (\\d+) nm: .*");

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
      Matcher range = RANGE.matcher(note);
      if (range.matches() && reaches(range, wavelengthNm)) {
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

  /** Whether the grid reaches more than 1 nm into an extended range. */
  private static boolean reaches(Matcher range, double[] wavelengthNm) {
    double from = Double.parseDouble(range.group(1));
    double to = Double.parseDouble(range.group(2));
    return wavelengthNm[0] < to - 1 && wavelengthNm[wavelengthNm.length - 1] > from + 1;
  }
}
