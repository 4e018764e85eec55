package evensun.cli;

import static org.assertj.core.api.Assertions.assertThat;

import evensun.result.ResultJson;
import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.InputStream;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.stream.Stream;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import tools.jackson.databind.JsonNode;
import tools.jackson.databind.json.JsonMapper;

/** The commands on runs written earlier. Witness: the stored numbers themselves. */
class StoredRunsCommandsTest {

  @TempDir Path folder;
  private final ByteArrayOutputStream out = new ByteArrayOutputStream();
  private final ByteArrayOutputStream err = new ByteArrayOutputStream();

  @BeforeEach
  void twoRuns() throws IOException {
    String stored;
    try (InputStream in = getClass().getResourceAsStream("result.json")) {
      stored = new String(in.readAllBytes(), StandardCharsets.UTF_8);
    }
    String started = ResultJson.parse(stored, "stored").provenance().startedUtc();
    store("old", stored);
    store(
        "new",
        stored
            .replace(started, "2027-01-01T00:00:00Z")
            .replace("\"AM1.5G\"", "\"AM0\"")
            .replaceFirst(
                "\"matchedCurrentMaPerCm2\": [0-9.]+", "\"matchedCurrentMaPerCm2\": 21.5"));
  }

  private void store(String name, String json) throws IOException {
    Path run = Files.createDirectories(folder.resolve(name));
    Files.writeString(run.resolve("result.json"), json);
    Files.writeString(run.resolve("evensun-files.txt"), "result.json\n");
  }

  @Test
  void runsListsTheLatestFirst() {
    assertThat(run("runs", folder.toString())).isZero();
    assertThat(text()).contains("matched at 21.50 mA cm⁻²");
    assertThat(text().indexOf("new")).isLessThan(text().indexOf("old"));
  }

  @Test
  void runsAsJsonIsOneDocument() {
    run("runs", folder.toString(), "--format", "json");
    JsonNode json = JsonMapper.shared().readTree(out.toByteArray());
    assertThat(json).hasSize(2);
    assertThat(json.get(0).get("matchedCurrentMaPerCm2").doubleValue()).isEqualTo(21.5);
  }

  @Test
  void reportRebuildsThePageTwiceAlike() throws IOException {
    Path page = folder.resolve("old/report.html");
    assertThat(run("report", folder.resolve("old").toString())).isZero();
    String first = Files.readString(page);
    assertThat(first).startsWith("<!DOCTYPE html>").contains("A small stored run");
    assertThat(run("report", folder.resolve("old/result.json").toString())).isZero();
    assertThat(Files.readString(page)).isEqualTo(first);
    assertThat(Files.readString(folder.resolve("old/evensun-files.txt"))).contains("report.html");
  }

  @Test
  void compareSaysWhatDiffersAndWarnsWhereTheLightDiffers() {
    assertThat(run("compare", at("old"), at("new"))).isZero();
    assertThat(text())
        .contains("B passes 21.50 mA cm⁻²", "; not fully comparable: the spectrum differs")
        .containsPattern("spectrum +AM1.5G +AM0");
    assertThat(err.size()).isZero();
  }

  @Test
  void compareWritesItsPageOnlyWhereNothingIsLost() throws IOException {
    String page = folder.resolve("both.html").toString();
    assertThat(run("compare", at("old"), at("new"), "--out", page)).isZero();
    assertThat(Files.readString(Path.of(page))).contains("not fully comparable");
    assertThat(run("compare", at("old"), at("new"), "--out", page)).isEqualTo(2);
    assertThat(err.toString(StandardCharsets.UTF_8)).contains("exists", "--force").hasLineCount(1);
    assertThat(run("compare", at("old"), at("new"), "--out", page, "--force")).isZero();
    try (Stream<Path> left = Files.list(folder)) {
      assertThat(left.filter(file -> file.toString().endsWith(".part"))).isEmpty();
    }
  }

  @Test
  void wrongNamesAreOneClearLineEach() throws IOException {
    Files.createDirectories(folder.resolve("empty"));
    assertThat(run("report", at("absent"))).isEqualTo(2);
    assertThat(run("report", at("empty"))).isEqualTo(2);
    assertThat(run("compare", at("old"))).isEqualTo(2);
    Files.writeString(folder.resolve("old/result.json"), "{}");
    assertThat(run("report", at("old"))).isEqualTo(2);
    assertThat(err.toString(StandardCharsets.UTF_8))
        .hasLineCount(4)
        .contains("there is no such run", "holds no result.json", "two to six runs")
        .contains("is not a result of Evensun");
    assertThat(out.size()).isZero();
  }

  private String at(String name) {
    return folder.resolve(name).toString();
  }

  private String text() {
    return out.toString(StandardCharsets.UTF_8);
  }

  private int run(String... args) {
    Console console =
        new Console(
            new ByteArrayInputStream(new byte[0]),
            new PrintStream(out, true, StandardCharsets.UTF_8),
            new PrintStream(err, true, StandardCharsets.UTF_8),
            false,
            false);
    return Main.run(console, args);
  }
}
