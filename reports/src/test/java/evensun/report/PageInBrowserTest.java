package evensun.report;

import static org.assertj.core.api.Assertions.assertThat;

import evensun.report.page.Block;
import evensun.report.text.Numbers;
import evensun.result.RunResult;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestInstance;
import org.junit.jupiter.api.TestInstance.Lifecycle;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * Pages as a browser sees them. Outside witness: the browser itself, and the result's own numbers.
 */
@TestInstance(Lifecycle.PER_CLASS)
class PageInBrowserTest {

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

  static List<Map.Entry<String, RunResult>> pages() {
    return List.of(
        Map.entry("full", SampleRuns.full()),
        Map.entry("assessment", SampleRuns.assessment()),
        Map.entry("textured", TexturedRuns.assessment()),
        Map.entry("measured", MeasuredSectionTest.measured()),
        Map.entry("hostile", AwkwardRuns.hostile()),
        Map.entry("sixty", AwkwardRuns.sixtyLayers()),
        Map.entry("single", AwkwardRuns.oneWavelength()),
        Map.entry("failed", AwkwardRuns.failedSearch()));
  }

  private Path open(String name, RunResult result) throws IOException {
    Path file = folder.resolve(name + ".html");
    Files.writeString(file, Written.page(result));
    browser.width(1280);
    browser.console();
    browser.requests(file);
    browser.open(file);
    return file;
  }

  @ParameterizedTest
  @MethodSource("pages")
  void aPageSaysNothingOnTheConsoleAsksForNothingAndNeverScrollsSideways(
      Map.Entry<String, RunResult> page) throws IOException {
    Path file = open(page.getKey(), page.getValue());
    assertThat(browser.console()).isEmpty();
    assertThat(browser.requests(file)).isEmpty();
    for (int px : new int[] {400, 768, 1280, 2560}) {
      browser.width(px);
      assertThat(overflow()).as("px of sideways scrolling at %d px", px).isZero();
    }
    assertThat(browser.run("return window.stolen === undefined")).isEqualTo(true);
  }

  private long overflow() {
    return (Long)
        browser.run("return Math.max(0, document.documentElement.scrollWidth - window.innerWidth)");
  }

  @Test
  void theHeadlineNumbersAreThoseOfTheResult() throws IOException {
    RunResult run = SampleRuns.full();
    open("headline", run);
    assertThat(number("matchedCurrentMaPerCm2"))
        .isEqualTo(Numbers.fixed(run.found().matchedCurrentMaPerCm2(), 2));
    assertThat(number("mismatchMaPerCm2"))
        .isEqualTo(Numbers.fixed(run.found().mismatchMaPerCm2(), 2));
    assertThat(number("electrical.efficiencyPercent")).isEqualTo("29.40");
  }

  private Object number(String key) {
    return browser.run(
        "return document.querySelector('[data-key=\"' + arguments[0] + '\"]').textContent", key);
  }

  @Test
  void everyChartIsDrawnFromTheNumbersOfTheResult() throws IOException {
    RunResult run = SampleRuns.full();
    open("charts", run);
    Long blank =
        (Long)
            browser.run(
                "return [...document.querySelectorAll('[data-chart]')].filter(f =>"
                    + " f.querySelectorAll('.live svg path').length < 3).length");
    assertThat(blank).isZero();
    assertThat(browser.run("return document.querySelectorAll('[data-chart]').length"))
        .isEqualTo(charts(SampleRuns.full()));
    List<Double> reflected = run.found().spectral().reflectance();
    List<?> shown =
        (List<?>)
            browser.run(
                "var s = echarts.getInstanceByDom(document.querySelector('#fig-spectrum"
                    + " .live')).getOption().series; return s[s.length - 1].data");
    assertThat(shown).hasSameSizeAs(reflected);
    for (int i = 0; i < shown.size(); i++) {
      assertThat(((Number) shown.get(i)).doubleValue()).isEqualTo(reflected.get(i));
    }
  }

