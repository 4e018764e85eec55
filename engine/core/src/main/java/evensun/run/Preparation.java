package evensun.run;

import evensun.evaluation.Model;
import evensun.light.Spectrum;
import evensun.pluginhost.PluginHost;
import evensun.scenario.InputException;
import evensun.scenario.InputFiles;
import evensun.scenario.Scenario;
import evensun.scenario.SearchSpec;
import evensun.scenario.SolverSpec;
import evensun.spi.Incidence;
import evensun.spi.Services;
import evensun.spi.UnsupportedProblem;
import evensun.stack.ResolvedStack;
import evensun.stack.StackResolver;
import java.util.List;
import java.util.function.BooleanSupplier;

/** A scenario made ready: files read, materials and light found, solver chosen and prepared. */
public final class Preparation implements AutoCloseable {

  private static final long DEFAULT_SEED = 1;

  private final InputFiles files;
  private final Measurements measurements;
  private final ResolvedStack stack;
  private final SolverChoice choice;
  private final PluginHost host;
  private final Services services;
  private final Model model;

  private Preparation(
      InputFiles files,
      Measurements measurements,
      ResolvedStack stack,
      PluginHost host,
      BooleanSupplier cancelled) {
    this.files = files;
    this.measurements = measurements;
    this.stack = stack;
    this.host = host;
    this.services = host.services(cancelled);
    this.choice = SolverChoice.of(stack, host);
    this.model = prepare();
  }

  /** What a solver refuses although its options were set stands where they do. */
  private Model prepare() {
    try {
      return Model.of(stack, choice.solver(), choice.options(), seed(), services);
    } catch (UnsupportedProblem e) {
      SolverSpec spec = stack.scenario().solver().orElse(null);
      if (spec == null || spec.options().isEmpty()) {
        throw e;
      }
      throw new InputException(spec.place(), e.getMessage());
    }
  }

  /**
   * Makes a scenario ready.
   *
   * @param scenario as read
   * @param host loaded solvers
   * @param cancelled whether the user asked to stop
   * @throws InputException with every fault found
   * @throws evensun.pluginhost.PluginException when the solver is not loaded
   * @throws UnsupportedProblem when the solver cannot take the stack
   */
  public static Preparation of(Scenario scenario, PluginHost host, BooleanSupplier cancelled) {
    InputFiles files = new InputFiles(scenario.source().folder());
    Spectrum spectrum = ScenarioLight.spectrum(scenario, files);
    ScenarioMaterials materials = new ScenarioMaterials(scenario, files, spectrum);
    Measurements measurements = Measurements.read(scenario, files);
    ResolvedStack stack =
        StackResolver.resolve(scenario, materials, new ScenarioSurfaces(files), spectrum);
    return new Preparation(files, measurements, stack, host, cancelled);
  }

  /** Seed of the search, and of whatever a solver draws at random. */
  public long seed() {
    return stack.scenario().search().map(SearchSpec::seed).orElse(DEFAULT_SEED);
  }

  /** The stack. */
  public ResolvedStack stack() {
    return stack;
  }

  /** The stack made ready for its solver. */
  public Model model() {
    return model;
  }

  /** The same stack for other directions of the light; the caller closes it. */
  Model modelFor(List<Incidence> incidences) {
    return Model.of(stack, choice.solver(), choice.options(), seed(), services, incidences);
  }

  /** The stack with every boundary flat, ready for the chain it needs; the caller closes it. */
  Model flat(SolverChoice flatChoice) {
    return Model.of(stack.flattened(), flatChoice.solver(), flatChoice.options(), seed(), services);
  }

  Measurements measurements() {
    return measurements;
  }

  SolverChoice choice() {
    return choice;
  }

  PluginHost host() {
    return host;
  }

  /** The files that the scenario names, as they were read. */
  public InputFiles files() {
    return files;
  }

  @Override
  public void close() {
    model.close();
  }
}
