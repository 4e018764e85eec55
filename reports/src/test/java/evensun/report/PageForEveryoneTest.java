package evensun.report;

import static org.assertj.core.api.Assertions.assertThat;

import evensun.report.gaps.GapPageTest;
import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.TestInstance;
import org.junit.jupiter.api.TestInstance.Lifecycle;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * Pages for those who see little, or nothing, or a narrow screen. Outside witness: the rules of
 * axe-core, contrast (WCAG AA) among them.
 */
@TestInstance(Lifecycle.PER_CLASS)
class PageForEveryoneTest {

  private static final String SERIOUS =
      "var done = arguments[arguments.length - 1];"
          + " axe.run().then(r => done(r.violations.filter(v => v.impact === 'serious' ||"
          + " v.impact === 'critical').map(v => v.id + ': ' + v.nodes.slice(0, 4).map(n =>"
          + " n.target + ' ' + n.failureSummary).join(' | '))))";

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

  static List<Map.Entry<String, String>> pages() {
    return List.of(
        Map.entry("full", Written.page(SampleRuns.full())),
        Map.entry("front", Written.page(FrontRuns.full())),
        Map.entry("textured", Written.page(TexturedRuns.assessment())),
        Map.entry("measured", Written.page(MeasuredSectionTest.measured())),
        Map.entry("failed", Written.page(AwkwardRuns.failedSearch())),
        Map.entry("single", Written.page(AwkwardRuns.oneWavelength())),
        Map.entry("hostile", Written.page(AwkwardRuns.hostile())),
        Map.entry("gaps", GapPageTest.page()),
        Map.entry(
            "comparison",
            Written.comparison(
                List.of(
                    Written.named("drawn", SampleRuns.assessment()),
                    Written.named("found", SampleRuns.full())))));
  }

  @ParameterizedTest
  @MethodSource("pages")
  void theAccessibilityRulesFindNothingSerious(Map.Entry<String, String> page) throws IOException {
    Path file = Files.writeString(folder.resolve(page.getKey() + ".html"), page.getValue());
    browser.scheme("light");
    assertThat(seriousAt(1280, file)).as("light, wide").isEmpty();
    browser.scheme("dark");
    assertThat(seriousAt(400, file)).as("dark, narrow").isEmpty();
    assertThat(browser.run("return matchMedia('(prefers-color-scheme: dark)').matches"))
        .isEqualTo(true);
  }

  private List<?> seriousAt(int px, Path file) throws IOException {
    browser.width(px);
    browser.open(file);
    browser.run(rules());
    return (List<?>) browser.runLater(SERIOUS);
  }

  private static String rules() throws IOException {
    try (InputStream in = PageForEveryoneTest.class.getResourceAsStream("/axe.min.js")) {
      return new String(in.readAllBytes(), StandardCharsets.UTF_8);
    }
  }
}