  /** Charts the page is to show. */
  private static long charts(RunResult run) {
    return Written.model(run).sections().stream()
        .flatMap(section -> section.blocks().stream())
        .mapToLong(
            block ->
                block instanceof Block.Plots plots
                    ? plots.plots().size()
                    : block instanceof Block.Strip strip
                        ? strip.curves().size()
                        : block instanceof Block.Plot ? 1 : 0)
        .sum();
  }

  @Test
  void theLegendHidesAndShowsARow() throws IOException {
    open("toggle", SampleRuns.full());
    String legend =
        "return echarts.getInstanceByDom(document.querySelector('#fig-spectrum .live'))"
            + ".getOption().legend[0].selected['top']";
    String click = "document.querySelector('#fig-spectrum button.key').click()";
    browser.run(click);
    assertThat(browser.run(legend)).isEqualTo(false);
    assertThat(browser.run("return document.querySelector('#fig-spectrum button.key').ariaPressed"))
        .isEqualTo("false");
    browser.run(click);
    assertThat(browser.run(legend)).isEqualTo(true);
  }

  @Test
  void theMarkerReadsTheCurveWhereItIsMovedTo() throws IOException {
    RunResult run = SampleRuns.full();
    open("strip", run);
    // The first point of the first curve, where nothing is interpolated.
    double top = run.whatIf().get(0).subcellMaPerCm2().get("top").get(0);
    browser.run(
        "var i = document.querySelector('#slide-what-if-1'); i.value = i.min;"
            + " i.dispatchEvent(new Event('input'))");
    assertThat((String) browser.run("return document.querySelector('.slide output').textContent"))
        .startsWith("200.0\u00a0nm: top " + Numbers.fixed(top, 2));
  }

  @Test
  void aChartsTableAndPictureCanBeTakenAway() throws IOException {
    open("tools", SampleRuns.full());
    browser.run(
        "window.saved = []; URL.createObjectURL = b => { b.text().then(t => saved.push(t)); return"
            + " 'data:,'; }; HTMLAnchorElement.prototype.click = function () {};"
            + " document.querySelector('[data-table=table-spectrum] button:last-child').click();"
            + " document.querySelector('[data-save=fig-light] button').click()");
    List<?> saved =
        (List<?>)
            browser.runLater(
                "var done = arguments[arguments.length - 1]; setTimeout(() => done(saved), 300)");
    assertThat((String) saved.get(0)).startsWith("wavelength (nm),top,bottom,").hasLineCount(182);
    assertThat((String) saved.get(1)).startsWith("<?xml").contains("<svg").doesNotContain("var(");
  }

  @Test
  void everythingIsThereWithoutScripts() throws IOException {
    String html = Written.page(SampleRuns.full());
    String bare = html.replaceAll("(?s)<script>.*?</script>", "");
    Path file = folder.resolve("bare.html");
    Files.writeString(file, bare);
    browser.width(1280);
    browser.run("location.href = arguments[0]", file.toUri().toString());
    Long drawn =
        (Long)
            browser.runLater(
                "var done = arguments[arguments.length - 1]; setTimeout(() => done([..."
                    + "document.querySelectorAll('.still')].filter(s => s.offsetHeight >"
                    + " 100).length), 500)");
    assertThat(drawn).isEqualTo(charts(SampleRuns.full()));
  }

  /** Two seconds of the browser's processor, whatever else the machine does; charts included. */
  @Test
  void aPageIsUsableWithinTwoSecondsOfProcessorTime() throws IOException {
    Path file = folder.resolve("soon.html");
    Files.writeString(file, Written.page(SampleRuns.full()));
    browser.width(1280);
    browser.open(file);
    double before = browser.busySeconds();
    browser.open(file);
    assertThat(browser.busySeconds() - before).isBetween(0.01, 2.0);
  }
}
