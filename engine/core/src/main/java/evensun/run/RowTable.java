package evensun.run;

import evensun.scenario.InputException;
import evensun.scenario.Place;
import java.io.IOException;
import java.io.StringReader;
import java.util.ArrayList;
import java.util.List;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVParser;
import org.apache.commons.csv.CSVRecord;

/**
 * A table whose columns are keys of a scenario and whose rows are their values.
 *
 * @param keys one per column, such as {@code perovskite.thicknessNm}
 * @param rows the rows
 */
public record RowTable(List<String> keys, List<Row> rows) {

  public RowTable {
    keys = List.copyOf(keys);
    rows = List.copyOf(rows);
  }

  /**
   * A row.
   *
   * @param line its line in the file, from 1
   * @param values one per key, as written
   */
  public record Row(int line, List<String> values) {

    public Row {
      values = List.copyOf(values);
    }
  }

  /**
   * Reads a table: a header line with keys, then lines with as many values.
   *
   * @param name name of the file in messages
   * @param text its text
   * @throws InputException when it is no such table
   */
  public static RowTable parse(String name, String text) {
    CSVFormat format = CSVFormat.DEFAULT.builder().setCommentMarker('#').setTrim(true).get();
    try (CSVParser parser = CSVParser.parse(new StringReader(text), format)) {
      List<String> keys = null;
      List<Row> rows = new ArrayList<>();
      for (CSVRecord record : parser) {
        int line = (int) parser.getCurrentLineNumber();
        if (keys == null) {
          keys = record.toList();
        } else if (record.size() != keys.size()) {
          throw new InputException(
              new Place(name, line, 1, ""),
              "needs %d values, one per key of the header, but has %d"
                  .formatted(keys.size(), record.size()));
        } else {
          rows.add(new Row(line, record.toList()));
        }
      }
      if (keys == null || rows.isEmpty()) {
        throw new InputException(
            Place.of(name),
            "holds no rows; write a header line with keys such as perovskite.thicknessNm, then one line of values per evaluation");
      }
      return new RowTable(keys, rows);
    } catch (IOException | java.io.UncheckedIOException e) {
      throw new InputException(Place.of(name), "is not a CSV table: " + e.getMessage());
    }
  }
}
