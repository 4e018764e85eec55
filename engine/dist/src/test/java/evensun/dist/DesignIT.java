package evensun.dist;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.TimeUnit;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import tools.jackson.databind.JsonNode;
import tools.jackson.databind.ObjectMapper;
import tools.jackson.databind.json.JsonMapper;
import tools.jackson.databind.node.ObjectNode;

class DesignIT {

  private static final ObjectMapper JSON = JsonMapper.builder().build();
  private static final String PLANAR = "perovskite-on-silicon.yaml";

  @TempDir Path folder;

  private JsonNode design(String name, String... more) throws IOException {
    String[] arguments = {"design", Program.scenario(name).toString(), "--out", "run"};
    Run run = new Program(folder).run(concat(arguments, more));
    assertThat(run.err()).isEmpty();
    assertThat(run.status()).isZero();
    return JSON.readTree(Files.readString(folder.resolve("run/result.json")));
  }

  private static String[] concat(String[] first, String[] second) {
    String[] all = java.util.Arrays.copyOf(first, first.length + second.length);
    System.arraycopy(second, 0, all, first.length, second.length);
    return all;
  }

  @Test
  void thePlanarDemoLiesWherePublishedPlanarDesignsLie() throws IOException {
    JsonNode result = design(PLANAR);

    // planar perovskite on silicon: 19.57 mA cm⁻² with a flat top cell, Opt. Express 24, A1288
    // (2016); other published planar designs between 18.0 and 20.7
    assertThat(result.get("matchedCurrentMaPerCm2").asDouble()).isBetween(18.0, 20.7);
    // about 7 mA cm⁻² reflected or parasitically absorbed after optimisation, arXiv 1801.07252
    JsonNode losses = result.get("losses");
    double lost =
        losses.get("reflectedMaPerCm2").asDouble() + losses.get("transmittedMaPerCm2").asDouble();
    for (JsonNode layer : losses.get("parasitic")) {
      lost += layer.get("maPerCm2").asDouble();
    }
    assertThat(lost).isBetween(5.5, 9.5);
    // AM1.5G between 300 and 1200 nm carries 46.456 mA cm⁻² (ASTM G173-03, computed)
    assertThat(result.get("incidentMaPerCm2").asDouble()).isCloseTo(46.456, within(1e-3));
    double collected = 0;
    for (JsonNode subcell : result.get("subcells")) {
      collected += subcell.get("photocurrentMaPerCm2").asDouble();
    }
    assertThat(lost + collected).isCloseTo(46.456, within(1e-3));
  }

  @ParameterizedTest
  @ValueSource(strings = {"2", "5"})
  void theResultDoesNotDependOnTheNumberOfThreads(String threads) throws IOException {
    JsonNode one = design(PLANAR, "--threads", "1");
    JsonNode several = design(PLANAR, "--threads", threads, "--force");
    assertThat(withoutTimes(several)).isEqualTo(withoutTimes(one));
  }

  /** Everything but when and how fast it ran. */
  private static JsonNode withoutTimes(JsonNode result) {
    ObjectNode provenance = (ObjectNode) result.get("provenance");
    provenance.remove("startedUtc");
    provenance.remove("elapsedSeconds");
    return result;
  }

  @Test
  void anInterruptedRunKeepsWhatItFoundAndResumesToTheSameEnd()
      throws IOException, InterruptedException {
    JsonNode whole = design(PLANAR, "--threads", "1", "--set", "grid.stepNm=1");
    Path broken = folder.resolve("broken");
    Process process =
        Program.builderWithSignals(
                folder,
                "design",
                Program.scenario(PLANAR).toString(),
                "--out",
                "broken",
                "--threads",
                "1",
                "--set",
                "grid.stepNm=1")
            .start();
    Path log = broken.resolve("progress.jsonl");
    while (process.isAlive() && (!Files.exists(log) || Files.readAllLines(log).size() < 5)) {
      Thread.sleep(10);
    }
    new ProcessBuilder("kill", "-INT", String.valueOf(process.pid())).start().waitFor();
    assertThat(process.waitFor(60, TimeUnit.SECONDS)).isTrue();
    assertThat(process.exitValue()).isEqualTo(130);
    JsonNode stopped = JSON.readTree(Files.readString(broken.resolve("result.json")));
    assertThat(stopped.get("search").get("stopped").asString()).isEqualTo("interrupted");
    assertThat(broken.resolve("report.html")).exists();

    Run resumed = new Program(folder).run("design", "--resume", "broken", "--set", "grid.stepNm=1");
    assertThat(resumed.status()).isZero();
    JsonNode end = JSON.readTree(Files.readString(broken.resolve("result.json")));
    assertThat(end.get("design")).isEqualTo(whole.get("design"));
    assertThat(end.get("search").get("history")).isEqualTo(whole.get("search").get("history"));
  }

