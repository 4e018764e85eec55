package evensun.report;

import evensun.result.RunResult;

/** The decision in a few lines, for the end of a command. */
public final class ClosingSummary {

  private ClosingSummary() {}

  /**
   * The summary as text.
   *
   * @param result the result
   * @param reportPath path of the report, empty for none
   */
  public static String text(RunResult result, String reportPath) {
    StringBuilder text = new StringBuilder(result.title()).append('\n');
    result.found().subcells().forEach(s -> text.append("  ").append(s).append('\n'));
    return text.append(reportPath).append('\n').toString();
  }
}
