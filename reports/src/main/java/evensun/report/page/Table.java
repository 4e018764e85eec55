package evensun.report.page;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.IntStream;

/**
 * A table.
 *
 * @param id unique on the page; also the name of its CSV file
 * @param caption what it holds
 * @param columns its columns; the first heads each row
 * @param rows texts, one per column
 * @param totals how many of the last rows are totals
 */
public record Table(
    String id, String caption, List<Column> columns, List<List<String>> rows, int totals) {

  /**
   * A column.
   *
   * @param label heading
   * @param unit unit of its numbers, empty for none
   * @param numeric whether it holds numbers
   */
  public record Column(String label, String unit, boolean numeric) {

    /** Words. */
    public static Column words(String label) {
      return new Column(label, "", false);
    }

    /** Numbers. */
    public static Column numbers(String label, String unit) {
      return new Column(label, unit, true);
    }
  }

  /** Checks that every row fits the columns. */
  public Table {
    columns = List.copyOf(columns);
    rows = rows.stream().map(List::copyOf).toList();
    for (List<String> row : rows) {
      if (row.size() != columns.size()) {
        throw new IllegalArgumentException(
            "table "
                + id
                + ": a row has "
                + row.size()
                + " cells for "
                + columns.size()
                + " columns");
      }
    }
  }

  /** Whether a row is a total. */
  public boolean isTotal(int row) {
    return row >= rows.size() - totals;
  }

  /** Collects the rows of a table. */
  public static final class Builder {
    private final String id;
    private final String caption;
    private final List<Column> columns = new ArrayList<>();
    private final List<List<String>> rows = new ArrayList<>();

    /** An empty table. */
    public Builder(String id, String caption) {
      this.id = id;
      this.caption = caption;
    }

    /** Adds a column of words. */
    public Builder words(String label) {
      columns.add(Column.words(label));
      return this;
    }

    /** Adds a column of numbers in a unit. */
    public Builder numbers(String label, String unit) {
      columns.add(Column.numbers(label, unit));
      return this;
    }

    /** Adds a row. */
    public Builder row(String... cells) {
      return row(List.of(cells));
    }

    /** Adds a row. */
    public Builder row(List<String> cells) {
      rows.add(List.copyOf(cells));
      return this;
    }

    /** The table. */
    public Table build() {
      return build(0);
    }

    /** The table, its last rows being totals; a column that holds nothing is left out. */
    public Table build(int totals) {
      List<Integer> kept =
          IntStream.range(0, columns.size()).filter(this::holdsSomething).boxed().toList();
      return new Table(
          id,
          caption,
          kept.stream().map(columns::get).toList(),
          rows.stream().map(row -> kept.stream().map(row::get).toList()).toList(),
          totals);
    }

    private boolean holdsSomething(int column) {
      return column == 0
          || rows.isEmpty()
          || rows.stream().anyMatch(row -> !row.get(column).isEmpty());
    }
  }
}
