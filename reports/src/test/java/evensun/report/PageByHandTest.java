package evensun.report;

import static org.assertj.core.api.Assertions.assertThat;

import evensun.report.compare.NamedRun;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestInstance;
import org.junit.jupiter.api.TestInstance.Lifecycle;
import org.junit.jupiter.api.io.TempDir;
import org.openqa.selenium.Keys;

/** Pages under pointer and keyboard. Outside witness: the browser's own events and layout. */
@TestInstance(Lifecycle.PER_CLASS)
class PageByHandTest {

  private static final String TERM = "#decision dl a.term";

  @TempDir static Path folder;
  private Browser browser;

  @BeforeAll
  void start() throws IOException {
    browser = Browser.start();
    Path file = folder.resolve("hand.html");
    Files.writeString(file, Written.page(SampleRuns.full()));
    browser.width(1280);
    browser.open(file);
  }

  @AfterAll
  void stop() {
    if (browser != null) {
      browser.close();
    }
  }

  private Object meaning() {
    return browser.run(
        "var g = document.getElementById('gloss'); return g.hidden ? null : g.textContent");
  }

  @Test
  void aTermIsExplainedAtThePointer() {
    browser.run(
        "document.querySelector(arguments[0]).scrollIntoView({block: 'center', behavior: 'instant'})",
        TERM);
    browser.point(TERM, 0, 0);
    assertThat((String) meaning()).startsWith("The smallest subcell current of a series device");
    browser.press(Keys.ESCAPE);
    assertThat(meaning()).isNull();
  }

  @Test
  void aTermIsExplainedAtTheFocusAndTiedToIt() {
    browser.run(
        "document.activeElement.blur(); document.querySelector(arguments[0]).focus()", TERM);
    assertThat((String) meaning()).startsWith("The smallest subcell current of a series device");
    assertThat(browser.run("return document.activeElement.getAttribute('aria-describedby')"))
        .isEqualTo("gloss");
    browser.press(Keys.TAB);
    assertThat((String) meaning()).startsWith("Largest minus smallest subcell current");
    browser.press(Keys.ENTER);
    assertThat(browser.run("return location.hash")).isEqualTo("#term-mismatch");
  }

  /** The first chart: what it says at a wavelength must be what its data say there. */
  @Test
  void aChartTellsItsValuesAtThePointer() {
    browser.run(
        "document.querySelector('#fig-spectrum').scrollIntoView({block: 'center', behavior: 'instant'})");
    browser.point("#fig-spectrum .live", 0, 0);
    String said =
        (String)
            browser.runLater(
                "var done = arguments[arguments.length - 1]; setTimeout(() => done("
                    + "document.querySelector('#fig-spectrum .live').textContent), 400)");
    String wavelength = said.replaceAll("(?s).*wavelength (\\d+)\u00a0nm.*", "$1");
    double top =
        SampleRuns.full()
            .found()
            .spectral()
            .absorptance()
            .get("perovskite")
            .get((Integer.parseInt(wavelength) - 300) / 5);
    String shown = said.replaceAll("(?s).*nm.*top ([\\d.]+).*", "$1");
    assertThat(Double.parseDouble(shown)).isCloseTo(top, org.assertj.core.data.Offset.offset(1e-4));
  }

  @Test
  void everyFigureAndTableHasAnAddressAndEveryLinkATarget() {
    assertThat(
            browser.run(
                "return [...document.querySelectorAll('main figure, main .table')].filter(e =>"
                    + " !e.id || document.querySelectorAll('[id=\"' + e.id + '\"]').length !== 1)"
                    + ".length"))
        .isEqualTo(0L);
    assertThat(
            browser.run(
                "return [...document.querySelectorAll('a[href^=\"#\"]')].filter(a =>"
                    + " !document.getElementById(a.hash.slice(1))).map(a => a.hash)"))
        .isEqualTo(List.of());
    // Every one of them is in the list of all, but those behind a chart, which open with it.
    assertThat(
            browser.run(
                "return [...document.querySelectorAll('main figure, main .table')].filter(e =>"
                    + " !e.closest('#decision') && !e.parentNode.closest('figure') &&"
                    + " !document.querySelector('.places a[href=\"#' + e.id + '\"]')).map(e =>"
                    + " e.id)"))
        .isEqualTo(List.of());
  }

  @Test
  void allOpticalConstantsAreOneTable() {
    List<?> saved =
        (List<?>)
            browser.runLater(
                "var done = arguments[arguments.length - 1], saved = [], make ="
                    + " URL.createObjectURL, go = HTMLAnchorElement.prototype.click;"
                    + " URL.createObjectURL = b => { b.text().then(t => saved.push(t)); return"
                    + " 'data:,'; }; HTMLAnchorElement.prototype.click = () => {};"
                    + " document.querySelector('[data-together] button').click();"
                    + " setTimeout(() => { URL.createObjectURL = make;"
                    + " HTMLAnchorElement.prototype.click = go; done(saved); }, 300)");
    List<String> lines = ((String) saved.get(0)).lines().toList();
    assertThat(lines).hasSize(182);
    assertThat(lines.get(0))
        .startsWith("wavelength (nm),magnesium-fluoride n,magnesium-fluoride k,indium-tin-oxide n");
    var silver = SampleRuns.full().materials().get(4);
    assertThat(lines.get(1)).startsWith("300,").endsWith("," + number(silver.k().get(0)));
  }

  private static String number(double value) {
    return Double.toString(value).replaceFirst("\\.0$", "");
  }

  @Test
  void aComparisonIsAsQuietAsAReport() throws IOException {
    try (Browser own = Browser.start()) {
      Path file = folder.resolve("comparison.html");
      List<NamedRun> runs =
          List.of(
              Written.named("drawn", SampleRuns.assessment()),
              Written.named("<b>found", SampleRuns.full()));
      Files.writeString(file, Written.comparison(runs));
      own.console();
      own.open(file);
      for (int px : new int[] {400, 1280}) {
        own.width(px);
        assertThat(
                own.run(
                    "return Math.max(0, document.documentElement.scrollWidth - window.innerWidth)"))
            .isEqualTo(0L);
      }
      assertThat(own.console()).isEmpty();
      assertThat((String) own.run("return document.querySelector('h1').textContent"))
          .contains("not fully comparable: some are as drawn, others searched");
    }
  }
}
