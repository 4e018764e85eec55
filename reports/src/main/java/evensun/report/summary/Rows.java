package evensun.report.summary;

import evensun.report.summary.Summary.Listing;
import evensun.report.text.Numbers;
import java.util.ArrayList;
import java.util.List;
import org.jspecify.annotations.Nullable;

/** Collects rows of numbers: as drawn and found, their change, and standard errors. */
final class Rows {

  private final boolean compared;
  private final boolean errors;
  private final List<String> header;
  private final List<List<String>> rows = new ArrayList<>();

  /**
   * No rows yet.
   *
   * @param head head of the first column
   * @param compared whether a design found stands beside the one as drawn
   * @param errors whether the numbers carry statistical errors
   */
  Rows(String head, boolean compared, boolean errors) {
    this.compared = compared;
    this.errors = errors;
    header =
        new ArrayList<>(compared ? List.of(head, "as drawn", "found") : List.of(head, "as drawn"));
    if (errors) {
      header.add("±");
    }
    if (compared) {
      header.add("change");
    }
  }

  /** Adds a row, unless there is no value. */
  void add(String label, @Nullable Double value, @Nullable Double error, @Nullable Double drawn) {
    if (value == null) {
      return;
    }
    List<String> cells = new ArrayList<>(List.of(label));
    if (compared) {
      cells.add(drawn == null ? "" : Numbers.fixed(drawn, 2));
    }
    cells.add(Numbers.fixed(value, 2));
    if (errors) {
      cells.add(Numbers.standardError(error));
    }
    if (compared) {
      cells.add(drawn == null ? "" : Numbers.signed(value - drawn, 2));
    }
    rows.add(cells);
  }

  Listing listing() {
    return new Listing(List.copyOf(header), rows);
  }
}
