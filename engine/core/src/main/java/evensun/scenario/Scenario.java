package evensun.scenario;

import evensun.scenario.SearchSpec.ChoiceSpec;
import java.util.ArrayList;
import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/**
 * What a scenario file says, checked as far as it can be without materials, spectra and solvers.
 *
 * @param source the text and where it came from
 * @param title title of the work, shown in reports
 * @param light the light
 * @param grid the wavelengths
 * @param materials materials of the scenario's own, by name; they hide the library's
 * @param incidentMedium material of the first stack entry
 * @param stack the finite layers, the light meets the first one first
 * @param exit the last stack entry
 * @param subcells in the order the light meets them
 * @param connection how the subcells are connected
 * @param device the electrical side of the whole device
 * @param solver the solver asked for, or empty for the one the stack needs
 * @param search what to search, or empty
 * @param measured measured curves of a device built as drawn
 */
public record Scenario(
    Source source,
    String title,
    LightSpec light,
    GridSpec grid,
    Map<String, MaterialSpec> materials,
    MediumSpec incidentMedium,
    List<LayerSpec> stack,
    MediumSpec exit,
    List<SubcellSpec> subcells,
    Connection connection,
    DeviceSpec device,
    Optional<SolverSpec> solver,
    Optional<SearchSpec> search,
    List<MeasuredSpec> measured) {

  public Scenario {
    materials = Collections.unmodifiableMap(new LinkedHashMap<>(materials));
    stack = List.copyOf(stack);
    subcells = List.copyOf(subcells);
    measured = List.copyOf(measured);
  }

  /**
   * This scenario with every choice of its search made.
   *
   * @param chosen the alternative of each choice
   */
  public Scenario settled(List<String> chosen) {
    List<LayerSpec> layers = new ArrayList<>(stack);
    List<ChoiceSpec> choices = search.orElseThrow().choices();
    for (int i = 0; i < choices.size(); i++) {
      ChoiceSpec choice = choices.get(i);
      String name = chosen.get(i);
      layers.replaceAll(
          layer -> layer.name().equals(choice.layer()) ? made(layer, choice, name) : layer);
    }
    return copy(
        grid, incidentMedium, layers, exit, solver, search.map(spec -> spec.settled(layers)));
  }

  private static LayerSpec made(LayerSpec layer, ChoiceSpec choice, String name) {
    if (choice.isPresence()) {
      return layer.withPresent(!name.equals(ChoiceSpec.ABSENT));
    }
    return layer.withMaterial(layer.material(), name);
  }

  /**
   * Whether what a name stands for is there: a medium, or a layer that is not left out.
   *
   * @param name a layer, {@code layer/component} or a medium
   */
  public boolean isThere(String name) {
    int slash = name.indexOf('/');
    String layer = slash < 0 ? name : name.substring(0, slash);
    return stack.stream().noneMatch(each -> each.name().equals(layer) && !each.present());
  }

  /** This scenario on another grid. */
  public Scenario withGrid(GridSpec other) {
    return copy(other, incidentMedium, stack, exit, solver, search);
  }

  /** This scenario with another solver. */
  public Scenario withSolver(SolverSpec other) {
    return copy(grid, incidentMedium, stack, exit, Optional.of(other), search);
  }

  /** This scenario with another seed of its search, if it has one, and of rays. */
  public Scenario withSeed(long seed) {
    return copy(grid, incidentMedium, stack, exit, solver, search.map(spec -> spec.withSeed(seed)));
  }

  /** This scenario with one material replaced by another wherever it stands. */
  public Scenario withMaterial(String name, String other) {
    return copy(
        grid,
        incidentMedium.material().equals(name)
            ? incidentMedium.withMaterial(other)
            : incidentMedium,
        stack.stream().map(layer -> layer.withMaterial(name, other)).toList(),
        exit.material().equals(name) ? exit.withMaterial(other) : exit,
        solver,
        search);
  }

  private Scenario copy(
      GridSpec otherGrid,
      MediumSpec otherIncident,
      List<LayerSpec> otherStack,
      MediumSpec otherExit,
      Optional<SolverSpec> otherSolver,
      Optional<SearchSpec> otherSearch) {
    return new Scenario(
        source,
        title,
        light,
        otherGrid,
        materials,
        otherIncident,
        otherStack,
        otherExit,
        subcells,
        connection,
        device,
        otherSolver,
        otherSearch,
        measured);
  }
}
