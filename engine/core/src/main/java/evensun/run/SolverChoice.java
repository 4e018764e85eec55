package evensun.run;

import evensun.pluginhost.PluginHost;
import evensun.scenario.Scenario;
import evensun.scenario.SolverSpec;
import evensun.spi.OpticalSolver;
import evensun.spi.UnsupportedProblem;
import evensun.stack.ResolvedStack;
import java.util.Map;

/**
 * The solver of a run: the one the scenario asks for, else the simplest that takes the stack.
 *
 * @param solver the solver
 * @param options its options
 */
record SolverChoice(OpticalSolver solver, Map<String, String> options) {

  /** The solver of flat stacks. */
  static final String FLAT = "transfer-matrix";

  SolverChoice {
    options = Map.copyOf(options);
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
    return new SolverChoice(solver, options);
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
