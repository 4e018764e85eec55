package evensun.cli;

import evensun.result.ResultFormatException;
import evensun.result.ResultJson;
import evensun.result.RunResult;
import evensun.scenario.InputException;
import evensun.scenario.Place;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Comparator;
import java.util.List;
import java.util.stream.Stream;

/**
 * Runs that were written earlier, found by folder or by the names {@code last} and {@code
 * previous}.
 */
final class StoredRuns {

  /** Where runs go when no folder is named. */
  static final Path USUAL_FOLDER = Path.of("evensun-runs");

  private StoredRuns() {}

  /**
   * A run.
   *
   * @param file its result.json
   * @param result its result
   */
  record StoredRun(Path file, RunResult result) {

    /** Its folder. */
    Path folder() {
      Path parent = file.getParent();
      return parent == null ? Path.of("") : parent;
    }

    /** Its result.json as it is stored. */
    byte[] content() {
      try {
        return Files.readAllBytes(file);
      } catch (IOException e) {
        throw new InputException(Place.of(file.toString()), "cannot be read");
      }
    }

    /** The folder's own name; a page names no path of this machine. */
    String name() {
      return folder().toAbsolutePath().normalize().getFileName().toString();
    }
  }

  /**
   * Reads the run a person names.
   *
   * @param name a folder, its result.json, {@code last} or {@code previous}
   */
  static StoredRun read(String name) {
    if (name.isBlank()) {
      throw new InputException(Place.of("RUN"), "names no run; write its folder, last or previous");
    }
    Path path = Path.of(name);
    if (!Files.exists(path) && (name.equals("last") || name.equals("previous"))) {
      return recent(name);
    }
    Path file = Files.isRegularFile(path) ? path : path.resolve(RunFiles.RESULT);
    if (!Files.isRegularFile(file)) {
      throw new InputException(
          Place.of(name),
          Files.isDirectory(path)
              ? "holds no " + RunFiles.RESULT + "; give the folder of a finished run"
              : "there is no such run; evensun runs lists those of a folder");
    }
    return new StoredRun(file, result(file));
  }

  private static StoredRun recent(String name) {
    List<StoredRun> runs = in(USUAL_FOLDER);
    int index = name.equals("last") ? 0 : 1;
    if (index >= runs.size()) {
      throw new InputException(
          Place.option(name),
          "folder \"" + USUAL_FOLDER + "\" holds " + runs.size() + " finished runs");
    }
    return runs.get(index);
  }

  private static RunResult result(Path file) {
    try {
      return ResultJson.read(file);
    } catch (ResultFormatException e) {
      String place = file + ": ";
      String message = e.getMessage();
      throw new InputException(
          Place.of(file.toString()),
          message.startsWith(place) ? message.substring(place.length()) : message);
    } catch (IOException e) {
      throw new InputException(Place.of(file.toString()), "cannot be read");
    }
  }

  /** The finished runs of a folder, latest first; what cannot be read is left out. */
  static List<StoredRun> in(Path folder) {
    if (!Files.isDirectory(folder)) {
      return List.of();
    }
    try (Stream<Path> entries = Files.list(folder)) {
      return entries
          .filter(entry -> Files.isRegularFile(entry.resolve(RunFiles.RESULT)))
          .flatMap(StoredRuns::readable)
          .sorted(
              Comparator.comparing((StoredRun run) -> run.result().provenance().startedUtc())
                  .thenComparing(run -> run.folder().toString())
                  .reversed())
          .toList();
    } catch (IOException e) {
      throw new InputException(Place.of(folder.toString()), "cannot be read");
    }
  }

  private static Stream<StoredRun> readable(Path folder) {
    try {
      Path file = folder.resolve(RunFiles.RESULT);
      return Stream.of(new StoredRun(file, ResultJson.read(file)));
    } catch (IOException | ResultFormatException e) {
      return Stream.empty();
    }
  }
}
