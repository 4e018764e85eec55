package evensun.report.summary;

import evensun.report.summary.Summary.Listing;
import evensun.report.text.Plain;
import java.util.List;
import java.util.stream.Collectors;

/** A summary as Markdown to paste into a ticket. */
public final class MarkdownLayout {

  private MarkdownLayout() {}

  /** The Markdown, lines ended by a line feed. */
  public static String of(Summary summary, String reportPath) {
    StringBuilder text = new StringBuilder("## ").append(Plain.markdown(summary.title()));
    text.append("\n\n**").append(Plain.markdown(summary.sentence())).append("**\n\n");
    text.append(Plain.markdown(summary.verdict())).append(".\n");
    for (Listing listing : summary.tables()) {
      if (!listing.rows().isEmpty()) {
        listing(text, listing);
      }
    }
    text.append('\n');
    summary.closing().forEach(line -> text.append(Plain.markdown(line)).append("\n\n"));
    if (!reportPath.isEmpty()) {
      text.append("Report: ").append(Plain.markdown(reportPath)).append('\n');
    }
    return text.toString().stripTrailing() + "\n";
  }

  private static void listing(StringBuilder text, Listing listing) {
    int columns = listing.header().size();
    text.append('\n').append(row(listing.header()));
    text.append("| --- |").append(" ---: |".repeat(columns - 1)).append('\n');
    listing.rows().forEach(row -> text.append(row(row)));
  }

  private static String row(List<String> cells) {
    return cells.stream().map(Plain::markdown).collect(Collectors.joining(" | ", "| ", " |\n"));
  }
}
