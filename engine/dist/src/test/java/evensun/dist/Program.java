package evensun.dist;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;

/** The unpacked distribution as a user runs it: a process of its own in a folder of its own. */
final class Program {

  private final Path workingFolder;

  Program(Path workingFolder) {
    this.workingFolder = workingFolder;
  }

  /** The unpacked distribution. */
  static Path folder() {
    return Path.of(System.getProperty("evensun.folder"));
  }

  /** A scenario that comes with the program. */
  static Path scenario(String name) {
    return folder().resolve("scenarios").resolve(name);
  }

  static ProcessBuilder builder(Path workingFolder, String... arguments) {
    List<String> command = new ArrayList<>();
    command.add(folder().resolve("bin/evensun").toString());
    command.addAll(List.of(arguments));
    return new ProcessBuilder(command).directory(workingFolder.toFile());
  }

  /**
   * As above, with Ctrl-C as a terminal gives it: a build in the background hands the signal down
   * as ignored, and a Java process then never sees it.
   */
  static ProcessBuilder builderWithSignals(Path workingFolder, String... arguments) {
    ProcessBuilder builder = builder(workingFolder, arguments);
    List<String> command = new ArrayList<>(List.of("env", "--default-signal=INT"));
    command.addAll(builder.command());
    return builder.command(command);
  }

  Run run(String... arguments) {
    return runWithInput("", arguments);
  }

  Run runWithInput(String input, String... arguments) {
    return Run.of(builder(workingFolder, arguments), input);
  }
}
