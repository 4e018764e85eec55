package evensun.report;

import evensun.report.compare.ComparisonPages;
import evensun.report.compare.NamedRun;
import evensun.report.summary.MarkdownLayout;
import evensun.report.summary.TextLayout;
import java.util.List;

/** Results side by side, as a page and as a summary. */
public final class CompareWriter {

  private CompareWriter() {}

  /**
   * The page as UTF-8.
   *
   * @param runs two to six
   */
  public static byte[] write(List<NamedRun> runs) {
    return ReportWriter.render(ComparisonPages.page(runs));
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
