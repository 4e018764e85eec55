package evensun.report;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Duration;
import java.util.Base64;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Assumptions;
import org.openqa.selenium.By;
import org.openqa.selenium.Dimension;
import org.openqa.selenium.JavascriptExecutor;
import org.openqa.selenium.chrome.ChromeDriver;
import org.openqa.selenium.chrome.ChromeDriverService;
import org.openqa.selenium.chrome.ChromeOptions;
import org.openqa.selenium.interactions.Actions;
import org.openqa.selenium.logging.LogEntry;
import org.openqa.selenium.logging.LogType;
import org.openqa.selenium.logging.LoggingPreferences;

/** A headless browser with a page open; tests that need one skip loudly where there is none. */
final class Browser implements AutoCloseable {

  private static final Path CHROMIUM = Path.of("/usr/bin/chromium");
  private static final Path DRIVER = Path.of("/usr/bin/chromedriver");

  private final ChromeDriver driver;

  private Browser(ChromeDriver driver) {
    this.driver = driver;
  }

  /** Starts a browser, or ends the test: skipped, or failed where a browser is required. */
  static Browser start() throws IOException {
    boolean there = Files.isExecutable(CHROMIUM) && Files.isExecutable(DRIVER);
    if (!there && !"true".equals(System.getenv("EVENSUN_REQUIRE_BROWSER"))) {
      System.err.println("SKIPPED: no browser at " + CHROMIUM + "; pages are not tested");
      Assumptions.abort("no browser at " + CHROMIUM + " or no driver at " + DRIVER);
    }
    if (!there) {
      throw new AssertionError("EVENSUN_REQUIRE_BROWSER is set, but there is no " + CHROMIUM);
    }
    return new Browser(new ChromeDriver(service(), options()));
  }

  private static ChromeDriverService service() {
    return new ChromeDriverService.Builder().usingDriverExecutable(DRIVER.toFile()).build();
  }

  private static ChromeOptions options() throws IOException {
    ChromeOptions options = new ChromeOptions();
    options.setBinary(CHROMIUM.toFile());
    options.addArguments(
        "--headless",
        "--no-sandbox",
        "--disable-gpu",
        "--disable-background-networking",
        "--no-first-run",
        "--disable-dev-shm-usage",
        "--user-data-dir=" + Files.createTempDirectory("browser"));
    LoggingPreferences logs = new LoggingPreferences();
    logs.enable(LogType.BROWSER, java.util.logging.Level.ALL);
    logs.enable(LogType.PERFORMANCE, java.util.logging.Level.ALL);
    options.setCapability("goog:loggingPrefs", logs);
    return options;
  }

  /** Opens a file and waits until every chart has been drawn; returns how long that took. */
  Duration open(Path file) {
    long start = System.nanoTime();
    driver.get(file.toUri().toString());
    driver.manage().timeouts().scriptTimeout(Duration.ofSeconds(60));
    runLater(
        "var done = arguments[arguments.length - 1]; (function wait() {"
            + " document.documentElement.dataset.drawn || document.readyState === 'complete' &&"
            + " !document.scripts.length ? done() : setTimeout(wait, 20); })()");
    return Duration.ofNanos(System.nanoTime() - start);
  }

  /** What the reader's system prefers: {@code light} or {@code dark}. */
  void scheme(String name) {
    Map<String, Object> feature = Map.of("name", "prefers-color-scheme", "value", name);
    driver.executeCdpCommand("Emulation.setEmulatedMedia", Map.of("features", List.of(feature)));
  }

  void width(int px) {
    driver.manage().window().setSize(new Dimension(px, 900));
    // A headless window has borders on some systems: ask for the inner width.
    Map<String, Object> metrics =
        Map.of("width", px, "height", 900, "deviceScaleFactor", 1, "mobile", false);
    driver.executeCdpCommand("Emulation.setDeviceMetricsOverride", metrics);
  }

  /** The page printed on paper of that size in inches. */
  byte[] print(double widthInch, double heightInch) {
    Map<String, Object> paper =
        Map.of("paperWidth", widthInch, "paperHeight", heightInch, "printBackground", true);
    Object pdf = driver.executeCdpCommand("Page.printToPDF", paper).get("data");
    return Base64.getDecoder().decode(pdf.toString());
  }

  /** Presses a key where the focus is. */
  void press(CharSequence key) {
    driver.switchTo().activeElement().sendKeys(key);
  }

  /** Moves the pointer to the middle of an element, or of a part of it. */
  void point(String selector, int dx, int dy) {
    new Actions(driver)
        .moveToElement(driver.findElement(By.cssSelector(selector)), dx, dy)
        .perform();
  }

  /** Processor time that the page's thread has used so far, in s. */
  double busySeconds() {
    driver.executeCdpCommand("Performance.enable", Map.of("timeDomain", "threadTicks"));
    List<?> metrics =
        (List<?>) driver.executeCdpCommand("Performance.getMetrics", Map.of()).get("metrics");
    return metrics.stream()
        .map(metric -> (Map<?, ?>) metric)
        .filter(metric -> metric.get("name").equals("TaskDuration"))
        .mapToDouble(metric -> ((Number) metric.get("value")).doubleValue())
        .findFirst()
        .orElseThrow();
  }

  Object run(String script, Object... arguments) {
    return ((JavascriptExecutor) driver).executeScript(script, arguments);
  }

  Object runLater(String script) {
    return ((JavascriptExecutor) driver).executeAsyncScript(script);
  }

  /** What the console said since it was last asked, policy violations included. */
  List<String> console() {
    return driver.manage().logs().get(LogType.BROWSER).getAll().stream()
        .map(LogEntry::getMessage)
        .toList();
  }

  /** Addresses the page asked for since last asked, apart from itself and what it holds inside. */
  List<String> requests(Path page) {
    String self = page.toUri().toString();
    return driver.manage().logs().get(LogType.PERFORMANCE).getAll().stream()
        .map(LogEntry::getMessage)
        .filter(message -> message.contains("\"Network.requestWillBeSent\""))
        .map(message -> message.replaceFirst("(?s).*\"request\":\\{.*?\"url\":\"(.*?)\".*", "$1"))
        .filter(url -> !url.equals(self) && !url.startsWith("data:") && !url.startsWith("blob:"))
        .toList();
  }

  @Override
  public void close() {
    driver.quit();
  }
}
