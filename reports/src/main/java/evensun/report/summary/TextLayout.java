package evensun.report.summary;

import evensun.report.summary.Summary.Listing;
import evensun.report.text.Plain;
import java.util.ArrayList;
import java.util.List;

/** A summary as lines for a terminal. */
public final class TextLayout {

  private static final String GAP = "  ";

  private TextLayout() {}

  /** The lines, each ended by a line feed. */
  public static String of(Summary summary, String reportPath) {
    StringBuilder text = new StringBuilder();
    line(text, summary.title());
    text.append('\n');
    line(text, summary.sentence());
    line(text, summary.verdict() + ".");
    for (Listing listing : summary.tables()) {
      if (!listing.rows().isEmpty()) {
        text.append('\n');
        listing(text, listing);
      }
    }
    text.append('\n');
    summary.closing().forEach(closing -> line(text, closing));
    if (!reportPath.isEmpty()) {
      line(text, "Report: " + reportPath);
    }
    return text.toString();
  }

  private static void line(StringBuilder text, String line) {
    text.append(Plain.line(line)).append('\n');
  }

  private static void listing(StringBuilder text, Listing listing) {
    List<List<String>> rows = new ArrayList<>();
    rows.add(listing.header());
    rows.addAll(listing.rows());
    int columns = listing.header().size();
    int[] width = new int[columns];
    for (List<String> row : rows) {
      for (int c = 0; c < columns; c++) {
        width[c] = Math.max(width[c], length(Plain.line(row.get(c))));
      }
    }
    for (List<String> row : rows) {
      StringBuilder line = new StringBuilder(GAP);
      for (int c = 0; c < columns; c++) {
        line.append(c == 0 ? "" : GAP).append(padded(Plain.line(row.get(c)), width[c], c));
      }
      text.append(line.toString().stripTrailing()).append('\n');
    }
  }

  /** Words to the left; numbers, which start with a digit or a sign, to the right. */
  private static String padded(String cell, int width, int column) {
    String space = " ".repeat(width - length(cell));
    boolean words = column == 0 || cell.contains(" to ") || cell.startsWith("equally");
    return words ? cell + space : space + cell;
  }

  private static int length(String text) {
    return text.codePointCount(0, text.length());
  }
}
