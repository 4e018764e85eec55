package evensun.report;

import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.pdmodel.common.PDRectangle;
import org.apache.pdfbox.text.PDFTextStripper;
import org.apache.pdfbox.text.TextPosition;

/** Finds the marks that a test put into the corners of drawings, in a printed document. */
final class PrintedMarks extends PDFTextStripper {

  private static final Pattern MARK = Pattern.compile("qzq(\\d+)([abcd])qz");

  private final List<Mark> marks = new ArrayList<>();
  private final StringBuilder text = new StringBuilder();
  private final List<TextPosition> positions = new ArrayList<>();

  private PrintedMarks() {
    setSortByPosition(false);
  }

  /**
   * A mark.
   *
   * @param figure number of its figure
   * @param page page it is on, from 1
   * @param onPaper whether it lies within the page
   */
  record Mark(int figure, int page, boolean onPaper) {}

  static List<Mark> of(PDDocument pdf) throws IOException {
    PrintedMarks finder = new PrintedMarks();
    finder.getText(pdf);
    return finder.marks;
  }

  @Override
  protected void processTextPosition(TextPosition position) {
    String letters = position.getUnicode();
    for (int i = 0; i < letters.length(); i++) {
      text.append(letters.charAt(i));
      positions.add(position);
    }
  }

  @Override
  protected void writePage() {
    PDRectangle paper = getCurrentPage().getMediaBox();
    Matcher matcher = MARK.matcher(text);
    while (matcher.find()) {
      TextPosition first = positions.get(matcher.start());
      TextPosition last = positions.get(matcher.end() - 1);
      boolean inside =
          first.getXDirAdj() >= 0
              && last.getXDirAdj() + last.getWidthDirAdj() <= paper.getWidth()
              && first.getYDirAdj() >= 0
              && first.getYDirAdj() <= paper.getHeight();
      marks.add(new Mark(Integer.parseInt(matcher.group(1)), getCurrentPageNo(), inside));
    }
    text.setLength(0);
    positions.clear();
  }
}
