package evensun.report;

import evensun.report.page.Assets;
import evensun.report.page.ReportPage;
import evensun.report.page.Section;
import evensun.report.template.JtereportGenerated;
import evensun.report.template.JtesectionGenerated;
import evensun.report.text.Hashes;
import evensun.result.RunResult;
import gg.jte.Content;
import gg.jte.html.OwaspHtmlTemplateOutput;
import java.util.List;

/** Writes the report of a run: one HTML file that needs nothing else. Safe for threads. */
public final class ReportWriter {

  private ReportWriter() {}

  /**
   * The page as UTF-8, a function of the result alone.
   *
   * @param result the result
   * @param file its file as it is stored, whose hash the page names
   */
  public static byte[] write(RunResult result, byte[] file) {
    return render(ReportPages.of(result, Hashes.shortSha256(file)));
  }

  /** Lays out a page; sections know nothing of one another and are laid out side by side. */
  static byte[] render(ReportPage page) {
    List<Content> sections = page.sections().parallelStream().map(ReportWriter::section).toList();
    PageOutput output = new PageOutput();
    JtereportGenerated.render(
        new OwaspHtmlTemplateOutput(output), null, page, sections, Assets.get());
    return output.bytes();
  }

  private static Content section(Section section) {
    PageOutput output = new PageOutput();
    JtesectionGenerated.render(new OwaspHtmlTemplateOutput(output), null, section);
    byte[] html = output.bytes();
    return into -> into.writeBinaryContent(html);
  }
}
