package evensun.run;

import evensun.pluginhost.LoadedPlugin;
import evensun.pluginhost.PluginHost;
import evensun.scenario.InputException;
import evensun.scenario.Scenario;
import evensun.scenario.SolverSpec;
import evensun.scenario.tree.Nearest;
import evensun.scenario.tree.Shown;
import evensun.spi.Grading;
import evensun.spi.Mixture;
import evensun.spi.OpticalSolver;
import evensun.spi.Roughness;
import evensun.spi.UnsupportedProblem;
import evensun.stack.Boundary;
import evensun.stack.ResolvedLayer;
import evensun.stack.ResolvedStack;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Stream;

/**
 * The solver of a run: the one the scenario asks for, else the simplest that takes the stack. Rays
 * are traced where a boundary is textured, scatters, or is coarsely rough beside a thick layer, and
 * for diffuse light. Where the solver does not take mixed, graded or rough layers itself, the
 * effective-medium solver stands in front of it.
 *
 * @param solver the solver, first of its chain
 * @param options its options
 * @param chain ids of the solvers it hands on to
 * @param statistical whether its results carry a statistical error
 */
record SolverChoice(
    OpticalSolver solver, Map<String, String> options, List<String> chain, boolean statistical) {

  /** The solver of flat stacks. */
  static final String FLAT = "transfer-matrix";

  /** The solver of textured and scattering ones; it asks the flat one for the films of facets. */
  static final String RAYS = "ray-trace";

  /** The solver that turns mixed, graded and rough layers into plain ones. */
  static final String EFFECTIVE = "effective-medium";

  /** Its option for the solver below it. */
  private static final String NEXT = "next";

  private static final Set<String> BODIES = Set.of(Mixture.KIND, Grading.KIND);

  SolverChoice {
    options = Map.copyOf(options);
    chain = List.copyOf(chain);
  }

  /**
   * Chooses.
   *
   * @throws InputException when the scenario names a solver that nobody offers
   * @throws evensun.pluginhost.PluginException when the solver is not loaded
   * @throws UnsupportedProblem when the scenario asks for one that cannot take the stack
   */
  static SolverChoice of(ResolvedStack stack, PluginHost host) {
    Optional<SolverSpec> spec = stack.scenario().solver();
    spec.ifPresent(wanted -> known(wanted, host));
    return of(stack, spec, host);
  }

  /**
   * Chooses as if the scenario asked for no solver.
   *
   * @throws evensun.pluginhost.PluginException when the solver is not loaded
   */
  static SolverChoice unasked(ResolvedStack stack, PluginHost host) {
    return of(stack, Optional.empty(), host);
  }

  private static SolverChoice of(ResolvedStack stack, Optional<SolverSpec> spec, PluginHost host) {
    Map<String, String> options = new HashMap<>(spec.map(SolverSpec::options).orElse(Map.of()));
    String needed = needsRays(stack, host) ? RAYS : FLAT;
    String id = spec.map(SolverSpec::id).orElse(needed);
    boolean chained = id.equals(EFFECTIVE);
    String below = chained ? options.getOrDefault(NEXT, needed) : id;
    OpticalSolver solver = host.require(below);
    check(solver, stack);
    List<String> films = below.equals(RAYS) ? List.of(FLAT) : List.of();
    boolean statistical = solver.traits().statistical();
    if (!chained && !needsEffectiveMedium(solver, stack)) {
      return new SolverChoice(solver, options, films, statistical);
    }
    options.put(NEXT, below);
    List<String> chain = films.isEmpty() ? List.of(below) : List.of(below, FLAT);
    return new SolverChoice(host.require(EFFECTIVE), options, chain, statistical);
  }

  /** A name that no plugin has is wrong input, unless a plugin did not load and may be the one. */
  private static void known(SolverSpec wanted, PluginHost host) {
    if (host.solver(wanted.id()).isEmpty() && host.rejected().isEmpty()) {
      List<String> ids = host.loaded().stream().map(LoadedPlugin::solverId).sorted().toList();
      throw new InputException(
          wanted.place(),
          "no solver "
              + Shown.quoted(wanted.id())
              + " is loaded"
              + Nearest.hint(wanted.id(), ids)
              + " (evensun plugins lists them)");
    }
  }

  /** Ids of the chain, the first solver first. */
  List<String> ids() {
    return Stream.concat(Stream.of(solver.id()), chain.stream()).toList();
  }

  private static boolean needsRays(ResolvedStack stack, PluginHost host) {
    return stack.isShaped()
        || stack.scenario().light().diffuse()
        || scattersBesideThick(stack, host);
  }

  /** Without a thick layer light that a rough face scatters has no path to make longer. */
  private static boolean scattersBesideThick(ResolvedStack stack, PluginHost host) {
    return stack.layers().stream().anyMatch(layer -> !layer.coherent())
        && stack.layers().stream().anyMatch(layer -> isCoarse(layer, stack.grid().toNm()))
        && host.solver(RAYS).stream()
            .anyMatch(rays -> rays.traits().features().contains(Roughness.KIND));
  }

  /**
   * Far above the wavelength a rough face scatters; what lies between is left to the flat solver.
   */
  private static boolean isCoarse(ResolvedLayer layer, double longestNm) {
    return layer.features().stream()
        .anyMatch(f -> f instanceof Roughness rough && rough.correlationLengthNm() > longestNm);
  }

  /** Rays follow what a rough face scatters, but leave it to effective media which faces do. */
  private static boolean needsEffectiveMedium(OpticalSolver solver, ResolvedStack stack) {
    Set<String> taken = solver.traits().features();
    return stack.layers().stream()
        .flatMap(layer -> layer.features().stream())
        .anyMatch(
            feature ->
                feature instanceof Roughness
                    ? !taken.contains(Roughness.KIND) || solver.id().equals(RAYS)
                    : BODIES.contains(feature.kind()) && !taken.contains(feature.kind()));
  }

  private static void check(OpticalSolver solver, ResolvedStack stack) {
    Scenario scenario = stack.scenario();
    boolean thick = stack.layers().stream().anyMatch(layer -> !layer.coherent());
    if (thick && !solver.traits().incoherent()) {
      throw new UnsupportedProblem(
          "solver \"%s\" takes no incoherent layers; choose another solver or make the layers coherent"
              .formatted(solver.id()));
    }
    if (scenario.light().angleDeg() > 0 && !solver.traits().oblique()) {
      throw new UnsupportedProblem(
          "solver \"%s\" takes light along the normal only; set light.angleDeg to 0 or choose another solver"
              .formatted(solver.id()));
    }
    if (scenario.light().diffuse() && !solver.traits().diffuse()) {
      throw new UnsupportedProblem(
          "solver \"%s\" takes no diffuse light; remove light.diffuse, or choose %s by leaving solver out"
              .formatted(solver.id(), RAYS));
    }
    for (ResolvedLayer layer : stack.layers()) {
      check(solver, layer);
    }
  }

  private static void check(OpticalSolver solver, ResolvedLayer layer) {
    layer.features().stream()
        .filter(f -> Boundary.KINDS.contains(f.kind()))
        .filter(f -> !solver.traits().features().contains(f.kind()))
        .findFirst()
        .ifPresent(
            f -> {
              throw new UnsupportedProblem(
                  "layer \"%s\": solver \"%s\" takes no %s; choose %s by leaving solver out, or make the boundary flat"
                      .formatted(layer.name(), solver.id(), f.kind(), RAYS));
            });
  }
}
