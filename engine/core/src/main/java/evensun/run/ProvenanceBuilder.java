package evensun.run;

import evensun.pluginhost.LoadedPlugin;
import evensun.result.Provenance;
import evensun.result.Provenance.InputFile;
import evensun.result.Provenance.SolverUse;
import evensun.scenario.InputFiles;
import evensun.scenario.Scenario;
import evensun.stack.ResolvedStack;
import java.nio.charset.StandardCharsets;
import java.time.Duration;
import java.time.Instant;
import java.time.temporal.ChronoUnit;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.jspecify.annotations.Nullable;

/** Records how a result came about. */
final class ProvenanceBuilder {

  private final Preparation preparation;
  private final Instant started = Instant.now();

  ProvenanceBuilder(Preparation preparation) {
    this.preparation = preparation;
  }

  /**
   * The record.
   *
   * @param seed seed of the search and of rays, null where nothing was drawn at random
   * @param repeatCommand command that repeats the run
   * @param settings further settings
   */
  Provenance build(@Nullable Long seed, String repeatCommand, Map<String, String> settings) {
    ResolvedStack stack = preparation.stack();
    Map<String, String> all = new LinkedHashMap<>(settings);
    preparation.choice().options().forEach((k, v) -> all.put("solver.options." + k, v));
    return new Provenance(
        BuildInfo.version(),
        BuildInfo.fingerprint(),
        Runtime.version().toString(),
        solver(preparation.choice().solver().id()),
        preparation.choice().chain().stream().map(this::solver).toList(),
        preparation.choice().options().get("kernel"),
        seed,
        grid(stack),
        stack.scenario().source().text(),
        inputs(stack.scenario()),
        repeatCommand,
        started.truncatedTo(ChronoUnit.SECONDS).toString(),
        Duration.between(started, Instant.now()).toMillis() / 1000.0,
        all);
  }

  private SolverUse solver(String id) {
    return preparation
        .host()
        .pluginOf(id)
        .map(ProvenanceBuilder::use)
        .orElse(new SolverUse(id, "", "", ""));
  }

  private static SolverUse use(LoadedPlugin plugin) {
    return new SolverUse(
        plugin.solverId(),
        plugin.version(),
        plugin.file().getFileName().toString(),
        plugin.sha256());
  }

  private static String grid(ResolvedStack stack) {
    var grid = stack.grid();
    return grid.size() == 1
        ? Findings.number(grid.fromNm()) + " nm"
        : "%s to %s nm in steps of %s nm (%d wavelengths)"
            .formatted(
                Findings.number(grid.fromNm()),
                Findings.number(grid.toNm()),
                Findings.number(grid.stepNm()),
                grid.size());
  }

  private List<InputFile> inputs(Scenario scenario) {
    List<InputFile> inputs = new ArrayList<>();
    byte[] text = scenario.source().text().getBytes(StandardCharsets.UTF_8);
    inputs.add(new InputFile(fileName(scenario), InputFiles.sha256(text)));
    preparation
        .files()
        .contents()
        .forEach((path, bytes) -> inputs.add(new InputFile(path, InputFiles.sha256(bytes))));
    return inputs;
  }

  /** The scenario's file name without folders, which may name a person or a machine. */
  static String fileName(Scenario scenario) {
    String name = scenario.source().name().replace('\\', '/');
    return name.substring(name.lastIndexOf('/') + 1);
  }
}
