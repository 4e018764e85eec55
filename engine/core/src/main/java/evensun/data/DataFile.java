package evensun.data;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/**
 * A data file that ships with the program: lines {@code # key: value}, one line of column names,
 * rows of numbers separated by commas. Keys may repeat. Immutable.
 *
 * <p>Plain loops here and where these files are made use of: a scenario waits for them, and lambdas
 * and streams are slow to start.
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
    try (stream) {
      return parse(resource, stream.readAllBytes(), rows);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  private static DataFile parse(String name, byte[] bytes, boolean rows) {
    Map<String, List<String>> header = new LinkedHashMap<>();
    int at = 0;
    while (at < bytes.length && bytes[at] == '#') {
      int end = lineEnd(bytes, at);
      String line = new String(bytes, at, end - at, StandardCharsets.UTF_8);
      int colon = line.indexOf(": ");
      add(header, line.substring(2, colon), line.substring(colon + 2).strip());
      at = end + 1;
    }
    return new DataFile(
        name, header, rows && at < bytes.length ? columns(bytes, at) : new double[0][]);
  }

  private static void add(Map<String, List<String>> header, String key, String value) {
    List<String> values = header.get(key);
    if (values == null) {
      values = new ArrayList<>();
      header.put(key, values);
    }
    values.add(value);
  }

  private static int lineEnd(byte[] bytes, int from) {
    int end = from;
    while (end < bytes.length && bytes[end] != '\n') {
      end++;
    }
    return end;
  }

  /** The numbers after a line of column names. */
  private static double[][] columns(byte[] bytes, int from) {
    int at = lineEnd(bytes, from);
    int count = fields(bytes, from, at);
    int size = 0;
    for (int i = at + 1; i < bytes.length; i++) {
      size += bytes[i] == '\n' ? 1 : 0;
    }
    if (bytes[bytes.length - 1] != '\n') {
      size++;
    }
    double[][] columns = new double[count][size];
    Decimals numbers = new Decimals(bytes, at + 1);
    for (int row = 0; row < size; row++) {
      for (double[] column : columns) {
        column[row] = numbers.next();
      }
    }
    return columns;
  }

  /** The first value of a key, or empty. */
  public Optional<String> value(String key) {
    List<String> values = values(key);
    return values.isEmpty() ? Optional.empty() : Optional.of(values.get(0));
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
    List<String> values = values(key);
    if (values.isEmpty()) {
      throw new IllegalStateException("data file " + name + " lacks " + key);
    }
    return values.get(0);
  }

  /** The numbers of a value that must be there, separated by commas. */
  public double[] numbers(String key) {
    return numbersIn(required(key));
  }

  /** Numbers separated by commas. */
  public static double[] numbersIn(String text) {
    byte[] bytes = text.getBytes(StandardCharsets.US_ASCII);
    double[] numbers = new double[fields(bytes, 0, bytes.length)];
    Decimals decimals = new Decimals(bytes, 0);
    for (int i = 0; i < numbers.length; i++) {
      numbers[i] = decimals.next();
    }
    return numbers;
  }

  private static int fields(byte[] bytes, int from, int to) {
    int count = 1;
    for (int i = from; i < to; i++) {
      count += bytes[i] == ',' ? 1 : 0;
    }
    return count;
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
