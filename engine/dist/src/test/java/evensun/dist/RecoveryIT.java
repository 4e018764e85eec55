package evensun.dist;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import java.util.concurrent.TimeUnit;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import tools.jackson.databind.JsonNode;
import tools.jackson.databind.ObjectMapper;
import tools.jackson.databind.json.JsonMapper;
import tools.jackson.databind.node.ArrayNode;
import tools.jackson.databind.node.ObjectNode;

/**
 * Runs that are killed, stopped and repeated. Witness throughout: the run that nobody disturbed.
 */
class RecoveryIT {

  private static final ObjectMapper JSON = JsonMapper.builder().build();

  /** Named as the copy in a run's folder, from which a run resumes. */
  private static final String SCENARIO = "scenario.yaml";

  private static final int KILLED = 137; // 128 + SIGKILL
  private static final int INTERRUPTED = 130;
  private static final int MOMENTS = 10;
  private static final String[] THREADS = {"1", "2", "5"};

  @TempDir Path folder;

  @BeforeEach
  void copyScenario() throws IOException {
    Files.copy(Program.scenario("perovskite-on-silicon.yaml"), folder.resolve(SCENARIO));
  }

  private JsonNode run(String... arguments) throws IOException {
    Run run = new Program(folder).run(arguments);
    assertThat(run.status()).as(run.err()).isZero();
    return result("run");
  }

  /**
   * Everything but when and how fast it ran, and the grid that is looked at unasked, which depends
   * on whether two seconds are enough for it.
   */
  private JsonNode result(String run) throws IOException {
    JsonNode result = JSON.readTree(Files.readString(folder.resolve(run).resolve("result.json")));
    ObjectNode provenance = (ObjectNode) result.get("provenance");
    provenance.remove("startedUtc");
    provenance.remove("elapsedSeconds");
    ((ObjectNode) result.get("search")).remove("grid");
    ArrayNode findings = (ArrayNode) result.get("findings");
    findings.removeIf(finding -> finding.get("code").asString().startsWith("grid-"));
    return result;
  }

  @Test
  void killedAtTenMomentsItResumesToTheVerySameEnd() throws Exception {
    resumesToTheVerySameEnd(MOMENTS, 0.95);
  }

  /** What {@code --set} changed is known to the run that resumes. */
  @Test
  void aSearchWithChoicesResumesToTheVerySameEnd() throws Exception {
    resumesToTheVerySameEnd(
        3,
        0.9,
        "--set",
        "grid.stepNm=20",
        "--set",
        "search.evaluations=4000",
        "--set",
        "search.vary.front-contact.material=[indium-tin-oxide, aluminium-zinc-oxide]",
        "--set",
        "search.vary.recombination.present=[true, false]");
  }

  @Test
  void aFrontResumesToTheVerySameEnd() throws Exception {
    resumesToTheVerySameEnd(
        3,
        0.6,
        "--set",
        "grid.stepNm=20",
        "--set",
        "search.evaluations=4000",
        "--set",
        "search.aim=[matched-current, {smallest: thicknessNm, of: [perovskite]}, {smallest:"
            + " reflectedMaPerCm2}]");
  }

  /**
   * Disturbs a run at random moments.
   *
   * @param count how many
   * @param latest the last of them at this part of its evaluations
   * @param settings of the first command; those that resume go without
   */
  private void resumesToTheVerySameEnd(int count, double latest, String... settings)
      throws Exception {
    JsonNode whole = run(started("run", "1", settings));
    int evaluations = whole.get("search").get("evaluations").asInt();
    Random random = new Random(20);
    List<Integer> moments = new ArrayList<>();
    for (int i = 0; i < count; i++) {
      moments.add((int) (evaluations * (0.02 + (latest - 0.02) * random.nextDouble())));
    }
    moments.sort(null);
    for (int i = 0; i < count; i++) {
      String threads = THREADS[i % THREADS.length];
      boolean kill = i % 5 != Math.min(4, count / 2); // the others are stopped as by Ctrl-C
      String[] command =
          i == 0
              ? started("broken", threads, settings)
              : new String[] {"design", "--resume", "broken", "--threads", threads};
      assertThat(disturbed(i == 0, command, moments.get(i), kill))
          .as("moment %d, at %d evaluations", i, moments.get(i))
          .isEqualTo(kill ? KILLED : INTERRUPTED);
    }
    Run resumed = new Program(folder).run("design", "--resume", "broken");
    assertThat(resumed.status()).as(resumed.err()).isZero();
    assertThat(result("broken")).isEqualTo(whole);
  }

  private static String[] started(String out, String threads, String... settings) {
    List<String> command =
        new ArrayList<>(List.of("design", SCENARIO, "--out", out, "--threads", threads));
    command.addAll(List.of(settings));
    return command.toArray(String[]::new);
  }

  /** Starts or resumes the run, disturbs it once it has come so far, and tells how it ended. */
  private int disturbed(boolean first, String[] command, int evaluations, boolean kill)
      throws IOException, InterruptedException {
    ProcessBuilder builder = Program.builderWithSignals(folder, command);
    // A process that lives for a moment starts faster without the second compiler.
    builder.environment().put("JAVA_TOOL_OPTIONS", "-XX:TieredStopAtLevel=1");
    Process process =
        builder.redirectErrorStream(true).redirectOutput(ProcessBuilder.Redirect.DISCARD).start();
    Path log = folder.resolve("broken/progress.jsonl");
    long before = first ? 0 : Files.size(log);
    while (process.isAlive() && !(grown(log, before) && evaluated(log) >= evaluations)) {
      Thread.sleep(2);
    }
    if (kill) {
      process.destroyForcibly();
    } else {
      new ProcessBuilder("kill", "-INT", String.valueOf(process.pid())).start().waitFor();
    }
    assertThat(process.waitFor(60, TimeUnit.SECONDS)).isTrue();
    return process.exitValue();
  }

  private static boolean grown(Path log, long before) throws IOException {
    return Files.exists(log) && Files.size(log) > before;
  }

  private static int evaluated(Path log) throws IOException {
    String text = Files.readString(log);
    int end = text.lastIndexOf('\n');
    String line = text.substring(text.lastIndexOf('\n', end - 1) + 1, end);
    return JSON.readTree(line).get("evaluations").asInt();
  }

  @Test
  void aRunStoppedByTheClockIsRepeatedByItsOwnCommand() throws IOException {
    JsonNode timed =
        run("design", SCENARIO, "--out", "run", "--time-seconds", "0.2", "--threads", "1");
    assertThat(timed.get("search").get("stopped").asString()).isEqualTo("time");
    String repeat = timed.get("provenance").get("repeatCommand").asString();
    assertThat(repeat).matches(".* --generations \\d+");
    String generations = repeat.substring(repeat.lastIndexOf(' ') + 1);
    JsonNode again =
        run("design", SCENARIO, "--out", "run", "--generations", generations, "--force");
    assertThat(again).isEqualTo(timed);
  }
}
