package evensun.data;

import java.util.List;
import java.util.Locale;

/**
 * Numbers read from a text as people and instruments write them.
 *
 * @param separator what stood between the numbers, in words
 * @param decimalComma whether numbers were written with a decimal comma
 * @param blocks stretches of rows, parted by lines of words; at least one
 */
public record TextTable(String separator, boolean decimalComma, List<Block> blocks) {

  public TextTable {
    blocks = List.copyOf(blocks);
  }

  /**
   * A stretch of rows with the same number of columns.
   *
   * @param heads what the lines of words before it say of each column, lower case; empty strings
   *     where they say nothing
   * @param rows the rows
   */
  public record Block(List<String> heads, List<Row> rows) {

    public Block {
      heads = List.copyOf(heads);
      rows = List.copyOf(rows);
    }

    /** Number of columns. */
    public int columnCount() {
      return rows.get(0).values().size();
    }

    /** [row] a column. */
    public double[] column(int index) {
      return rows.stream().mapToDouble(row -> row.values().get(index)).toArray();
    }

    /** What the heads say of a column, or nothing. */
    public String head(int index) {
      return index < heads.size() ? heads.get(index).toLowerCase(Locale.ROOT) : "";
    }
  }

  /**
   * A row.
   *
   * @param line line in the file, from 1
   * @param values its numbers; NaN where the file says so
   */
  public record Row(int line, List<Double> values) {

    public Row {
      values = List.copyOf(values);
    }
  }
}
