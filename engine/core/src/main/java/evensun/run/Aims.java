package evensun.run;

import evensun.evaluation.Aim;
import evensun.scenario.InputException;
import evensun.scenario.SearchSpec;
import evensun.stack.ResolvedStack;

/** The aim of a search by its name in the scenario. */
final class Aims {

  private Aims() {}

  /**
   * The aim.
   *
   * @throws InputException when the name is none, or the aim does not fit the device
   */
  static Aim of(SearchSpec search, ResolvedStack stack) {
    if (stack.isMonochromatic()) {
      throw new InputException(
          search.place(),
          "a search needs currents, and a grid of one wavelength has none; make grid.toNm larger than grid.fromNm");
    }
    if (stack.subcells().isEmpty()) {
      throw new InputException(search.place(), "a search needs at least one subcell");
    }
    return switch (search.aim()) {
      case "matched-current" -> Aim.matchedCurrent();
      case "current-sum" -> Aim.currentSum();
      default ->
          throw new InputException(
              search.place(),
              "aim must be one of matched-current, current-sum but was \"" + search.aim() + "\"");
    };
  }
}
