package evensun.report.page;

import evensun.report.page.Block.Grid;
import evensun.report.page.Block.Picture;
import evensun.report.page.Block.Plot;
import evensun.report.page.Block.Plots;
import evensun.report.page.Block.Strip;
import java.util.List;
import java.util.stream.Stream;

/** Where the figures and tables of a page are. */
public final class Places {

  private Places() {}

  /**
   * A figure or a table.
   *
   * @param id its address on the page
   * @param label what it shows
   */
  public record Place(String id, String label) {}

  /** Every figure and table of a section, in its order. */
  public static List<Place> in(Section section) {
    return section.blocks().stream().flatMap(Places::of).toList();
  }

  private static Stream<Place> of(Block block) {
    if (block instanceof Picture picture) {
      return Stream.of(new Place(picture.id(), picture.caption()));
    }
    if (block instanceof Grid grid) {
      return Stream.of(new Place(grid.table().id(), grid.table().caption()));
    }
    if (block instanceof Plot plot) {
      return Stream.of(chart(plot.chart().id(), plot.chart().title()));
    }
    if (block instanceof Plots plots) {
      return plots.plots().stream().flatMap(Places::of);
    }
    return block instanceof Strip strip
        ? strip.curves().stream().map(c -> chart(c.chart().id(), c.chart().title()))
        : Stream.empty();
  }

  private static Place chart(String id, String title) {
    return new Place("fig-" + id, title);
  }
}
