package evensun.scenario;

import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.charset.CharacterCodingException;
import java.nio.charset.CodingErrorAction;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.HexFormat;
import java.util.LinkedHashMap;
import java.util.Map;

/**
 * The files a scenario names, read once each and remembered with their content, so that a run can
 * record and copy them. Not safe for threads.
 */
public final class InputFiles {

  private static final long LARGEST_BYTES = 64L << 20;

  private final Path folder;
  private final Map<String, byte[]> contents = new LinkedHashMap<>();

  /**
   * Files relative to a folder.
   *
   * @param folder folder of the scenario
   */
  public InputFiles(Path folder) {
    this.folder = folder;
  }

  /**
   * The text of a file, UTF-8; a file in another encoding is read as ISO 8859-1, which loses no
   * digit.
   *
   * @param path as the scenario names it
   * @param place where the scenario names it
   * @throws InputException when it cannot be read
   */
  public String text(String path, Place place) {
    byte[] bytes = contents.computeIfAbsent(path, p -> bytes(p, place));
    try {
      String text =
          StandardCharsets.UTF_8
              .newDecoder()
              .onMalformedInput(CodingErrorAction.REPORT)
              .decode(ByteBuffer.wrap(bytes))
              .toString();
      return text.startsWith("\uFEFF") ? text.substring(1) : text;
    } catch (CharacterCodingException e) {
      return new String(bytes, StandardCharsets.ISO_8859_1);
    }
  }

  /** Every file read so far, by the path the scenario names, in the order of reading. */
  public Map<String, byte[]> contents() {
    return java.util.Collections.unmodifiableMap(contents);
  }

  /** SHA-256 of some bytes in hexadecimal. */
  public static String sha256(byte[] bytes) {
    try {
      return HexFormat.of().formatHex(MessageDigest.getInstance("SHA-256").digest(bytes));
    } catch (NoSuchAlgorithmException e) {
      throw new IllegalStateException(e);
    }
  }

  private byte[] bytes(String path, Place place) {
    try {
      Path file = folder.resolve(path);
      if (!Files.exists(file)) {
        throw new InputException(
            place,
            "file \""
                + path
                + "\" does not exist"
                + (place.line() > 0 ? " (paths are relative to the scenario)" : ""));
      }
      if (Files.isDirectory(file)) {
        throw new InputException(place, "\"" + path + "\" is a folder, a file is needed");
      }
      if (Files.size(file) > LARGEST_BYTES) {
        throw new InputException(
            place, "file \"" + path + "\" is larger than 64 MiB, no table should be");
      }
      return Files.readAllBytes(file);
    } catch (InvalidPathException e) {
      throw new InputException(place, "\"" + path + "\" is not a path of this system");
    } catch (IOException e) {
      throw new InputException(place, "file \"" + path + "\" cannot be read: " + e.getMessage());
    }
  }
}
