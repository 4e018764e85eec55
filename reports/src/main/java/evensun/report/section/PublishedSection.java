package evensun.report.section;

import evensun.report.page.Block;
import evensun.report.page.Section;
import evensun.report.page.Table;
import evensun.report.text.Numbers;
import evensun.result.Published;
import evensun.result.RunResult;
import java.util.List;
import java.util.Optional;

/** Published values beside those that this very program and machine computed in the same run. */
public final class PublishedSection {

  private PublishedSection() {}

  /** The section; absent where nothing was compared. */
  public static Optional<Section> of(RunResult result) {
    List<Published> values = result.published();
    if (values == null || values.isEmpty()) {
      return Optional.empty();
    }
    long agreed = values.stream().filter(Published::agrees).count();
    String heading =
        agreed == values.size()
            ? "All " + values.size() + " published values are met"
            : values.size() - agreed + " of " + values.size() + " published values are not met";
    String what =
        "Known results, computed by the program that made this report, in the same run. They test"
            + " the method, not the materials of this stack.";
    return Optional.of(
        new Section(
            "published",
            "Published values",
            heading,
            List.of(new Block.Prose(what), new Block.Grid(table(values), true))));
  }

  private static Table table(List<Published> values) {
    Table.Builder table =
        new Table.Builder("table-published", "Published and computed")
            .words("quantity")
            .numbers("published", "")
            .numbers("computed", "")
            .numbers("may differ by", "")
            .words("unit")
            .words("verdict")
            .words("source");
    for (Published value : values) {
      table.row(
          value.what(),
          Numbers.significant(value.published(), 7),
          Numbers.significant(value.computed(), 7),
          Numbers.significant(value.tolerance(), 3),
          value.unit(),
          value.agrees() ? "agrees" : "differs",
          value.source());
    }
    return table.build();
  }
}
