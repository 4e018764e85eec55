package evensun.material;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.HashMap;
import java.util.Map;

/** The list of built-in names and their files. */
final class LibraryIndex {

  private LibraryIndex() {}

  /** File by name, as library.csv lists them after its two lines of header. */
  static Map<String, String> load() {
    Map<String, String> fileOf = new HashMap<>();
    try (InputStream stream = LibraryIndex.class.getResourceAsStream("library.csv")) {
      if (stream == null) {
        throw new IllegalStateException("the list of materials is missing from the program");
      }
      new BufferedReader(new InputStreamReader(stream, StandardCharsets.UTF_8))
          .lines()
          .skip(2)
          .map(line -> line.split(","))
          .forEach(parts -> fileOf.put(parts[0], parts[1]));
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
    return fileOf;
  }
}
