package evensun.pluginhost;

import evensun.spi.OpticalSolver;
import evensun.spi.Services;
import java.io.IOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.function.BooleanSupplier;
import org.pf4j.PluginState;
import org.pf4j.PluginWrapper;

/**
 * The solver plugins of a run. A plugin that does not load is kept with its reason and never stops
 * another. Safe for threads once open.
 */
public final class PluginHost implements AutoCloseable {

  private final SolverManager manager = new SolverManager();
  private final Map<String, LoadedPlugin> byPluginId = new LinkedHashMap<>();
  private final Map<String, OpticalSolver> solvers = new LinkedHashMap<>();
  private final List<RejectedPlugin> rejected = new ArrayList<>();
  private final Set<Path> seen = new HashSet<>();

  private PluginHost() {}

  /**
   * Loads every plugin of some places. Of two plugins or solvers with one id the first stays.
   *
   * @param places folders of plugins, single plugin folders or jars, in order of precedence
   */
  public static PluginHost open(List<Path> places) {
    PluginHost host = new PluginHost();
    places.forEach(host::loadAll);
    return host;
  }

  /** The solver of that id, or empty when none is loaded. */
  public Optional<OpticalSolver> solver(String solverId) {
    // The file may be replaced while a search runs; what counts is what was loaded.
    pluginOf(solverId).ifPresent(LoadedPlugin::fingerprint);
    return Optional.ofNullable(solvers.get(solverId));
  }

  /**
   * The solver of that id.
   *
   * @throws PluginException when none is loaded, with what is loaded and why others are not
   */
  public OpticalSolver require(String solverId) {
    return solver(solverId).orElseThrow(() -> new PluginException(whyMissing(solverId)));
  }

  /** The plugin that a solver came from, or empty when none of that id is loaded. */
  public Optional<LoadedPlugin> pluginOf(String solverId) {
    return loaded().stream().filter(p -> p.solverId().equals(solverId)).findFirst();
  }

  /** All loaded plugins in the order they were found. */
  public List<LoadedPlugin> loaded() {
    return List.copyOf(byPluginId.values());
  }

  /** All plugins that were found and not loaded, in the order they were found. */
  public List<RejectedPlugin> rejected() {
    return List.copyOf(rejected);
  }

  /** What solvers may ask of the host. */
  public Services services(BooleanSupplier cancelled) {
    return new Services() {
      @Override
      public Optional<OpticalSolver> solver(String id) {
        return PluginHost.this.solver(id);
      }

      @Override
      public boolean cancelled() {
        return cancelled.getAsBoolean();
      }
    };
  }

  /** Why a solver is not there: one line with what is loaded, and what did not load. */
  public String whyMissing(String solverId) {
    StringBuilder text = new StringBuilder("no solver \"" + solverId + "\" is loaded (");
    text.append(solvers.isEmpty() ? "none is" : "loaded: " + String.join(", ", solvers.keySet()));
    text.append(')');
    rejected.forEach(plugin -> text.append("; not loaded: ").append(plugin));
    return text.append("; see evensun plugins").toString();
  }

  /** Unloads all plugins; solvers must not be used any more. */
  @Override
  public void close() {
    manager.unloadPlugins();
  }

  private void loadAll(Path place) {
    try {
      PluginFolders.candidates(place).forEach(this::load);
    } catch (Rejection e) {
      reject(place, e);
    }
  }

  private void load(Path path) {
    if (!seen.add(realPath(path))) {
      return;
    }
    try {
      PluginFile file = PluginFile.of(path);
      checkDescriptor(file);
      admit(file);
    } catch (Rejection e) {
      reject(path, e);
    }
  }

  private static Path realPath(Path path) {
    try {
      return path.toRealPath();
    } catch (IOException e) {
      return path.toAbsolutePath().normalize();
    }
  }

  private void reject(Path path, Rejection e) {
    rejected.add(new RejectedPlugin(path, e.code(), e.getMessage(), e.remedy()));
  }

  private void checkDescriptor(PluginFile file) throws Rejection {
    String id = file.property("plugin.id");
    if (id.isEmpty()) {
      throw new Rejection(
          "id-missing", "plugin.properties has no plugin.id", "write plugin.id=<name>");
    }
    if (file.property("plugin.version").isEmpty()) {
      throw new Rejection(
          "version-missing",
          "plugin.properties has no plugin.version",
          "write plugin.version=1.0.0");
    }
    ContractVersion.check(file.property("plugin.requires"));
    if (!file.property("plugin.dependencies").isEmpty()) {
      throw new Rejection(
          "plugin-dependencies",
          "plugin.properties names plugin.dependencies, which solvers may not have",
          "ask Services.solver for another solver, and bring libraries along in lib");
    }
    LoadedPlugin other = byPluginId.get(id);
    if (other != null) {
      throw duplicate("plugin", id, other);
    }
  }

  private static Rejection duplicate(String what, String id, LoadedPlugin other) {
    return new Rejection(
        "duplicate-id",
        "the " + what + " id \"" + id + "\" is already taken by " + other.file(),
        "remove one of the two, or give this one another id");
  }

  /** Loads, starts and examines; what fails after loading is unloaded again. */
  private void admit(PluginFile file) throws Rejection {
    String id = start(file);
    try {
      SolverClass.Made made = solverClass(id).make();
      Optional<LoadedPlugin> other = pluginOf(made.id());
      if (other.isPresent()) {
        throw duplicate("solver", made.id(), other.get());
      }
      byPluginId.put(id, new LoadedPlugin(file, made.id(), made.traits()));
      solvers.put(made.id(), made.solver());
    } catch (Rejection e) {
      manager.unloadPlugin(id);
      throw e;
    }
  }

  private String start(PluginFile file) throws Rejection {
    String id;
    try {
      id = manager.load(file);
    } catch (RuntimeException e) {
      throw new Rejection("not-loaded", OneLine.of(e), "correct the plugin");
    }
    PluginState state = startState(id);
    if (!state.isStarted()) {
      PluginWrapper wrapper = manager.getPlugin(id);
      Throwable why = wrapper.getFailedException();
      manager.unloadPlugin(id);
      throw new Rejection(
          "not-started",
          "its plugin.class "
              + file.property("plugin.class")
              + " does not start ("
              + (why == null ? state : OneLine.of(why))
              + ")",
          "remove plugin.class, which a solver does not need, or correct that class");
    }
    return id;
  }

  private PluginState startState(String id) {
    try {
      return manager.startPlugin(id);
    } catch (RuntimeException | LinkageError e) {
      manager.getPlugin(id).setFailedException(e);
      return PluginState.FAILED;
    }
  }

  private SolverClass solverClass(String id) throws Rejection {
    Set<String> declared = manager.getExtensionClassNames(id);
    if (declared.isEmpty()) {
      throw new Rejection(
          "no-solver-declared",
          "it declares no solver: " + SolverFinder.SERVICE_FILE + " is missing or empty",
          "add that file with the name of the solver's class in it");
    }
    if (declared.size() > 1) {
      throw new Rejection(
          "several-solvers-declared",
          "it declares " + declared.size() + " solvers (" + String.join(", ", declared) + ")",
          "make a plugin of each, or one solver that takes solver.options");
    }
    return new SolverClass(declared.iterator().next(), manager.getPluginClassLoader(id));
  }
}
