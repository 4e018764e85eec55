package evensun.scenario.reader;

import evensun.scenario.Fault;
import evensun.scenario.InputException;
import evensun.scenario.Place;
import evensun.scenario.Source;
import evensun.scenario.tree.Nearest;
import evensun.scenario.tree.Shown;
import java.io.IOException;
import java.io.InputStream;
import java.nio.ByteBuffer;
import java.nio.charset.CharacterCodingException;
import java.nio.charset.StandardCharsets;
import java.nio.file.AccessDeniedException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;

/** Gets the text of a scenario from a file or a stream, and refuses what cannot be one. */
public final class Sources {

  private static final int LARGEST_BYTES = 1 << 20;

  private Sources() {}

  /**
   * The text of a file.
   *
   * @throws InputException when there is no such file or its content is no text
   */
  public static Source open(Path file) {
    String name = file.toString();
    Path folder = file.toAbsolutePath().normalize().getParent();
    if (Files.isDirectory(file)) {
      throw wrong(name, "this is a folder; name the scenario file in it" + scenariosIn(file));
    }
    if (!Files.exists(file) || folder == null) {
      throw wrong(name, "there is no such file" + nearestFile(file));
    }
    try (InputStream in = Files.newInputStream(file)) {
      return of(name, folder, in.readNBytes(LARGEST_BYTES + 1));
    } catch (AccessDeniedException e) {
      throw wrong(name, "the file may not be read; check its permissions");
    } catch (IOException e) {
      throw wrong(name, "the file cannot be read: " + Shown.plain(String.valueOf(e.getMessage())));
    }
  }

  /**
   * The text of a stream, such as standard input.
   *
   * @param name what messages call it
   * @param folder what paths in it are relative to
   * @throws InputException when its content is no text
   */
  public static Source open(String name, Path folder, InputStream in) {
    try {
      return of(name, folder, in.readNBytes(LARGEST_BYTES + 1));
    } catch (IOException e) {
      throw wrong(name, "cannot be read: " + Shown.plain(String.valueOf(e.getMessage())));
    }
  }

  private static Source of(String name, Path folder, byte[] bytes) {
    if (bytes.length > LARGEST_BYTES) {
      throw wrong(name, "the file is larger than 1 MiB; a scenario holds no tables, it names them");
    }
    String text = decoded(name, bytes);
    checkCharacters(name, text);
    return new Source(name, folder, text);
  }

  private static String decoded(String name, byte[] bytes) {
    if (bytes.length > 1 && ((bytes[0] & 0xFF) >= 0xFE && (bytes[1] & 0xFF) >= 0xFE)) {
      throw wrong(name, "the file is in UTF-16; save it as UTF-8");
    }
    try {
      String text = StandardCharsets.UTF_8.newDecoder().decode(ByteBuffer.wrap(bytes)).toString();
      return text.startsWith("\uFEFF") ? text.substring(1) : text;
    } catch (CharacterCodingException e) {
      throw new InputException(
          new Place(name, lineOfFirstBadByte(bytes), 0, ""),
          "the file is not in UTF-8 here; save it as UTF-8");
    }
  }

  /** The first line that does not decode on its own; no UTF-8 character holds a line feed. */
  private static int lineOfFirstBadByte(byte[] bytes) {
    int line = 1;
    int start = 0;
    for (int i = 0; i <= bytes.length; i++) {
      if (i == bytes.length || bytes[i] == '\n') {
        if (!decodes(ByteBuffer.wrap(bytes, start, i - start))) {
          return line;
        }
        line++;
        start = i + 1;
      }
    }
    return line;
  }

  private static boolean decodes(ByteBuffer bytes) {
    try {
      StandardCharsets.UTF_8.newDecoder().decode(bytes);
      return true;
    } catch (CharacterCodingException e) {
      return false;
    }
  }

  private static void checkCharacters(String name, String text) {
    int line = 1;
    for (int i = 0; i < text.length(); i++) {
      char c = text.charAt(i);
      if (c == '\n') {
        line++;
      }
      if (isForbidden(c)) {
        throw new InputException(
            new Place(name, line, 0, ""),
            String.format(
                "character \\u%04x has no place in a text; is this a scenario file?", (int) c));
      }
    }
  }

  /** What YAML 1.2 does not allow in a stream. */
  private static boolean isForbidden(char c) {
    boolean control = c < ' ' && c != '\n' && c != '\r' && c != '\t';
    boolean highControl = c >= 0x7F && c < 0xA0 && c != 0x85;
    return control || highControl || c == 0xFFFE || c == 0xFFFF || c == 0xFEFF;
  }

  private static String nearestFile(Path file) {
    Path parent = file.toAbsolutePath().normalize().getParent();
    Path last = file.getFileName();
    if (parent == null || last == null || !Files.isDirectory(parent)) {
      return ", and no such folder either";
    }
    return Nearest.of(last.toString(), scenarioNames(parent))
        .map(n -> "; did you mean " + Shown.plain(n) + "?")
        .orElse("");
  }

  private static String scenariosIn(Path folder) {
    List<String> names = scenarioNames(folder);
    return names.isEmpty()
        ? ""
        : " (" + Shown.list(names.subList(0, Math.min(5, names.size()))) + ")";
  }

  private static List<String> scenarioNames(Path folder) {
    try (Stream<Path> files = Files.list(folder)) {
      return files
          .map(f -> String.valueOf(f.getFileName()))
          .filter(f -> f.endsWith(".yaml") || f.endsWith(".yml") || f.endsWith(".json"))
          .sorted()
          .limit(200)
          .toList();
    } catch (IOException e) {
      return List.of();
    }
  }

  private static InputException wrong(String name, String message) {
    return new InputException(List.of(new Fault(Place.of(name), message)));
  }
}
