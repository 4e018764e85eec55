package evensun.report;

import static org.assertj.core.api.Assertions.assertThat;

import evensun.report.compare.NamedRun;
import evensun.result.ResultJson;
import evensun.result.RunResult;
import java.nio.charset.StandardCharsets;
import java.security.MessageDigest;
import java.util.ArrayList;
import java.util.Base64;
import java.util.HexFormat;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;

/** The written page. Outside witness: the text itself, and hashes computed here anew. */
class ReportWriterTest {

  private static final int MOST_BYTES = 3_000_000;

  @Test
  void aStoredResultGivesThePageOfTheLivingOne() {
    RunResult run = SampleRuns.full();
    RunResult stored = ResultJson.parse(ResultJson.write(run), "stored");
    assertThat(Written.page(stored)).isEqualTo(Written.page(run));
  }

  /** Outside witness: the hash that anyone computes of the stored file. */
  @Test
  void theHashOnThePageIsThatOfTheStoredFile() throws Exception {
    RunResult run = SampleRuns.full();
    byte[] hash = MessageDigest.getInstance("SHA-256").digest(Written.file(run));
    String digits = HexFormat.of().formatHex(hash).substring(0, 8);
    assertThat(first(Written.page(run), "<title>([^<]*)</title>")).endsWith(" · " + digits);
    assertThat(Written.comparison(List.of(Written.named("a", run), Written.named("b", run))))
        .contains(">" + digits + "</td>");
  }

  @Test
  void everyPageStaysUnderThreeMegabytes() {
    for (RunResult run :
        List.of(SampleRuns.full(), AwkwardRuns.sixtyLayers(), AwkwardRuns.hostile())) {
      assertThat(Written.page(run).getBytes(StandardCharsets.UTF_8)).hasSizeLessThan(MOST_BYTES);
    }
  }

  @Test
  void thePolicyNamesTheHashOfEveryScriptAndStyleAndNothingElse() throws Exception {
    String html = Written.page(SampleRuns.full());
    String policy =
        first(html, "Content-Security-Policy\" content=\"([^\"]*)\"").replace("&#39;", "'");
    assertThat(policy).startsWith("default-src 'none'; ").contains("base-uri 'none'");
    List<String> inside = new ArrayList<>();
    collect(html, "(?s)<script>(.*?)</script>", inside);
    collect(html, "(?s)<style>(.*?)</style>", inside);
    assertThat(inside).hasSize(3);
    for (String text : inside) {
      byte[] hash =
          MessageDigest.getInstance("SHA-256").digest(text.getBytes(StandardCharsets.UTF_8));
      assertThat(policy).contains("'sha256-" + Base64.getEncoder().encodeToString(hash) + "'");
    }
    assertThat(policy.split("sha256-", -1)).hasSize(4);
  }

  @Test
  void noTextOfAScenarioBecomesMarkup() {
    String html = Written.page(AwkwardRuns.hostile());
    String quiet = Written.page(SampleRuns.full());
    // The page's own script and style elements and no more; the hostile image nowhere.
    assertThat(count(html, "<script>")).isEqualTo(count(quiet, "<script>")).isEqualTo(2);
    String withoutOwnScripts = html.replaceAll("(?s)<script>.*?</script>", "");
    assertThat(withoutOwnScripts).doesNotContain("<img").doesNotContain("<script>");
    assertThat(html).contains("&lt;/script&gt;").contains("\\u003c/script>");
  }

  @Test
  void aComparisonNamesWhatDiffers() {
    List<NamedRun> runs =
        List.of(
            Written.named("first", SampleRuns.assessment()),
            Written.named("second", SampleRuns.full()));
    assertThat(Written.comparison(runs)).contains("not fully comparable", "table-stack");
    assertThat(CompareWriter.text(runs, ""))
        .contains("B passes")
        .contains("more than A; not fully comparable: some are as drawn, others searched")
        .containsPattern("front-contact: thickness, nm +80.0 +40.0 +−40.0")
        .doesNotContain("wafer: thickness", "front-contact: material");
  }

  private static int count(String text, String part) {
    return text.split(Pattern.quote(part), -1).length - 1;
  }

  private static String first(String text, String pattern) {
    Matcher matcher = Pattern.compile(pattern).matcher(text);
    assertThat(matcher.find()).isTrue();
    return matcher.group(1);
  }

  private static void collect(String text, String pattern, List<String> into) {
    Matcher matcher = Pattern.compile(pattern).matcher(text);
    while (matcher.find()) {
      into.add(matcher.group(1));
    }
  }
}
