package evensun.report.section;

import evensun.report.page.Block;
import evensun.report.page.Section;
import evensun.report.text.Numbers;
import evensun.result.Caution;
import evensun.result.RunResult;
import java.util.List;
import java.util.Optional;

/** What these numbers cannot say, and what is hazardous in this stack. */
public final class CautionSection {

  private CautionSection() {}

  /** The section; never absent, since the limits of the model always apply. */
  public static Optional<Section> of(RunResult result) {
    List<Block.Point> points = result.cautions().stream().map(CautionSection::point).toList();
    List<Block> blocks = List.of(points.isEmpty() ? limits() : new Block.Points(points));
    String heading =
        points.isEmpty()
            ? "What this result does not say"
            : "What this result does not say, and "
                + Numbers.count(points.size(), "caution")
                + " for this stack";
    return Optional.of(new Section("cautions", "Cautions", heading, blocks));
  }

  /** For results that carry no cautions of their own. */
  private static Block limits() {
    return new Block.Prose(
        "These are predictions of idealised optics. They say nothing about stability, lifetime or"
            + " certified efficiency and replace no measurement. Safety data sheets, local rules and"
            + " trained staff come before anything written here.");
  }

  private static Block.Point point(Caution caution) {
    return new Block.Point("caution", caution.about(), caution.text(), "");
  }
}
