package evensun.report.compare;

import evensun.report.figure.Budget;
import evensun.report.figure.Figure;
import evensun.report.figure.LightBar;
import evensun.report.page.Block;
import evensun.report.page.Decision;
import evensun.report.page.ReportPage;
import evensun.report.page.Section;
import evensun.report.page.Table;
import evensun.report.summary.Summary;
import evensun.report.summary.Summary.Listing;
import evensun.report.text.Clip;
import evensun.report.text.Glossary;
import evensun.report.text.Hashes;
import evensun.report.text.Numbers;
import evensun.result.RunResult;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.Collectors;

/** A comparison as a page and as a summary. */
public final class ComparisonPages {

  private ComparisonPages() {}

  /**
   * The page.
   *
   * @param runs two to six
   */
  public static ReportPage page(List<NamedRun> runs) {
    Comparison comparison = new Comparison(runs);
    List<Section> sections = new ArrayList<>();
    sections.add(which(comparison));
    sections.add(results(comparison));
    losses(comparison).ifPresent(sections::add);
    sections.add(section("stack", "Stack", "layer value", comparison.stack()));
    sections.add(section("assumptions", "Assumptions", "assumption", comparison.assumptions()));
    RunResult first = runs.get(0).result();
    String started = first.provenance().startedUtc();
    return new ReportPage(
        "Comparison",
        title(runs),
        started.substring(0, Math.min(10, started.length())),
        shortHash(runs),
        "First digits of the SHA-256 of those of the runs, in their order",
        decision(comparison),
        sections,
        Glossary.all(),
        "Written by Evensun from the result.json of each run.");
  }

  private static String title(List<NamedRun> runs) {
    String count = Numbers.count(runs.size(), "design");
    List<String> titles = runs.stream().map(run -> run.result().title()).distinct().toList();
    return titles.size() > 1 ? count : count + ": " + Clip.to(titles.get(0), 80);
  }

  private static String shortHash(List<NamedRun> runs) {
    String all = runs.stream().map(NamedRun::shortHash).collect(Collectors.joining());
    return Hashes.shortSha256(all.getBytes(StandardCharsets.UTF_8));
  }

  private static Decision decision(Comparison comparison) {
    Figure levels = comparison.levels();
    return new Decision(
        comparison.sentence(),
        List.of(),
        null,
        List.of(),
        levels,
        levels == null ? "" : levels.description(),
        List.of(),
        List.of());
  }

  private static Section which(Comparison comparison) {
    Table.Builder table =
        new Table.Builder("table-runs", "The runs, and the letters they go by here")
            .words("letter")
            .words("run")
            .words("title")
            .words("started (UTC)")
            .words("result.json");
    for (int i = 0; i < comparison.runs().size(); i++) {
      NamedRun run = comparison.runs().get(i);
      table.row(
          Matrix.letter(i),
          run.name(),
          Clip.to(run.result().title(), 120),
          run.result().provenance().startedUtc(),
          run.shortHash());
    }
    List<String> warnings = comparison.warnings();
    List<Block> blocks = new ArrayList<>();
    if (!warnings.isEmpty()) {
      blocks.add(
          new Block.Points(
              List.of(
                  new Block.Point(
                      "warning",
                      "Read the differences below with care",
                      "These runs were not computed alike: " + String.join(", ", warnings) + ".",
                      ""))));
    }
    blocks.add(new Block.Grid(table.build(), false));
    String what = Numbers.count(comparison.runs().size(), "run");
    String heading =
        warnings.isEmpty() ? what + ", computed alike" : what + " that are not fully comparable";
    return new Section("runs", "Runs", heading, blocks);
  }

  private static Section section(String id, String nav, String noun, Matrix matrix) {
    return new Section(id, nav, heading(noun, matrix), grids(matrix, "table-" + id, nav, false));
  }

  private static Section results(Comparison comparison) {
    Matrix matrix = comparison.results();
    String caption = "Results, " + Numbers.MA + " where not said otherwise";
    List<Block> blocks = grids(matrix, "table-results", caption, true);
    blocks.add(new Block.Grid(comparison.currents(), true));
    return new Section("results", "Results", heading("result", matrix), blocks);
  }

  /** What differs, open; what is the same, folded. */
  private static List<Block> grids(Matrix matrix, String id, String caption, boolean numeric) {
    List<Block> blocks = new ArrayList<>();
    if (matrix.differences() > 0) {
      blocks.add(new Block.Grid(matrix.table(id, caption, numeric, true), false));
    }
    if (matrix.agreesSomewhere()) {
      Table same = matrix.table(id + "-same", caption + ": the same in all", numeric, false);
      blocks.add(new Block.Grid(same, true));
    }
    return blocks;
  }

  private static String heading(String noun, Matrix matrix) {
    long differences = matrix.differences();
    return differences == 0
        ? "Every " + noun + " is the same"
        : Numbers.count((int) differences, noun) + (differences == 1 ? " differs" : " differ");
  }

  private static Optional<Section> losses(Comparison comparison) {
    List<Block> blocks = new ArrayList<>();
    for (int i = 0; i < comparison.runs().size(); i++) {
      String letter = Matrix.letter(i);
      Budget.of(comparison.runs().get(i).result().found())
          .ifPresent(
              budget -> {
                String what = letter + ": the available current, split in the light's order.";
                Figure figure = Figure.of(new LightBar(null, budget), what);
                blocks.add(new Block.Picture("fig-light-" + letter, figure, what));
              });
    }
    if (blocks.isEmpty()) {
      return Optional.empty();
    }
    Matrix matrix = comparison.losses();
    blocks.addAll(grids(matrix, "table-losses", "Losses, mA cm⁻²", true));
    String heading =
        matrix.differences() == 0
            ? "Every loss is the same"
            : matrix.differences()
                + (matrix.differences() == 1 ? " loss differs" : " losses differ");
    return Optional.of(new Section("light", "Light", heading, blocks));
  }

  /** The summary: differences of results, losses, stack and assumptions. */
  public static Summary summary(List<NamedRun> runs) {
    Comparison comparison = new Comparison(runs);
    List<Listing> tables = new ArrayList<>();
    List<String> names = new ArrayList<>();
    for (int i = 0; i < runs.size(); i++) {
      names.add(Matrix.letter(i) + " = " + runs.get(i).name());
    }
    tables.add(listing("currents, " + Numbers.MA, comparison.results(), runs.size()));
    tables.add(listing("losses, " + Numbers.MA, comparison.losses(), runs.size()));
    tables.add(listing("stack", comparison.stack(), runs.size()));
    tables.add(listing("assumptions", comparison.assumptions(), runs.size()));
    return new Summary(
        String.join(", ", names),
        comparison.sentence(),
        "Only what differs is listed",
        tables,
        List.of());
  }

  private static Listing listing(String head, Matrix matrix, int runs) {
    List<String> header = new ArrayList<>(List.of(head));
    for (int i = 0; i < runs; i++) {
      header.add(Matrix.letter(i));
    }
    List<List<String>> rows = new ArrayList<>();
    boolean changes = matrix.differing().stream().anyMatch(row -> !row.change().isEmpty());
    if (changes) {
      header.add(Matrix.letter(1) + " − " + Matrix.letter(0));
    }
    for (Matrix.Row row : matrix.differing()) {
      List<String> cells = new ArrayList<>(List.of(row.label()));
      row.cells().forEach(cell -> cells.add(Clip.to(cell, 48)));
      if (changes) {
        cells.add(row.change());
      }
      rows.add(cells);
    }
    return new Listing(header, rows);
  }
}
