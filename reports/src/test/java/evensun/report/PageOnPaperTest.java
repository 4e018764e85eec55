package evensun.report;

import static org.assertj.core.api.Assertions.assertThat;

import evensun.result.RunResult;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;
import org.apache.pdfbox.Loader;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.text.PDFTextStripper;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.TestInstance;
import org.junit.jupiter.api.TestInstance.Lifecycle;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * Pages as the browser prints them. Outside witness: the PDF, read by a library that knows nothing
 * of the page.
 */
@TestInstance(Lifecycle.PER_CLASS)
class PageOnPaperTest {

  private static final double[] A4 = {8.27, 11.69};
  private static final double[] LETTER = {8.5, 11};

  /** Puts a mark into each corner of every drawing; returns how many figures there are. */
  private static final String MARK =
      """
      var figures = [...document.querySelectorAll('figure')];
      figures.forEach((figure, f) => figure.querySelectorAll('.drawing').forEach(svg => {
        var box = svg.getAttribute('viewBox').split(' ').map(Number);
        ['a', 'b', 'c', 'd'].forEach((corner, i) => {
          var text = document.createElementNS('http://www.w3.org/2000/svg', 'text');
          text.setAttribute('x', i % 2 ? box[2] : 0);
          text.setAttribute('y', i < 2 ? 5 : box[3] - 1);
          text.setAttribute('text-anchor', i % 2 ? 'end' : 'start');
          text.setAttribute('style', 'font: 5px sans-serif');
          text.textContent = 'qzq' + f + corner + 'qz';
          svg.appendChild(text);
        });
      }));
      return figures.length;
      """;

  @TempDir Path folder;
  private Browser browser;

  @BeforeAll
  void start() throws IOException {
    browser = Browser.start();
  }

  @AfterAll
  void stop() {
    if (browser != null) {
      browser.close();
    }
  }

  static List<Map.Entry<double[], RunResult>> papers() {
    return List.of(
        Map.entry(A4, SampleRuns.full()),
        Map.entry(LETTER, SampleRuns.full()),
        Map.entry(A4, AwkwardRuns.sixtyLayers()));
  }

  @ParameterizedTest
  @MethodSource("papers")
  void aPageIsACleanDocumentOnPaper(Map.Entry<double[], RunResult> paper) throws IOException {
    RunResult run = paper.getValue();
    Path file = Files.writeString(folder.resolve("paper.html"), Written.page(run));
    browser.width(1280);
    browser.open(file);
    long figures = (Long) browser.run(MARK);
    byte[] printed = browser.print(paper.getKey()[0], paper.getKey()[1]);
    try (PDDocument pdf = Loader.loadPDF(printed)) {
      noFigureIsCut(pdf, figures);
      everySheetSaysWhatItBelongsTo(pdf, run);
      String text = text(pdf, 1, pdf.getNumberOfPages());
      assertThat(text).contains("The terms used here", "carry the same current, so the weakest");
      assertThat(text).doesNotContain("Save as SVG", "Skip to the decision", "back to found");
    }
  }

  private static void noFigureIsCut(PDDocument pdf, long figures) throws IOException {
    Map<Integer, List<PrintedMarks.Mark>> marks =
        PrintedMarks.of(pdf).stream().collect(Collectors.groupingBy(PrintedMarks.Mark::figure));
    assertThat(marks).hasSize((int) figures);
    marks.forEach(
        (figure, corners) -> {
          assertThat(corners).as("corners of figure %d", figure).hasSize(4);
          assertThat(corners)
              .extracting(PrintedMarks.Mark::page)
              .containsOnly(corners.get(0).page());
          assertThat(corners).allMatch(PrintedMarks.Mark::onPaper);
        });
  }

  private static void everySheetSaysWhatItBelongsTo(PDDocument pdf, RunResult run)
      throws IOException {
    int sheets = pdf.getNumberOfPages();
    assertThat(sheets).isBetween(3, 40);
    String line = run.title() + " · 2026-03-04 · " + Written.model(run).shortHash();
    for (int sheet = 1; sheet <= sheets; sheet++) {
      assertThat(text(pdf, sheet, sheet)).contains(line, sheet + " / " + sheets);
    }
  }

  private static String text(PDDocument pdf, int from, int to) throws IOException {
    PDFTextStripper stripper = new PDFTextStripper();
    stripper.setStartPage(from);
    stripper.setEndPage(to);
    return stripper.getText(pdf).replaceAll("[\\s\u00a0]+", " ");
  }
}
