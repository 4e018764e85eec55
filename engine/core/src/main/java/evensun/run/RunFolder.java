package evensun.run;

import evensun.scenario.InputException;
import evensun.scenario.Place;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.AtomicMoveNotSupportedException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.time.Instant;
import java.time.ZoneOffset;
import java.time.format.DateTimeFormatter;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import java.util.stream.Stream;

/**
 * The folder of one run. Every file is written under another name first and then renamed, and is
 * listed in {@value #LIST}, so that a later run may replace what Evensun wrote and nothing else.
 */
public final class RunFolder {

  /** Lists the files that Evensun wrote into the folder. */
  public static final String LIST = "evensun-files.txt";

  private static final DateTimeFormatter STAMP =
      DateTimeFormatter.ofPattern("yyyyMMdd'T'HHmmss'Z'").withZone(ZoneOffset.UTC);

  private final Path folder;
  private final Set<String> written = new LinkedHashSet<>();

  private RunFolder(Path folder) {
    this.folder = folder;
  }

  /** Where a run goes when no folder is named. */
  public static Path defaultFolder(Path workingDirectory, String scenarioName, Instant now) {
    Path runs = workingDirectory.resolve("evensun-runs");
    String name = scenarioName + "-" + STAMP.format(now);
    Path folder = runs.resolve(name);
    for (int i = 2; Files.exists(folder); i++) {
      folder = runs.resolve(name + "-" + i);
    }
    return folder;
  }

  /**
   * Makes the folder.
   *
   * @param folder where
   * @param force whether files that Evensun wrote there earlier may be replaced
   * @throws InputException when it is not empty and may not be replaced, or cannot be written
   */
  public static RunFolder create(Path folder, boolean force) {
    Place place = Place.option("--out");
    if (folder.toString().isBlank()) {
      throw new InputException(place, "names no folder; write one, such as --out my-run");
    }
    if (Files.exists(folder) && !Files.isDirectory(folder)) {
      throw new InputException(place, "\"" + folder + "\" is a file, a folder is needed");
    }
    try {
      if (!isEmpty(folder)) {
        if (!force) {
          throw new InputException(
              place,
              "folder \""
                  + folder
                  + "\" is not empty; choose another, or add --force to replace what Evensun wrote there");
        }
        clear(folder);
      }
      Files.createDirectories(folder);
      RunFolder run = new RunFolder(folder);
      run.write(LIST, "");
      return run;
    } catch (IOException | UncheckedIOException e) {
      throw new InputException(place, "folder \"" + folder + "\" cannot be written: " + reason(e));
    }
  }

  /**
   * Opens the folder of an earlier run to go on with it.
   *
   * @throws InputException when it is not one
   */
  public static RunFolder open(Path folder) {
    if (!Files.isRegularFile(folder.resolve(LIST))) {
      throw new InputException(
          Place.of(folder.toString()), "is not the folder of a run (it holds no " + LIST + ")");
    }
    RunFolder run = new RunFolder(folder);
    run.written.addAll(listed(folder));
    return run;
  }

  private static String reason(Exception e) {
    return e.getClass().getSimpleName().replace("Exception", "") + " (" + e.getMessage() + ")";
  }

  private static boolean isEmpty(Path folder) throws IOException {
    if (!Files.exists(folder)) {
      return true;
    }
    try (Stream<Path> entries = Files.list(folder)) {
      return entries.findAny().isEmpty();
    }
  }

  private static List<String> listed(Path folder) {
    try {
      return Files.readAllLines(folder.resolve(LIST)).stream().filter(s -> !s.isBlank()).toList();
    } catch (IOException e) {
      return List.of();
    }
  }

  /** Deletes what the list names, inside the folder only. */
  private static void clear(Path folder) throws IOException {
    for (String name : listed(folder)) {
      Path file = folder.resolve(name).normalize();
      if (file.startsWith(folder) && Files.isRegularFile(file)) {
        Files.delete(file);
      }
    }
    Files.deleteIfExists(folder.resolve(LIST));
  }

  /** The folder. */
  public Path path() {
    return folder;
  }

  /** A file of the run, which need not exist. */
  public Path file(String name) {
    return folder.resolve(name);
  }

  /** Writes a text file, replacing an earlier one. */
  public void write(String name, String text) {
    write(name, text.getBytes(StandardCharsets.UTF_8));
  }

  /**
   * Writes a file, replacing an earlier one; a reader sees the old content or the new, never half.
   */
  public synchronized void write(String name, byte[] content) {
    try {
      if (!name.equals(LIST) && written.add(name)) {
        replace(LIST, (String.join("\n", written) + "\n").getBytes(StandardCharsets.UTF_8));
      }
      replace(name, content);
    } catch (IOException e) {
      throw new UncheckedIOException("cannot write " + folder.resolve(name), e);
    }
  }

  /** Notes that a file of this name is written by someone else, such as a log that grows. */
  public synchronized Path claim(String name) {
    try {
      if (written.add(name)) {
        replace(LIST, (String.join("\n", written) + "\n").getBytes(StandardCharsets.UTF_8));
      }
    } catch (IOException e) {
      throw new UncheckedIOException("cannot write " + folder.resolve(LIST), e);
    }
    return folder.resolve(name);
  }

  private void replace(String name, byte[] content) throws IOException {
    Path target = folder.resolve(name);
    Files.createDirectories(target.getParent());
    Path temporary = target.resolveSibling(target.getFileName() + ".part");
    Files.write(temporary, content);
    try {
      Files.move(
          temporary, target, StandardCopyOption.ATOMIC_MOVE, StandardCopyOption.REPLACE_EXISTING);
    } catch (AtomicMoveNotSupportedException e) {
      Files.move(temporary, target, StandardCopyOption.REPLACE_EXISTING);
    }
  }
}
