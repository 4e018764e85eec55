package evensun.run;

import evensun.scenario.InputFiles;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.net.URISyntaxException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Properties;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.FutureTask;

/** What this build is. */
public final class BuildInfo {

  private static final Properties PROPERTIES = load();
  private static final FutureTask<String> FINGERPRINT = new FutureTask<>(BuildInfo::hash);

  private BuildInfo() {}

  /** Version of the program. */
  public static String version() {
    return PROPERTIES.getProperty("version");
  }

  /**
   * First 12 digits of the SHA-256 of the core's jar; {@code "classes"} outside a jar. Worked out
   * by the first thread that asks; that takes a while, so ask aside when it will be needed.
   */
  public static String fingerprint() {
    FINGERPRINT.run();
    try {
      return FINGERPRINT.get();
    } catch (ExecutionException e) {
      return "unknown";
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
      return "unknown";
    }
  }

  private static String hash() throws URISyntaxException, IOException {
    Path jar = Path.of(BuildInfo.class.getProtectionDomain().getCodeSource().getLocation().toURI());
    return Files.isRegularFile(jar)
        ? InputFiles.sha256(Files.readAllBytes(jar)).substring(0, 12)
        : "classes";
  }

  private static Properties load() {
    try (InputStream in = BuildInfo.class.getResourceAsStream("/evensun/build.properties")) {
      Properties properties = new Properties();
      properties.load(in);
      return properties;
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }
}
