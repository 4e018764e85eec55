package evensun.report.compare;

import evensun.report.page.Table;
import evensun.report.text.Numbers;
import evensun.result.RunResult;
import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import java.util.function.Function;
import org.jspecify.annotations.Nullable;

/** Rows of what may differ, one column per run; rows that differ come first. */
final class Matrix {

  /**
   * A row.
   *
   * @param label what it is
   * @param cells one per run
   */
  record Row(String label, List<String> cells) {

    boolean differs() {
      return cells.stream().distinct().count() > 1;
    }
  }

  private final List<NamedRun> runs;
  private final List<Row> rows = new ArrayList<>();

  Matrix(List<NamedRun> runs) {
    this.runs = runs;
  }

  /** The letters the runs go by: A, B, and so on. */
  static String letter(int index) {
    return String.valueOf((char) ('A' + index));
  }

  /** Adds a row of texts; one that no run has is left out. */
  Matrix words(String label, Function<RunResult, @Nullable String> of) {
    List<String> cells = new ArrayList<>();
    for (NamedRun run : runs) {
      String text = of.apply(run.result());
      cells.add(text == null ? "–" : text);
    }
    if (cells.stream().anyMatch(cell -> !cell.equals("–"))) {
      rows.add(new Row(label, cells));
    }
    return this;
  }

  /** Adds a row of numbers. */
  Matrix numbers(String label, int decimals, Function<RunResult, @Nullable Double> of) {
    return words(
        label,
        result -> {
          Double value = of.apply(result);
          return value == null ? null : Numbers.fixed(value, decimals);
        });
  }

  /** Adds a row per name that occurs in any run, in the order of first sight. */
  Matrix each(
      Function<RunResult, List<String>> names, java.util.function.BiConsumer<Matrix, String> row) {
    Set<String> all = new LinkedHashSet<>();
    runs.forEach(run -> all.addAll(names.apply(run.result())));
    all.forEach(name -> row.accept(this, name));
    return this;
  }

  List<Row> ordered() {
    List<Row> ordered = new ArrayList<>(rows.stream().filter(Row::differs).toList());
    rows.stream().filter(row -> !row.differs()).forEach(ordered::add);
    return ordered;
  }

  long differences() {
    return rows.stream().filter(Row::differs).count();
  }

  /** The rows as a table; the last column says which are the same. */
  Table table(String id, String caption, boolean numeric) {
    Table.Builder table = new Table.Builder(id, caption).words("what");
    for (int i = 0; i < runs.size(); i++) {
      if (numeric) {
        table.numbers(letter(i), "");
      } else {
        table.words(letter(i));
      }
    }
    table.words("");
    for (Row row : ordered()) {
      List<String> cells = new ArrayList<>(List.of(row.label()));
      cells.addAll(row.cells());
      cells.add(row.differs() ? "differs" : "the same");
      table.row(cells);
    }
    return table.build();
  }
}
