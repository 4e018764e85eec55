package evensun.report;

import evensun.report.page.ReportPage;
import evensun.result.RunResult;
import gg.jte.ContentType;
import gg.jte.TemplateEngine;
import gg.jte.output.StringOutput;
import java.util.Map;

/** Writes the report of a run: one HTML file that needs nothing else. Safe for threads. */
public final class ReportWriter {

  /** Where the templates were compiled to. */
  static final String TEMPLATES = "evensun.report.template";

  private ReportWriter() {}

  /** The page, a function of the result alone. */
  public static String write(RunResult result) {
    return render(ReportPages.of(result));
  }

  /** Lays out a page. */
  static String render(ReportPage page) {
    StringOutput output = new StringOutput();
    engine().render("report.jte", Map.of("page", page, "assets", Assets.get()), output);
    return output.toString();
  }

  private static TemplateEngine engine() {
    return TemplateEngine.createPrecompiled(
        null, ContentType.Html, ReportWriter.class.getClassLoader(), TEMPLATES);
  }
}
