package evensun.run;

import evensun.pluginhost.PluginHost;
import evensun.scenario.Scenario;
import evensun.scenario.SolverSpec;
import evensun.spi.Feature;
import evensun.spi.Grading;
import evensun.spi.Mixture;
import evensun.spi.OpticalSolver;
import evensun.spi.Roughness;
import evensun.spi.UnsupportedProblem;
import evensun.stack.ResolvedStack;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.stream.Collectors;

/**
 * The solver of a run: the one the scenario asks for, else the simplest that takes the stack. Where
 * it does not take mixed, graded or rough layers itself, the effective-medium solver stands in
 * front of it.
 *
 * @param solver the solver, first of its chain
 * @param options its options
 * @param chain ids of the solvers it hands on to
 */
record SolverChoice(OpticalSolver solver, Map<String, String> options, List<String> chain) {

  /** The solver of flat stacks. */
  static final String FLAT = "transfer-matrix";

  /** The solver that turns mixed, graded and rough layers into plain ones. */
  static final String EFFECTIVE = "effective-medium";

  /** Its option for the solver below it. */
  private static final String NEXT = "next";

  private static final Set<String> RESOLVED = Set.of(Mixture.KIND, Grading.KIND, Roughness.KIND);

  SolverChoice {
    options = Map.copyOf(options);
    chain = List.copyOf(chain);
  }

  /**
   * Chooses.
   *
   * @throws evensun.pluginhost.PluginException when the solver is not loaded
   * @throws UnsupportedProblem when the scenario asks for one that cannot take the stack
   */
  static SolverChoice of(ResolvedStack stack, PluginHost host) {
    Scenario scenario = stack.scenario();
    String id = scenario.solver().map(SolverSpec::id).orElse(FLAT);
    OpticalSolver solver = host.require(id);
    Map<String, String> options = scenario.solver().map(SolverSpec::options).orElse(Map.of());
    check(solver, stack);
    if (needsEffectiveMedium(solver, stack)) {
      Map<String, String> chained = new HashMap<>(options);
      chained.put(NEXT, id);
      return new SolverChoice(host.require(EFFECTIVE), chained, List.of(id));
    }
    boolean chains = id.equals(EFFECTIVE);
    return new SolverChoice(
        solver, options, chains ? List.of(options.getOrDefault(NEXT, FLAT)) : List.of());
  }

  /** The kinds of features of a stack. */
  private static Set<String> kinds(ResolvedStack stack) {
    return stack.layers().stream()
        .flatMap(layer -> layer.features().stream())
        .map(Feature::kind)
        .collect(Collectors.toSet());
  }

  private static boolean needsEffectiveMedium(OpticalSolver solver, ResolvedStack stack) {
    return kinds(stack).stream()
        .anyMatch(kind -> RESOLVED.contains(kind) && !solver.traits().features().contains(kind));
  }

  private static void check(OpticalSolver solver, ResolvedStack stack) {
    boolean thick = stack.layers().stream().anyMatch(layer -> !layer.coherent());
    if (thick && !solver.traits().incoherent()) {
      throw new UnsupportedProblem(
          "solver \"%s\" takes no incoherent layers; choose another solver or make the layers coherent"
              .formatted(solver.id()));
    }
    if (stack.scenario().light().angleDeg() > 0 && !solver.traits().oblique()) {
      throw new UnsupportedProblem(
          "solver \"%s\" takes light along the normal only; set light.angleDeg to 0 or choose another solver"
              .formatted(solver.id()));
    }
  }
}