  /** Witness: a limit of 150 nm and a range that begins at 200 nm exclude each other. */
  @Test
  void aLimitThatNoDesignKeepsIsASeriousFinding() throws IOException {
    Path scenario = folder.resolve("thin.yaml");
    Files.writeString(
        scenario,
        Files.readString(Program.scenario(PLANAR))
            + "\n  limits: [{quantity: thicknessNm, of: [perovskite], atMost: 150}]\n");
    Run run =
        new Program(folder)
            .run("design", scenario.toString(), "--out", "run", "--set", "search.evaluations=500");
    assertThat(run.status()).as(run.err()).isZero();
    JsonNode result = JSON.readTree(Files.readString(folder.resolve("run/result.json")));
    JsonNode broken = null;
    for (JsonNode finding : result.get("findings")) {
      broken = finding.get("code").asString().equals("limit-broken") ? finding : broken;
    }
    assertThat(broken).isNotNull();
    assertThat(broken.get("severity").asString()).isEqualTo("serious");
    // It comes nearest that breaks the limit least.
    assertThat(result.get("design").get("perovskite.thicknessNm").asDouble())
        .isCloseTo(200, within(1e-6));
  }

  /** Witness: the design assessed by itself in the same other way. */
  @Test
  void secondOpinionsAreWhatAnAssessmentOfTheDesignSays() throws IOException {
    JsonNode result = design(PLANAR, "--set", "search.evaluations=600");
    List<String> other = new ArrayList<>(List.of("assess", Program.scenario(PLANAR).toString()));
    result
        .get("design")
        .propertyStream()
        .forEach(e -> other.addAll(List.of("--set", e.getKey() + "=" + e.getValue())));
    for (String opinion : List.of("grid.stepNm=2.5", "solver.options.kernel=reference")) {
      List<String> arguments = new ArrayList<>(other);
      arguments.addAll(
          List.of("--set", "solver.id=transfer-matrix", "--set", opinion, "--format", "json"));
      Run run = new Program(folder).run(arguments.toArray(String[]::new));
      assertThat(run.status()).as(run.err()).isZero();
      double wanted = JSON.readTree(run.out()).get("matchedCurrentMaPerCm2").asDouble();
      String what = opinion.startsWith("grid") ? "2.5 nm" : "reference kernel";
      double told = Double.NaN;
      for (JsonNode said : result.get("secondOpinion")) {
        told = said.get("what").asString().contains(what) ? said.get("aim").asDouble() : told;
      }
      assertThat(told).as(what).isCloseTo(wanted, within(1e-9));
    }
  }

  @Test
  void aFolderThatIsNotEmptyIsLeftAlone() throws IOException {
    Path mine = folder.resolve("run/mine.txt");
    Files.createDirectories(mine.getParent());
    Files.writeString(mine, "mine");
    String scenario = Program.scenario(PLANAR).toString();
    Run run = new Program(folder).run("design", scenario, "--out", "run");
    assertThat(run.status()).isEqualTo(2);
    assertThat(run.err().strip()).hasLineCount(1).contains("not empty").contains("--force");
    Run forced = new Program(folder).run("design", scenario, "--out", "run", "--force");
    assertThat(forced.status()).isZero();
    assertThat(mine).hasContent("mine");
  }
}
