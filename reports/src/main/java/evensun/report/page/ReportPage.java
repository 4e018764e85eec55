package evensun.report.page;

import evensun.report.text.Glossary.Term;
import java.util.List;

/**
 * The page as data.
 *
 * @param kind what the page is, such as {@code Design review}
 * @param title title of the scenario
 * @param dateUtc day of the run, ISO 8601
 * @param shortHash first digits of a hash
 * @param hashMeaning what that hash is of
 * @param decision the first screen
 * @param sections the rest, in order of importance
 * @param glossary terms used
 * @param footer the last line
 */
public record ReportPage(
    String kind,
    String title,
    String dateUtc,
    String shortHash,
    String hashMeaning,
    Decision decision,
    List<Section> sections,
    List<Term> glossary,
    String footer) {

  /** Copies the lists. */
  public ReportPage {
    sections = List.copyOf(sections);
    glossary = List.copyOf(glossary);
  }
}
