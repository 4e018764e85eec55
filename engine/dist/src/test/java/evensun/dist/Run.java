package evensun.dist;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.concurrent.TimeUnit;

/** How a process ended and what it printed. */
record Run(int status, String out, String err) {

  private static final long LONGEST_SECONDS = 300;

  /** Runs a process to its end. */
  static Run of(ProcessBuilder builder, String input) {
    try {
      Path folder = Files.createTempDirectory("evensun-test");
      List<Path> files =
          List.of(folder.resolve("in"), folder.resolve("out"), folder.resolve("err"));
      try {
        Files.writeString(files.get(0), input);
        return of(builder, files);
      } finally {
        for (Path file : files) {
          Files.deleteIfExists(file);
        }
        Files.delete(folder);
      }
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
      throw new IllegalStateException(e);
    }
  }

  private static Run of(ProcessBuilder builder, List<Path> files)
      throws IOException, InterruptedException {
    Process process =
        builder
            .redirectInput(files.get(0).toFile())
            .redirectOutput(files.get(1).toFile())
            .redirectError(files.get(2).toFile())
            .start();
    if (!process.waitFor(LONGEST_SECONDS, TimeUnit.SECONDS)) {
      process.destroyForcibly();
      throw new IllegalStateException("still running: " + String.join(" ", builder.command()));
    }
    return new Run(process.exitValue(), read(files.get(1)), read(files.get(2)));
  }

  private static String read(Path file) throws IOException {
    return Files.readString(file, StandardCharsets.UTF_8);
  }
}
