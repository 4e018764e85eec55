package evensun.scenario.reader;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;

/** The JSON Schema of a scenario, for editors. The reader does not use it. */
public final class ScenarioSchema {

  /** By which it is known, whatever its file is called. */
  public static final String ID = "urn:evensun:scenario:1";

  private static final String RESOURCE = "/evensun/scenario.schema.json";

  private ScenarioSchema() {}

  /** Its text. */
  public static String text() {
    try (InputStream in = ScenarioSchema.class.getResourceAsStream(RESOURCE)) {
      if (in == null) {
        throw new IllegalStateException(RESOURCE + " is missing");
      }
      return new String(in.readAllBytes(), StandardCharsets.UTF_8);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }
}
