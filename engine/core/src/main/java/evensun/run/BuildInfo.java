package evensun.run;

import evensun.scenario.InputFiles;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.net.URISyntaxException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Properties;

/** What this build is. */
public final class BuildInfo {

  private static final Properties PROPERTIES = load();

  private BuildInfo() {}

  /** Version of the program. */
  public static String version() {
    return PROPERTIES.getProperty("version");
  }

  /** First 12 digits of the SHA-256 of the core's jar; {@code "classes"} outside a jar. */
  public static String fingerprint() {
    try {
      Path jar =
          Path.of(BuildInfo.class.getProtectionDomain().getCodeSource().getLocation().toURI());
      return Files.isRegularFile(jar)
          ? InputFiles.sha256(Files.readAllBytes(jar)).substring(0, 12)
          : "classes";
    } catch (URISyntaxException | IOException e) {
      return "unknown";
    }
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
