package evensun.report.compare;

import evensun.report.page.Table;
import evensun.report.text.Numbers;
import evensun.result.RunResult;
import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Objects;
import java.util.Set;
import java.util.function.Function;
import org.jspecify.annotations.Nullable;

/** Rows of what may differ, one column per run. */
final class Matrix {

  /**
   * A row.
   *
   * @param label what it is
   * @param cells one per run
   * @param change of two numbers, the second less the first; empty otherwise
   */
  record Row(String label, List<String> cells, String change) {

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
    return add(label, runs.stream().map(run -> of.apply(run.result())).toList(), "");
  }

  /** Adds a row of numbers. */
  Matrix numbers(String label, int decimals, Function<RunResult, @Nullable Double> of) {
    List<@Nullable Double> values = new ArrayList<>();
    runs.forEach(run -> values.add(of.apply(run.result())));
    List<@Nullable String> texts = new ArrayList<>();
    values.forEach(value -> texts.add(value == null ? null : Numbers.fixed(value, decimals)));
    return add(label, texts, change(values, decimals));
  }

  private static String change(List<@Nullable Double> values, int decimals) {
    Double first = values.get(0);
    Double second = values.get(1);
    return values.size() != 2 || first == null || second == null
        ? ""
        : Numbers.signed(second - first, decimals);
  }

  private Matrix add(String label, List<@Nullable String> texts, String change) {
    if (texts.stream().anyMatch(Objects::nonNull)) {
      rows.add(new Row(label, texts.stream().map(t -> t == null ? "–" : t).toList(), change));
    }
    return this;
  }

  /** Adds a row per name that occurs in any run, in the order of first sight. */
  Matrix each(
      Function<RunResult, List<String>> names, java.util.function.BiConsumer<Matrix, String> row) {
    Set<String> all = new LinkedHashSet<>();
    runs.forEach(run -> all.addAll(names.apply(run.result())));
    all.forEach(name -> row.accept(this, name));
    return this;
  }

  List<Row> differing() {
    return rows.stream().filter(Row::differs).toList();
  }

  long differences() {
    return rows.stream().filter(Row::differs).count();
  }

  /**
   * Some of the rows as a table, of two runs with the change.
   *
   * @param differing whether those that differ or those that are the same
   */
  Table table(String id, String caption, boolean numeric, boolean differing) {
    Table.Builder table = new Table.Builder(id, caption).words("what");
    for (int i = 0; i < runs.size(); i++) {
      if (numeric) {
        table.numbers(letter(i), "");
      } else {
        table.words(letter(i));
      }
    }
    List<Row> shown = rows.stream().filter(row -> row.differs() == differing).toList();
    boolean changes = differing && shown.stream().anyMatch(row -> !row.change().isEmpty());
    if (changes) {
      table.numbers(letter(1) + " − " + letter(0), "");
    }
    for (Row row : shown) {
      List<String> cells = new ArrayList<>(List.of(row.label()));
      cells.addAll(row.cells());
      if (changes) {
        cells.add(row.change());
      }
      table.row(cells);
    }
    return table.build();
  }

  /** Whether any row is the same everywhere. */
  boolean agreesSomewhere() {
    return rows.stream().anyMatch(row -> !row.differs());
  }
}
