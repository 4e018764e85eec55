package evensun.dist;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestInstance;
import org.junit.jupiter.api.TestInstance.Lifecycle;
import org.junit.jupiter.api.io.TempDir;
import tools.jackson.databind.JsonNode;
import tools.jackson.databind.json.JsonMapper;

/** Runs that were finished earlier: listed, compared, shown again. Witness: their result.json. */
@TestInstance(Lifecycle.PER_CLASS)
class StoredRunsIT {

  @TempDir static Path folder;

  @BeforeAll
  void runTwice() throws IOException {
    design("--quiet");
    design("--quiet", "--set", "front-contact.material=aluminium-zinc-oxide");
  }

  private static void design(String... more) {
    String scenario = Program.scenario("perovskite-on-silicon.yaml").toString();
    String[] arguments =
        Stream.concat(Stream.of("design", scenario), Stream.of(more)).toArray(String[]::new);
    Run run = new Program(folder).run(arguments);
    assertThat(run.status()).as(run.err()).isZero();
  }

  private static Run run(String... arguments) {
    Run run = new Program(folder).run(arguments);
    assertThat(run.status()).as(run.err()).isZero();
    return run;
  }

  private static List<Path> runs() throws IOException {
    try (Stream<Path> runs = Files.list(folder.resolve("evensun-runs"))) {
      return runs.sorted().toList();
    }
  }

  private static JsonNode result(Path run) throws IOException {
    return JsonMapper.shared().readTree(Files.readString(run.resolve("result.json")));
  }

  private static String matched(Path run) throws IOException {
    return "%.2f".formatted(result(run).get("matchedCurrentMaPerCm2").asDouble());
  }

  @Test
  void theRunsOfAFolderAreListedLatestFirst() throws IOException {
    String listed = run("runs").out();
    String latest = runs().get(1).getFileName().toString();
    String first = runs().get(0).getFileName().toString();
    assertThat(listed).containsSubsequence(latest, matched(runs().get(1)), first);
  }

  @Test
  void aComparisonNamesTheOneThingThatWasChanged() throws IOException {
    String told = run("compare", "previous", "last", "--out", "comparison.html").out();
    assertThat(told)
        .containsPattern(
            "matched current +" + matched(runs().get(0)) + " +" + matched(runs().get(1)))
        .containsPattern("front-contact: material +indium-tin-oxide +aluminium-zinc-oxide")
        .doesNotContain("wafer: ", "not fully comparable")
        .endsWith("Report: comparison.html\n");
    assertThat(Files.readString(folder.resolve("comparison.html")))
        .doesNotContain(folder.toString())
        .contains("aluminium-zinc-oxide");
  }

  @Test
  void aComparisonAndASummaryGoIntoATicketAsMarkdown() throws IOException {
    assertThat(run("compare", "previous", "last", "--summary", "markdown").out())
        .startsWith("## A = ")
        .contains("| stack | A | B |", "| front-contact: material |");
    String demo = Program.scenario("perovskite-on-silicon.yaml").toString();
    String summary = run("assess", demo, "--summary", "markdown").out();
    assertThat(summary)
        .startsWith("## Planar perovskite on silicon, two terminals\n\n**As drawn, ")
        .contains("| currents, mA cm⁻² | as drawn |\n| --- | ---: |\n| top | ");
  }

  @Test
  void aReportIsRebuiltToTheSamePage() throws IOException {
    Path page = runs().get(1).resolve("report.html");
    String before = Files.readString(page);
    Files.writeString(page, "lost");
    assertThat(run("report", "last").out()).contains("report.html");
    assertThat(page).hasContent(before);
  }
}
