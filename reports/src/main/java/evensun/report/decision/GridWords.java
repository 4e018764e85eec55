package evensun.report.decision;

import evensun.report.text.Numbers;
import evensun.result.SearchRecord;
import evensun.result.SearchRecord.Grid;
import java.util.Optional;
import java.util.stream.Collectors;

/** What an exhaustive grid says about a search, in words. */
public final class GridWords {

  private GridWords() {}

  /** One sentence without its stop; absent where no grid was tried. */
  public static Optional<String> of(SearchRecord search) {
    return Optional.ofNullable(search.grid()).map(grid -> sentence(grid, search.aimUnit()));
  }

  /** The end of a headline; empty where a grid has nothing to say. */
  static String headline(SearchRecord search) {
    Grid grid = search.grid();
    if (grid == null || !grid.complete()) {
      return "";
    }
    return grid.better() ? "; a grid found a better design" : "; a grid found nothing better";
  }

  private static String sentence(Grid grid, String unit) {
    String points =
        grid.points().stream().map(String::valueOf).collect(Collectors.joining("\u00a0×\u00a0"));
    if (!grid.complete()) {
      return "The grid of " + points + " designs was interrupted and proves nothing";
    }
    String best =
        grid.better() && grid.best() != null
            ? "a better one: " + Numbers.quantity(grid.best().aim(), unit)
            : "nothing better";
    return "A grid of " + points + " designs, its best ones refined, found " + best;
  }
}
