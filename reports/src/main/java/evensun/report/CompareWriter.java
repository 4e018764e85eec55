package evensun.report;

import evensun.report.compare.ComparisonPages;
import evensun.report.compare.NamedRun;
import evensun.report.summary.MarkdownLayout;
import evensun.report.summary.TextLayout;
import evensun.result.ResultJson;
import java.util.List;
import java.util.stream.Collectors;

/** Results side by side, as a page and as a summary. */
public final class CompareWriter {

  private CompareWriter() {}

  /**
   * The page.
   *
   * @param runs two to six
   */
  public static String write(List<NamedRun> runs) {
    String all =
        runs.stream()
            .map(run -> ResultJson.writeLine(run.result()))
            .collect(Collectors.joining("\n"));
    return ReportWriter.render(ComparisonPages.page(runs, Hashes.shortSha256(all)));
  }

  /** The differences as text. */
  public static String text(List<NamedRun> runs, String reportPath) {
    return TextLayout.of(ComparisonPages.summary(runs), reportPath);
  }

  /** The differences as Markdown. */
  public static String markdown(List<NamedRun> runs, String reportPath) {
    return MarkdownLayout.of(ComparisonPages.summary(runs), reportPath);
  }
}
