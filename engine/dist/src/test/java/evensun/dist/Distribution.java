package evensun.dist;

import java.io.File;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;

/** The built distribution, and processes started from it as a user does. */
final class Distribution {

  private Distribution() {}

  /** The assembled folder; it must not be written to. */
  static Path folder() {
    return property("evensun.folder");
  }

  static Path zip() {
    return property("evensun.zip");
  }

  /** The sources. */
  static Path repository() {
    return property("evensun.repository");
  }

  /** Unpacks the zip as a user would; returns the folder that holds bin. */
  static Path unpack(Path into) {
    try {
      Files.createDirectories(into);
      Process unzip =
          new ProcessBuilder("jar", "xf", zip().toString())
              .directory(into.toFile())
              .redirectErrorStream(true)
              .start();
      unzip.getInputStream().readAllBytes();
      if (unzip.waitFor() != 0) {
        throw new IllegalStateException("cannot unpack " + zip());
      }
      Path home = into.resolve(zip().getFileName().toString().replaceFirst("\\.zip$", ""));
      // The jar tool does not restore access rights, which unzip does.
      for (File file : home.resolve("bin").toFile().listFiles()) {
        file.setExecutable(true);
      }
      return home;
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    } catch (InterruptedException e) {
      throw new IllegalStateException(e);
    }
  }

  /** Runs the launcher of a folder; environment values of "" are taken out. */
  static Run run(Path launcher, Path workingFolder, Map<String, String> more, String... args) {
    return Run.of(builder(launcher, workingFolder, more, args), "");
  }

  static ProcessBuilder builder(
      Path launcher, Path workingFolder, Map<String, String> more, String... args) {
    List<String> command = new ArrayList<>(List.of(launcher.toString()));
    command.addAll(List.of(args));
    ProcessBuilder builder = new ProcessBuilder(command).directory(workingFolder.toFile());
    // Dumping classes in the background would outlive a test's folder.
    builder.environment().put("EVENSUN_ARCHIVE", "off");
    builder.environment().putAll(more);
    builder.environment().values().removeIf(String::isEmpty);
    return builder;
  }

  /** A folder that holds some of the system's tools and nothing else, for a narrow PATH. */
  static Path tools(Path folder, String... names) throws IOException {
    Files.createDirectories(folder);
    for (String name : names) {
      Path real = Files.exists(Path.of("/usr/bin", name)) ? Path.of("/usr/bin") : Path.of("/bin");
      Path tool = folder.resolve(name);
      Files.writeString(tool, "#!/bin/sh\nexec " + real.resolve(name) + " \"$@\"\n");
      if (!tool.toFile().setExecutable(true)) {
        throw new IOException("cannot make " + tool + " executable");
      }
    }
    return folder;
  }

  private static Path property(String name) {
    String value = System.getProperty(name);
    if (value == null) {
      throw new IllegalStateException("run by Maven's verify, which sets " + name);
    }
    return Path.of(value);
  }
}
