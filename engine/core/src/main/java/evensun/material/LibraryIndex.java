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
      BufferedReader in = new BufferedReader(new InputStreamReader(stream, StandardCharsets.UTF_8));
      in.readLine();
      in.readLine();
      for (String line = in.readLine(); line != null; line = in.readLine()) {
        int comma = line.indexOf(',');
        fileOf.put(line.substring(0, comma), line.substring(comma + 1));
      }
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
    return fileOf;
  }
}
