package evensun.report;

import evensun.report.chart.Chart;
import evensun.report.chart.Series;
import evensun.report.page.Block;
import evensun.report.page.ReportPage;
import evensun.report.page.Section;
import evensun.report.page.Table;
import java.util.List;
import java.util.Locale;
import java.util.Objects;
import java.util.stream.Collectors;

/** A page model as readable text, so that a change of what a page says shows as a difference. */
final class PageOutline {

  private static final int MOST_ROWS = 12;

  private final StringBuilder text = new StringBuilder();

  static String of(ReportPage page) {
    PageOutline outline = new PageOutline();
    outline.line(page.kind(), page.title(), page.dateUtc());
    outline.line("sentence", page.decision().sentence());
    outline.line("verdict", String.valueOf(page.decision().verdict()));
    page.decision().headlines().forEach(h -> outline.line(h.key(), h.value(), h.unit(), h.note()));
    page.decision().wouldChange().forEach(t -> outline.line("would change", t));
    page.decision().uncertain().forEach(t -> outline.line("uncertain", t));
    page.sections().forEach(outline::section);
    return outline.text.toString();
  }

  private void line(String... parts) {
    text.append(String.join(" | ", parts).replace('\u00a0', ' ')).append('\n');
  }

  private void section(Section section) {
    line("");
    line("## " + section.id(), section.nav(), section.heading());
    section.blocks().forEach(this::block);
  }

  private void block(Block block) {
    if (block instanceof Block.Prose prose) {
      line("prose", prose.text());
    } else if (block instanceof Block.Subheading heading) {
      line("heading", heading.text());
    } else if (block instanceof Block.Picture picture) {
      line("picture", picture.id(), picture.caption());
    } else if (block instanceof Block.Plot plot) {
      chart(plot.chart());
    } else if (block instanceof Block.Plots plots) {
      plots.plots().forEach(plot -> chart(plot.chart()));
    } else if (block instanceof Block.Strip strip) {
      strip.curves().forEach(curve -> chart(curve.chart()));
    } else if (block instanceof Block.Grid grid) {
      table(grid.table());
    } else if (block instanceof Block.Together together) {
      line("together", together.file(), together.label(), String.join(" ", together.charts()));
    } else if (block instanceof Block.Points points) {
      points.points().forEach(p -> line("point", p.severity(), p.subject(), p.text(), p.code()));
    } else if (block instanceof Block.Verbatim verbatim) {
      line("verbatim", verbatim.id(), verbatim.label(), verbatim.text().replace("\n", "\\n"));
    }
  }

  private void chart(Chart chart) {
    line("chart", chart.id(), chart.kind().toString(), chart.title());
    line("  x", chart.x().title(), range(chart.x().min(), chart.x().max()));
    line("  y", chart.y().title(), range(chart.y().min(), chart.y().max()));
    for (Series s : chart.series()) {
      List<Double> v = s.values().stream().filter(Objects::nonNull).toList();
      line("  " + s.label(), s.role(), v.size() + " values", range(v.get(0), v.get(v.size() - 1)));
    }
    chart.marks().forEach(mark -> line("  mark", mark.label()));
  }

  private static String range(double from, double to) {
    return String.format(Locale.ROOT, "%.4g to %.4g", from, to);
  }

  private void table(Table table) {
    line("table", table.id(), table.caption(), table.rows().size() + " rows");
    line(
        "  "
            + table.columns().stream()
                .map(c -> c.label() + (c.unit().isEmpty() ? "" : " [" + c.unit() + "]"))
                .collect(Collectors.joining(" | ")));
    table.rows().stream().limit(MOST_ROWS).forEach(row -> line("  " + String.join(" | ", row)));
  }
}
