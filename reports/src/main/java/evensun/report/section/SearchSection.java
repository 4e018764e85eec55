package evensun.report.section;

import evensun.report.chart.Axis;
import evensun.report.chart.Chart;
import evensun.report.chart.Kind;
import evensun.report.chart.Series;
import evensun.report.decision.GridWords;
import evensun.report.page.Block;
import evensun.report.page.Section;
import evensun.report.page.Table;
import evensun.report.text.Keys;
import evensun.report.text.Numbers;
import evensun.result.RunResult;
import evensun.result.SearchRecord;
import evensun.result.SearchRecord.ConstraintRecord;
import evensun.result.SearchRecord.Front;
import evensun.result.SearchRecord.Generation;
import evensun.result.SearchRecord.Optimum;
import evensun.result.SearchRecord.VariableRecord;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** How the search found it. */
public final class SearchSection {

  private static final double LEAST_SHOWN = 5e-4;

  private SearchSection() {}

  /** The section; absent when nothing was searched. */
  public static Optional<Section> of(RunResult result) {
    SearchRecord search = result.search();
    if (search == null) {
      return Optional.empty();
    }
    List<Block> blocks = new ArrayList<>();
    blocks.add(new Block.Prose(story(search)));
    search.notes().forEach(note -> blocks.add(new Block.Prose(spoken(search, note))));
    stepCost(search).ifPresent(text -> blocks.add(new Block.Prose(text)));
    GridWords.of(search).ifPresent(text -> blocks.add(new Block.Prose(text + ".")));
    if (search.history().size() > 1 && search.front() == null) {
      blocks.add(Tables.plot(convergence(search)));
    }
    if (search.optima().size() > 1) {
      blocks.add(new Block.Grid(optima(search), false));
    }
    if (!search.constraints().isEmpty()) {
      blocks.add(new Block.Grid(constraints(search), false));
    }
    Front front = search.front();
    if (front != null && front.points().size() > 1 && front.aims().size() > 1) {
      blocks.addAll(FrontBlocks.of(search, front));
    }
    return Optional.of(new Section("search", "Search", heading(search), blocks));
  }

  /** A remark with its keys in words. */
  private static String spoken(SearchRecord search, String note) {
    String text = note;
    for (VariableRecord variable : search.variables()) {
      text = text.replace(variable.key(), Keys.words(variable.key()));
    }
    return text;
  }

  private static String heading(SearchRecord search) {
    String tried = Numbers.count(search.evaluations(), "evaluation");
    return switch (search.stopped()) {
      case "converged" -> "The search converged after " + tried;
      case "evaluations" -> "The search spent its budget of " + tried;
      case "time" -> "The search ran out of time after " + tried;
      case "interrupted" -> "The search was interrupted after " + tried;
      default -> "The search stopped after " + tried + ": " + search.stopped();
    };
  }

  private static String story(SearchRecord search) {
    StringBuilder text = new StringBuilder("Aim: ");
    text.append("smallest".equals(search.wanted()) ? "smallest " : "")
        .append(Keys.aim(search.aim()));
    Double drawn = search.aimAsDrawn();
    if (drawn != null) {
      text.append(", as drawn ").append(Numbers.quantity(drawn, search.aimUnit()));
    }
    text.append(", found ").append(Numbers.quantity(search.aimFound(), search.aimUnit()));
    text.append(". ").append(Numbers.count(search.generations(), "generation"));
    Double refinement = search.refinementGain();
    if (refinement != null && refinement >= LEAST_SHOWN) {
      text.append("; the local refinement at the end added ")
          .append(Numbers.withUnit(Numbers.fixed(refinement, 3), search.aimUnit()));
    }
    if (search.failures() > 0) {
      text.append("; ")
          .append(Numbers.count(search.failures(), "design"))
          .append(" could not be evaluated");
    }
    return text.append('.').toString();
  }

  private static Optional<String> stepCost(SearchRecord search) {
    return Optional.ofNullable(search.stepCost())
        .map(
            cost ->
                "Standing on the steps of the tool costs "
                    + Numbers.withUnit(
                        cost < LEAST_SHOWN ? "less than 0.001" : Numbers.fixed(cost, 3),
                        search.aimUnit())
                    + " against the best design nearby that disregards them.");
  }

  private static Chart convergence(SearchRecord search) {
    List<Generation> history = search.history();
    List<Double> xs = history.stream().map(g -> (double) g.evaluations()).toList();
    List<Double> best = history.stream().map(Generation::best).toList();
    List<Double> mean = history.stream().map(Generation::mean).toList();
    double high = best.stream().mapToDouble(Double::doubleValue).max().orElse(1);
    double low = Math.min(lowest(best), lowest(mean));
    double margin = Math.max(1e-3, (high - low) * 0.08);
    Axis x = Axis.linear("designs evaluated", "", 0, xs.get(xs.size() - 1));
    Axis y = Axis.covering(Keys.aim(search.aim()), search.aimUnit(), low, high + margin / 4);
    List<Series> series =
        List.of(
            Series.of("best so far", "ink", best),
            Series.of("mean of the generation", "muted", mean));
    String title = "Convergence: within 0.1 % of the aim found from generation " + arrival(search);
    return new Chart("convergence", Kind.LINES, title, x, y, xs, series, List.of());
  }

  private static double lowest(List<Double> values) {
    return values.stream().mapToDouble(Double::doubleValue).min().orElse(0);
  }

  private static String arrival(SearchRecord search) {
    double close = Math.abs(search.aimFound()) * 1e-3;
    int first = 0;
    while (first < search.history().size()
        && Math.abs(search.history().get(first).best() - search.aimFound()) > close) {
      first++;
    }
    int last = search.history().size();
    return Math.min(first + 1, last) + " of " + last;
  }

  private static Table optima(SearchRecord search) {
    Table.Builder table =
        new Table.Builder("table-optima", "Distinct designs found, best first")
            .words("design")
            .numbers(Keys.aim(search.aim()), search.aimUnit());
    DesignColumns columns =
        new DesignColumns(
            search,
            search.optima().stream().map(Optimum::values).toList(),
            search.optima().stream().map(Optimum::choices).toList());
    columns.addTo(table);
    for (int i = 0; i < search.optima().size(); i++) {
      Optimum optimum = search.optima().get(i);
      List<String> cells = new ArrayList<>();
      cells.add(i == 0 ? "found" : Integer.toString(i + 1));
      cells.add(Numbers.bare(optimum.aim(), search.aimUnit()));
      cells.addAll(columns.cells(optimum.values(), optimum.choices()));
      table.row(cells);
    }
    return table.build();
  }

  private static Table constraints(SearchRecord search) {
    Table.Builder table =
        new Table.Builder("table-constraints", "Limits kept")
            .words("limit")
            .numbers("at the found design", "")
            .words("state");
    for (ConstraintRecord c : search.constraints()) {
      table.row(
          c.text(),
          Numbers.significant(c.value(), 4),
          c.active() ? "active: it holds the design" : "slack");
    }
    return table.build();
  }
}
