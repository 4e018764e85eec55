package evensun.externalprocess;

import evensun.spi.UnsupportedProblem;
import java.io.File;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;

/**
 * What a scenario says under {@code solver.options}.
 *
 * <p>A scenario may come from somebody else, so it names a program only by its file name; where
 * programs are looked for, the user alone says: in the environment variable {@code
 * EVENSUN_PROGRAMS}.
 *
 * @param command program and arguments
 * @param limit how long the program may take to answer a request
 * @param others options that are passed on to the program
 */
record Options(List<String> command, Duration limit, Map<String, String> others) {

  /** Environment variable with the folders of programs, separated as in PATH. */
  static final String FOLDERS = "EVENSUN_PROGRAMS";

  private static final String PROGRAM = "program";
  private static final String ARGUMENTS = "arguments";
  private static final String TIMEOUT = "timeoutSeconds";
  private static final String PASSED_ON = "option.";
  private static final Set<String> OWN = Set.of(PROGRAM, ARGUMENTS, TIMEOUT);
  private static final double DEFAULT_SECONDS = 60;
  private static final double MOST_SECONDS = 86_400;

  Options {
    command = List.copyOf(command);
    others = Map.copyOf(others);
  }

  /**
   * Reads the options.
   *
   * @throws UnsupportedProblem naming what is wrong and what to write
   */
  static Options of(Map<String, String> options) {
    Map<String, String> others = new TreeMap<>();
    for (Map.Entry<String, String> option : options.entrySet()) {
      if (option.getKey().startsWith(PASSED_ON)) {
        others.put(option.getKey().substring(PASSED_ON.length()), option.getValue());
      } else if (!OWN.contains(option.getKey())) {
        throw new UnsupportedProblem(
            "option \"%s\" is unknown to solver external-process; it takes program, arguments,"
                    .formatted(option.getKey())
                + " timeoutSeconds, and option.NAME for options of the program itself");
      }
    }
    List<String> command = new ArrayList<>(List.of(program(options.get(PROGRAM)).toString()));
    String arguments = options.getOrDefault(ARGUMENTS, "").strip();
    if (!arguments.isEmpty()) {
      command.addAll(List.of(arguments.split("\\s+")));
    }
    return new Options(command, limit(options.get(TIMEOUT)), others);
  }

  private static Path program(String name) {
    if (name == null || name.isBlank()) {
      throw new UnsupportedProblem(
          "solver external-process needs solver.options.program, the file name of a program in a"
              + " folder of "
              + FOLDERS);
    }
    if (!name.equals(Path.of(name).getFileName().toString()) || name.equals("..")) {
      throw new UnsupportedProblem(
          "option program must be a file name without folders but was \"%s\"; name its folder in %s"
              .formatted(name, FOLDERS));
    }
    for (String folder : folders()) {
      Path file = Path.of(folder, name).toAbsolutePath();
      if (Files.isRegularFile(file)) {
        if (!Files.isExecutable(file)) {
          throw new UnsupportedProblem(
              "program %s is not executable; allow it with chmod +x".formatted(file));
        }
        return file;
      }
    }
    throw new UnsupportedProblem(
        "there is no program \"%s\" in the folders of %s (%s); put its folder there"
            .formatted(name, FOLDERS, folders().isEmpty() ? "not set" : folders()));
  }

  private static List<String> folders() {
    // The property is for tests, which cannot change their own environment.
    String value = System.getProperty("evensun.programs", System.getenv(FOLDERS));
    return value == null || value.isBlank() ? List.of() : List.of(value.split(File.pathSeparator));
  }

  private static Duration limit(String text) {
    double seconds = DEFAULT_SECONDS;
    try {
      seconds = text == null ? seconds : Double.parseDouble(text);
    } catch (NumberFormatException e) {
      seconds = Double.NaN;
    }
    if (!(seconds > 0 && seconds <= MOST_SECONDS)) {
      throw new UnsupportedProblem(
          "option timeoutSeconds must be in (0, 86400] s but was \"" + text + "\"");
    }
    return Duration.ofMillis(Math.round(seconds * 1e3));
  }
}
