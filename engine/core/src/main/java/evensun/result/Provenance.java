package evensun.result;

import java.util.List;
import java.util.Map;
import org.jspecify.annotations.Nullable;

/**
 * How a result came about.
 *
 * @param evensunVersion version of the program
 * @param build fingerprint of the program's jars
 * @param javaVersion Java it ran on
 * @param solver the solver that answered, first of its chain
 * @param chain further solvers it handed on to
 * @param kernel kernel of the solver, where it says so
 * @param seed seed of the search
 * @param grid wavelengths in words
 * @param scenarioText text of the scenario file
 * @param inputs every file read, with its hash
 * @param repeatCommand command that repeats the run
 * @param startedUtc when it started, ISO 8601
 * @param elapsedSeconds how long it took
 * @param settings further settings that shaped the numbers
 */
public record Provenance(
    String evensunVersion,
    String build,
    String javaVersion,
    SolverUse solver,
    List<SolverUse> chain,
    @Nullable String kernel,
    @Nullable Long seed,
    String grid,
    String scenarioText,
    List<InputFile> inputs,
    String repeatCommand,
    String startedUtc,
    double elapsedSeconds,
    Map<String, String> settings) {

  /**
   * A solver used.
   *
   * @param id id
   * @param version version of its plugin
   * @param file name of its file
   * @param sha256 hash of its file
   */
  public record SolverUse(String id, String version, String file, String sha256) {}

  /**
   * A file read.
   *
   * @param path as named in the scenario, never an absolute path
   * @param sha256 hash of its content
   */
  public record InputFile(String path, String sha256) {}
}
