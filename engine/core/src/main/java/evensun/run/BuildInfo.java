package evensun.run;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.util.Properties;

/** What this build is. */
public final class BuildInfo {

  private static final Properties PROPERTIES = load();

  private BuildInfo() {}

  /** Version of the program. */
  public static String version() {
    return PROPERTIES.getProperty("version");
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
