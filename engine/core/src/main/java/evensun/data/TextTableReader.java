package evensun.data;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;

/**
 * Reads tables of numbers from text: separated by comma, semicolon, tab or blanks, with decimal
 * point or decimal comma, with or without lines of words before and between the numbers; lines that
 * begin with # or % are comments.
 *
 * <p>The separator is the one under which most lines are rows of numbers. Where a comma could be
 * both, the file is refused rather than guessed.
 */
public final class TextTableReader {

  /** The ways to part a line, in the order of preference between equals. */
  private enum Style {
    SEMICOLON_POINT("semicolon", ";", false),
    SEMICOLON_COMMA("semicolon", ";", true),
    TAB_POINT("tab", "\t", false),
    TAB_COMMA("tab", "\t", true),
    COMMA("comma", ",", false),
    BLANK_POINT("blanks", "\\s+", false),
    BLANK_COMMA("blanks", "\\s+", true);

    private final String label;
    private final String pattern;
    private final boolean decimalComma;

    Style(String label, String pattern, boolean decimalComma) {
      this.label = label;
      this.pattern = pattern;
      this.decimalComma = decimalComma;
    }

    List<String> cells(String line) {
      String text = pattern.equals("\\s+") ? line.strip() : line;
      return Arrays.stream(text.split(pattern, -1)).map(c -> unquoted(c.strip())).toList();
    }

    /** The numbers of a line, or null when it is not a row of at least two. */
    List<Double> numbers(String line) {
      List<String> cells = cells(line);
      int last = cells.size();
      while (last > 0 && cells.get(last - 1).isEmpty()) {
        last--;
      }
      if (last < 2) {
        return null;
      }
      List<Double> values = new ArrayList<>(last);
      for (String cell : cells.subList(0, last)) {
        Double value = number(cell, decimalComma);
        if (value == null) {
          return null;
        }
        values.add(value);
      }
      return values;
    }
  }

  private TextTableReader() {}

  /**
   * Reads a table.
   *
   * @param text content of the file
   * @return at least one block with at least one row
   * @throws TableFormatException when it is a spreadsheet, holds no numbers, or can be read in more
   *     than one way
   */
  public static TextTable read(String text) {
    refuseSpreadsheet(text);
    String[] lines = text.split("\\R", -1);
    Style style = best(lines);
    List<TextTable.Block> blocks = blocks(lines, style);
    refuseDoubtfulCommas(style, blocks);
    return new TextTable(style.label, style.decimalComma, blocks);
  }

  private static void refuseSpreadsheet(String text) {
    if (text.startsWith("PK\u0003\u0004") || text.startsWith("\u00D0\u00CF\u0011\u00E0")) {
      throw new TableFormatException(
          0,
          "is a spreadsheet; open it, choose \"Save as\" and the type CSV (comma or semicolon"
              + " separated), and give that file");
    }
    if (text.indexOf('\0') >= 0) {
      throw new TableFormatException(
          0, "is not plain text; save the table as CSV in the encoding UTF-8");
    }
  }

  private static Style best(String[] lines) {
    Style best = null;
    int most = 0;
    for (Style style : Style.values()) {
      int rows = 0;
      for (String line : lines) {
        if (!isComment(line) && style.numbers(line) != null) {
          rows++;
        }
      }
      if (rows > most) {
        most = rows;
        best = style;
      }
    }
    if (best == null) {
      throw new TableFormatException(
          0, "holds no numbers; it needs lines such as wavelength_nm,n,k");
    }
    return best;
  }

  private static List<TextTable.Block> blocks(String[] lines, Style style) {
    List<TextTable.Block> blocks = new ArrayList<>();
    List<String> heads = new ArrayList<>();
    List<TextTable.Row> rows = new ArrayList<>();
    for (int i = 0; i < lines.length; i++) {
      if (isComment(lines[i]) || lines[i].isBlank()) {
        continue;
      }
      List<Double> values = style.numbers(lines[i]);
      if (values != null && (rows.isEmpty() || rows.get(0).values().size() == values.size())) {
        rows.add(new TextTable.Row(i + 1, values));
      } else if (values != null || looksLikeARow(lines[i])) {
        throw malformed(lines[i], i + 1, rows, values);
      } else {
        if (!rows.isEmpty()) {
          blocks.add(new TextTable.Block(heads, rows));
          heads = new ArrayList<>();
          rows = new ArrayList<>();
        }
        join(heads, style.cells(lines[i]));
      }
    }
    if (!rows.isEmpty()) {
      blocks.add(new TextTable.Block(heads, rows));
    }
    return blocks;
  }

  private static TableFormatException malformed(
      String line, int number, List<TextTable.Row> rows, List<Double> values) {
    if (values != null) {
      return new TableFormatException(
          number,
          "has "
              + values.size()
              + " numbers where the rows before have "
              + rows.get(0).values().size());
    }
    return new TableFormatException(
        number, "is not a row of numbers: \"" + line.strip() + "\"; correct or remove it");
  }

  /** Starts like a number, so that it was meant as a row and not as words. */
  private static boolean looksLikeARow(String line) {
    String text = line.strip();
    return text.matches("[+-]?[.,]?\\d.*") && !text.matches("\\d+[.)]?\\s+\\p{L}.*");
  }

  private static void join(List<String> heads, List<String> cells) {
    for (int c = 0; c < cells.size(); c++) {
      String cell = cells.get(c).toLowerCase(Locale.ROOT);
      if (c < heads.size()) {
        heads.set(c, (heads.get(c) + " " + cell).strip());
      } else {
        heads.add(cell);
      }
    }
  }

  /**
   * Whole numbers only, parted by commas, and an even count of them: 400,5,1,52 could be either.
   */
  private static void refuseDoubtfulCommas(Style style, List<TextTable.Block> blocks) {
    if (style != Style.COMMA || blocks.get(0).columnCount() < 4) {
      return;
    }
    boolean whole =
        blocks.stream()
            .flatMap(block -> block.rows().stream())
            .flatMap(row -> row.values().stream())
            .allMatch(value -> value == Math.rint(value));
    if (whole && blocks.get(0).columnCount() % 2 == 0) {
      throw new TableFormatException(
          blocks.get(0).rows().get(0).line(),
          "can be read in two ways: commas part the numbers and may stand for decimal points;"
              + " write it with points, or with semicolons between the numbers");
    }
  }

  private static boolean isComment(String line) {
    String text = line.strip();
    return text.startsWith("#") || text.startsWith("%") || text.startsWith("//");
  }

  private static String unquoted(String cell) {
    boolean quoted = cell.length() >= 2 && cell.startsWith("\"") && cell.endsWith("\"");
    return quoted ? cell.substring(1, cell.length() - 1).strip() : cell;
  }

  private static Double number(String cell, boolean decimalComma) {
    String text = cell.replace('\u2212', '-');
    if (text.equalsIgnoreCase("nan") || text.equalsIgnoreCase("n/a")) {
      return Double.NaN;
    }
    if (decimalComma) {
      if (text.indexOf('.') >= 0) {
        return null;
      }
      text = text.replace(',', '.');
    }
    return text.matches("[+-]?(\\d+\\.?\\d*|\\.\\d+)([eEdD][+-]?\\d+)?")
        ? Double.valueOf(text.replace('d', 'e').replace('D', 'e'))
        : null;
  }
}
