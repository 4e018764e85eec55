package evensun.run;

import evensun.evaluation.Aim;
import evensun.evaluation.Bench;
import evensun.evaluation.EfficiencyAim;
import evensun.evaluation.Model;
import evensun.scenario.InputException;
import evensun.scenario.SearchSpec;
import evensun.stack.ResolvedStack;
import java.util.Optional;

/** The aim of a search by its name in the scenario. */
final class Aims {

  private Aims() {}

  /**
   * The aim.
   *
   * @throws InputException when the name is none, or the aim does not fit the device
   */
  static Aim of(SearchSpec search, Model model) {
    ResolvedStack stack = model.stack();
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
      case "efficiency" ->
          efficiency(model)
              .orElseThrow(
                  () ->
                      new InputException(
                          search.place(),
                          "aim efficiency needs a bandgap for every subcell; an absorber has none (evensun materials lists those that do)"));
      default ->
          throw new InputException(
              search.place(),
              "aim must be one of matched-current, current-sum, efficiency but was \""
                  + search.aim()
                  + "\"");
    };
  }

  /** Efficiency of the device as the scenario describes it, or empty where a gap is missing. */
  static Optional<Aim> efficiency(Model model) {
    try (Bench bench = model.newBench()) {
      return Electrics.device(bench).map(device -> new EfficiencyAim(device.model()));
    }
  }
}
