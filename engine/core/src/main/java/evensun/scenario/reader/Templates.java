package evensun.scenario.reader;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;

/** Commented scenarios to start from. */
public final class Templates {

  /** Name of the schema file to which the first line of each template points. */
  public static final String SCHEMA_FILE = "evensun-scenario.schema.json";

  /** The template that serves most. */
  public static final String USUAL = "planar";

  private Templates() {}

  /** Names with what each one is, the usual one first. */
  public static Map<String, String> names() {
    Map<String, String> names = new LinkedHashMap<>();
    names.put(USUAL, "planar perovskite on silicon, two terminals");
    names.put("textured-two-junction", "perovskite on pyramids of silicon, two terminals");
    names.put("all-thin-film", "two thin-film junctions behind glass");
    names.put("three-junction", "III-V three-junction cell on germanium");
    names.put("four-terminal", "perovskite laminated onto silicon, terminals of their own");
    return names;
  }

  /** Text of a template; empty when there is none of that name. */
  public static Optional<String> text(String name) {
    if (!names().containsKey(name)) {
      return Optional.empty();
    }
    String resource = "/evensun/template/" + name + ".yaml";
    try (InputStream in = Templates.class.getResourceAsStream(resource)) {
      if (in == null) {
        throw new IllegalStateException(resource + " is missing");
      }
      return Optional.of(new String(in.readAllBytes(), StandardCharsets.UTF_8));
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }
}
