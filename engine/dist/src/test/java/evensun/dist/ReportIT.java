package evensun.dist;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.math.BigDecimal;
import java.math.RoundingMode;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Duration;
import java.util.List;
import java.util.Map;
import java.util.logging.Level;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.Assumptions;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.openqa.selenium.chrome.ChromeDriver;
import org.openqa.selenium.chrome.ChromeDriverService;
import org.openqa.selenium.chrome.ChromeOptions;
import org.openqa.selenium.logging.LogEntry;
import org.openqa.selenium.logging.LogType;
import org.openqa.selenium.logging.LoggingPreferences;
import tools.jackson.databind.JsonNode;
import tools.jackson.databind.json.JsonMapper;

/**
 * The report of a real run in a real browser. Witness: the numbers of its result.json, and the
 * browser itself.
 */
class ReportIT {

  private static final Path CHROMIUM = Path.of("/usr/bin/chromium");
  private static final Path DRIVER = Path.of("/usr/bin/chromedriver");

  @TempDir Path folder;
  private ChromeDriver browser;

  @BeforeEach
  void start() {
    boolean there = Files.isExecutable(CHROMIUM) && Files.isExecutable(DRIVER);
    if (!there && !"true".equals(System.getenv("EVENSUN_REQUIRE_BROWSER"))) {
      System.err.println("SKIPPED: no browser at " + CHROMIUM + "; the report is not tested");
      Assumptions.abort("no browser");
    }
    assertThat(there).as("EVENSUN_REQUIRE_BROWSER is set: %s and driver exist", CHROMIUM).isTrue();
    ChromeOptions options = new ChromeOptions();
    options.setBinary(CHROMIUM.toFile());
    options.addArguments(
        "--headless",
        "--no-sandbox",
        "--disable-gpu",
        "--disable-background-networking",
        "--no-first-run",
        "--disable-dev-shm-usage",
        "--user-data-dir=" + folder.resolve("browser"));
    LoggingPreferences logs = new LoggingPreferences();
    logs.enable(LogType.BROWSER, Level.ALL);
    logs.enable(LogType.PERFORMANCE, Level.ALL);
    options.setCapability("goog:loggingPrefs", logs);
    var service = new ChromeDriverService.Builder().usingDriverExecutable(DRIVER.toFile()).build();
    browser = new ChromeDriver(service, options);
  }

  @AfterEach
  void stop() {
    if (browser != null) {
      browser.quit();
    }
  }

  @Test
  void theReportOfADesignIsWholeQuietAndSaysTheNumbersOfItsResult() throws IOException {
    String scenario = Program.scenario("perovskite-on-silicon.yaml").toString();
    Run run = new Program(folder).run("design", scenario, "--out", "run");
    assertThat(run.status()).isZero();
    JsonNode result =
        JsonMapper.shared().readTree(Files.readString(folder.resolve("run/result.json")));
    Path page = folder.resolve("run/report.html");
    browser.get(page.toUri().toString());
    waitUntilDrawn();

    assertThat(browser.executeScript(BLANK_CHARTS)).isEqualTo(0L);
    assertThat(shown("matchedCurrentMaPerCm2"))
        .isEqualTo(rounded(result, "matchedCurrentMaPerCm2"));
    assertThat(shown("mismatchMaPerCm2")).isEqualTo(rounded(result, "mismatchMaPerCm2"));
    assertThat(messages(LogType.BROWSER)).isEmpty();
    assertThat(messages(LogType.PERFORMANCE).stream().filter(m -> asksElsewhere(m, page)))
        .isEmpty();
    for (int px : new int[] {400, 1280}) {
      browser.executeCdpCommand(
          "Emulation.setDeviceMetricsOverride",
          Map.of("width", px, "height", 900, "deviceScaleFactor", 1, "mobile", false));
      assertThat(browser.executeScript(OVERFLOW)).as("overflow at %d px", px).isEqualTo(0L);
    }
    // No path of the machine that made it.
    assertThat(Files.readString(page))
        .doesNotContain(folder.toString(), Program.folder().toString());
  }

  private static final String BLANK_CHARTS =
      "return [...document.querySelectorAll('[data-chart]')].filter(f =>"
          + " f.querySelectorAll('.live svg path').length < 3).length";

  private static final String OVERFLOW =
      "return Math.max(0, document.documentElement.scrollWidth - window.innerWidth)";

  private void waitUntilDrawn() {
    browser.manage().timeouts().scriptTimeout(Duration.ofSeconds(60));
    browser.executeAsyncScript(
        "var done = arguments[arguments.length - 1]; (function wait() {"
            + " document.documentElement.dataset.drawn ? done() : setTimeout(wait, 20); })()");
  }

  private Object shown(String key) {
    return browser.executeScript(
        "return document.querySelector('[data-key=\"' + arguments[0] + '\"]').textContent", key);
  }

  private static String rounded(JsonNode result, String key) {
    return BigDecimal.valueOf(result.get(key).asDouble())
        .setScale(2, RoundingMode.HALF_UP)
        .toPlainString();
  }

  private List<String> messages(String log) {
    return browser.manage().logs().get(log).getAll().stream().map(LogEntry::getMessage).toList();
  }

  /** Whether the page, not the browser's own first page, asked for something outside itself. */
  private static boolean asksElsewhere(String message, Path page) {
    return message.contains("\"Network.requestWillBeSent\"")
        && message.contains("\"documentURL\":\"" + page.toUri() + "\"")
        && !message.contains("\"url\":\"" + page.toUri() + "\"")
        && !message.contains("\"url\":\"data:");
  }
}
