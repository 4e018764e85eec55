package evensun.dist;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.TimeUnit;

/** The unpacked distribution as a user runs it: a process of its own in a folder of its own. */
final class Program {

  private static final long LONGEST_SECONDS = 240;

  private final Path workingFolder;

  Program(Path workingFolder) {
    this.workingFolder = workingFolder;
  }

  /** What a run of the program left behind. */
  record Run(int status, String out, String err) {}

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
    try {
      Path out = Files.createTempFile("evensun-out", ".txt");
      Path err = Files.createTempFile("evensun-err", ".txt");
      Path in = Files.writeString(Files.createTempFile("evensun-in", ".txt"), input);
      Process process =
          builder(workingFolder, arguments)
              .redirectOutput(out.toFile())
              .redirectError(err.toFile())
              .redirectInput(in.toFile())
              .start();
      if (!process.waitFor(LONGEST_SECONDS, TimeUnit.SECONDS)) {
        process.destroyForcibly();
        throw new IllegalStateException("still running: " + String.join(" ", arguments));
      }
      return new Run(process.exitValue(), read(out), read(err));
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
      throw new IllegalStateException(e);
    }
  }

  private static String read(Path file) throws IOException {
    String text = Files.readString(file, StandardCharsets.UTF_8);
    Files.delete(file);
    return text;
  }
}
