package evensun.data;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/**
 * A data file that ships with the program: lines {@code # key: value}, one line of column names,
 * rows of numbers separated by commas. Keys may repeat. Immutable.
 */
public final class DataFile {

  private final String name;
  private final Map<String, List<String>> header;
  private final double[][] columns;

  private DataFile(String name, Map<String, List<String>> header, double[][] columns) {
    this.name = name;
    this.header = header;
    this.columns = columns;
  }

  /**
   * Reads a resource.
   *
   * @param owner class beside which the resource lies
   * @param resource path relative to the class
   * @throws IllegalStateException when it is missing or malformed: the program is damaged
   */
  public static DataFile resource(Class<?> owner, String resource) {
    return read(owner, resource, true);
  }

  /** Reads the header of a resource and leaves the rows out. */
  public static DataFile header(Class<?> owner, String resource) {
    return read(owner, resource, false);
  }

  private static DataFile read(Class<?> owner, String resource, boolean rows) {
    InputStream stream = owner.getResourceAsStream(resource);
    if (stream == null) {
      throw new IllegalStateException("data file " + resource + " is missing from the program");
    }
    try (BufferedReader in =
        new BufferedReader(new InputStreamReader(stream, StandardCharsets.UTF_8), 1 << 15)) {
      return parse(resource, in, rows);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  private static DataFile parse(String name, BufferedReader in, boolean rows) throws IOException {
    Map<String, List<String>> header = new LinkedHashMap<>();
    String line = in.readLine();
    while (line != null && line.startsWith("#")) {
      int colon = line.indexOf(": ");
      header
          .computeIfAbsent(line.substring(2, colon), key -> new ArrayList<>())
          .add(line.substring(colon + 2).strip());
      line = in.readLine();
    }
    if (line == null || !rows) {
      return new DataFile(name, header, new double[0][]);
    }
    return new DataFile(name, header, columns(in, line.split(",").length));
  }

  private static double[][] columns(BufferedReader in, int count) throws IOException {
    double[][] columns = new double[count][256];
    int size = 0;
    for (String line = in.readLine(); line != null; line = in.readLine()) {
      if (size == columns[0].length) {
        for (int c = 0; c < count; c++) {
          columns[c] = Arrays.copyOf(columns[c], 2 * size);
        }
      }
      int from = 0;
      for (int c = 0; c < count; c++) {
        int to = c + 1 < count ? line.indexOf(',', from) : line.length();
        columns[c][size] = Decimals.parse(line, from, to);
        from = to + 1;
      }
      size++;
    }
    for (int c = 0; c < count; c++) {
      columns[c] = Arrays.copyOf(columns[c], size);
    }
    return columns;
  }

  /** The first value of a key, or empty. */
  public Optional<String> value(String key) {
    return values(key).stream().findFirst();
  }

  /** All values of a key, in order. */
  public List<String> values(String key) {
    return header.getOrDefault(key, List.of());
  }

  /**
   * The value of a key that must be there.
   *
   * @throws IllegalStateException when it is not: the program is damaged
   */
  public String required(String key) {
    return value(key)
        .orElseThrow(() -> new IllegalStateException("data file " + name + " lacks " + key));
  }

  /** [row] a column; a fresh array. */
  public double[] column(int index) {
    return columns[index].clone();
  }

  /** Number of columns, 0 when the file has no rows. */
  public int columnCount() {
    return columns.length;
  }
}
