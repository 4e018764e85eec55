package evensun.report;

import evensun.report.decision.Sentence;
import evensun.report.summary.MarkdownLayout;
import evensun.report.summary.Summary;
import evensun.report.summary.TextLayout;
import evensun.report.text.Plain;
import evensun.result.RunResult;

/** The decision in a few lines, for the end of a command. */
public final class ClosingSummary {

  private ClosingSummary() {}

  /**
   * The summary as text: the decision, the verdict, currents, varied values with the range that is
   * equally good, the ledger with its total, findings, the report.
   *
   * @param result the result
   * @param reportPath path of the report, empty for none
   */
  public static String text(RunResult result, String reportPath) {
    return TextLayout.of(Summary.of(result), reportPath);
  }

  /** The decision in one line. */
  public static String headline(RunResult result) {
    return Plain.line(Sentence.of(result));
  }

  /**
   * The same as Markdown.
   *
   * @param result the result
   * @param reportPath path of the report, empty for none
   */
  public static String markdown(RunResult result, String reportPath) {
    return MarkdownLayout.of(Summary.of(result), reportPath);
  }
}
