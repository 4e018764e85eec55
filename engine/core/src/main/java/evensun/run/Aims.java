package evensun.run;

import evensun.device.ScenarioDevice;
import evensun.evaluation.Aim;
import evensun.evaluation.Bench;
import evensun.evaluation.EfficiencyAim;
import evensun.evaluation.GaugeAim;
import evensun.evaluation.LightSum;
import evensun.evaluation.Limit;
import evensun.evaluation.Model;
import evensun.evaluation.Quantity;
import evensun.scenario.InputException;
import evensun.scenario.Place;
import evensun.scenario.SearchSpec;
import evensun.scenario.SearchSpec.AimSpec;
import evensun.stack.ResolvedStack;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import org.jspecify.annotations.Nullable;

/**
 * What a search wants and what it must keep.
 *
 * @param all the aims, the first of them first
 * @param limits what every design must keep
 */
record Aims(List<Aim> all, List<Limit> limits) {

  Aims {
    all = List.copyOf(all);
    limits = List.copyOf(limits);
  }

  /**
   * The aims and limits of a search.
   *
   * @throws InputException when one does not fit the device
   */
  static Aims of(SearchSpec search, Model model) {
    ResolvedStack stack = model.stack();
    if (stack.isMonochromatic()) {
      throw new InputException(
          search.place(),
          "a search needs currents, and a grid of one wavelength has none; make grid.toNm larger"
              + " than grid.fromNm");
    }
    if (stack.subcells().isEmpty()) {
      throw new InputException(search.place(), "a search needs at least one subcell");
    }
    List<Aim> aims = new ArrayList<>();
    search.aims().forEach(spec -> aims.add(aim(spec, model)));
    List<Limit> limits = new ArrayList<>();
    search
        .limits()
        .forEach(
            spec ->
                limits.addAll(Limit.of(spec, model, power(spec.quantity(), model, spec.place()))));
    return new Aims(aims, limits);
  }

  /** The aim that derivatives, sensitivities and second opinions are about. */
  Aim first() {
    return all.get(0);
  }

  /** What a bench has to take along for all of them. */
  List<LightSum> lightSums() {
    return Stream.concat(
            all.stream().flatMap(aim -> aim.lightSums().stream()),
            limits.stream().flatMap(limit -> limit.lightSums().stream()))
        .toList();
  }

  private static Aim aim(AimSpec spec, Model model) {
    Aim power = power(spec.quantity(), model, spec.place());
    if (power != null && !spec.smallest()) {
      return power;
    }
    return GaugeAim.of(
        Quantity.of(spec.quantity()),
        spec.name(),
        spec.of(),
        spec.weights(),
        spec.smallest(),
        model,
        power);
  }

  /** What tells the efficiency, where that is the quantity. */
  private static @Nullable Aim power(String quantity, Model model, Place place) {
    if (Quantity.of(quantity) != Quantity.EFFICIENCY) {
      return null;
    }
    return efficiency(model)
        .orElseThrow(
            () ->
                new InputException(
                    place,
                    "efficiency needs a bandgap for every subcell; an absorber has none (evensun"
                        + " materials lists those that do)"));
  }

  /** Efficiency of the device as the scenario describes it, or empty where a gap is missing. */
  static Optional<Aim> efficiency(Model model) {
    try (Bench bench = model.newBench()) {
      boolean reciprocal = Electrics.choice(model).reciprocal();
      return Electrics.device(bench)
          .map(ScenarioDevice::model)
          .map(
              device ->
                  reciprocal
                      ? EfficiencyAim.fromReciprocity(device, model)
                      : EfficiencyAim.fromStepEdges(device));
    }
  }
}
