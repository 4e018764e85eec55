package evensun.result;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import tools.jackson.core.JacksonException;
import tools.jackson.core.StreamReadFeature;
import tools.jackson.core.StreamWriteFeature;
import tools.jackson.core.json.JsonFactory;
import tools.jackson.core.util.DefaultIndenter;
import tools.jackson.core.util.DefaultPrettyPrinter;
import tools.jackson.core.util.Separators;
import tools.jackson.databind.JsonNode;
import tools.jackson.databind.MapperFeature;
import tools.jackson.databind.ObjectMapper;
import tools.jackson.databind.json.JsonMapper;
import tools.jackson.databind.node.ObjectNode;

/**
 * Writes and reads {@code result.json}. Fields stand in the order of the records, those of {@link
 * RunResult#found} at the top level; what does not apply is null; numbers are the shortest text
 * that reads back as the same double. Safe for any number of threads.
 */
public final class ResultJson {

  private static final String FOUND = "found";
  private static final String TITLE = "title";
  private static final String FORMAT_VERSION = "formatVersion";

  private static final ObjectMapper MAPPER =
      JsonMapper.builder(
              JsonFactory.builder()
                  .enable(StreamWriteFeature.USE_FAST_DOUBLE_WRITER)
                  .enable(StreamReadFeature.STRICT_DUPLICATE_DETECTION)
                  .build())
          .disable(MapperFeature.SORT_PROPERTIES_ALPHABETICALLY)
          .build();

  private ResultJson() {}

  /**
   * The text of {@code result.json}, lines ended by {@code \n}.
   *
   * @throws IllegalArgumentException if a number is not finite, which JSON cannot hold
   */
  public static String write(RunResult result) {
    ObjectNode tree = flattened(result);
    NonFinite.refuse(tree, "");
    return MAPPER.writer().with(layout()).writeValueAsString(tree) + "\n";
  }

  /**
   * The same document on one line, without a line end: for a stream of one result per line.
   *
   * @throws IllegalArgumentException if a number is not finite
   */
  public static String writeLine(RunResult result) {
    ObjectNode tree = flattened(result);
    NonFinite.refuse(tree, "");
    return MAPPER.writeValueAsString(tree);
  }

  /**
   * Reads a file that {@link #write} has written, of this or an earlier version of the format.
   *
   * @throws IOException if the file cannot be read
   * @throws ResultFormatException if it holds no result
   */
  public static RunResult read(Path file) throws IOException {
    return parse(Files.readString(file, StandardCharsets.UTF_8), String.valueOf(file));
  }

  /**
   * Reads the text of {@code result.json}.
   *
   * @param text JSON
   * @param name name of the file in messages
   * @throws ResultFormatException if it holds no result
   */
  public static RunResult parse(String text, String name) {
    try {
      ObjectNode tree = Upgrade.toCurrent(object(MAPPER.readTree(text), name), name);
      return MAPPER.treeToValue(nested(tree), RunResult.class);
    } catch (JacksonException e) {
      throw new ResultFormatException(
          name + ": is not a result of Evensun: " + firstLine(e.getOriginalMessage()));
    }
  }

  private static ObjectNode flattened(RunResult result) {
    ObjectNode nested = MAPPER.valueToTree(result);
    ObjectNode flat = MAPPER.createObjectNode();
    flat.set(TITLE, nested.get(TITLE));
    for (var field : nested.properties()) {
      if (field.getKey().equals(FOUND)) {
        flat.setAll((ObjectNode) field.getValue());
      } else {
        flat.set(field.getKey(), field.getValue());
      }
    }
    return flat;
  }

  /** Moves the fields of an outcome from the top level back under {@code found}. */
  private static ObjectNode nested(ObjectNode flat) {
    ObjectNode found = MAPPER.createObjectNode();
    for (var component : Outcome.class.getRecordComponents()) {
      JsonNode value = flat.remove(component.getName());
      if (value != null) {
        found.set(component.getName(), value);
      }
    }
    flat.set(FOUND, found);
    return flat;
  }

  private static ObjectNode object(JsonNode tree, String name) {
    if (tree instanceof ObjectNode object && object.has(FORMAT_VERSION)) {
      return object;
    }
    throw new ResultFormatException(
        name + ": is not a result of Evensun: formatVersion is missing; give the folder of a run");
  }

  private static String firstLine(String message) {
    return message.lines().findFirst().orElse("").strip();
  }

  /** Objects on lines of their own, arrays of numbers on one. */
  private static DefaultPrettyPrinter layout() {
    return new DefaultPrettyPrinter()
        .withSeparators(
            Separators.createDefaultInstance().withObjectNameValueSpacing(Separators.Spacing.AFTER))
        .withObjectIndenter(new DefaultIndenter("  ", "\n"));
  }
}
