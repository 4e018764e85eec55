package evensun.dist;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Assumptions;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import tools.jackson.databind.JsonNode;
import tools.jackson.databind.json.JsonMapper;

/** What a person meets in the first quarter of an hour. */
class FirstStepsIT {

  @TempDir Path folder;

  private Run run(String... arguments) {
    return new Program(folder).run(arguments);
  }

  private static JsonNode json(Run run) {
    return JsonMapper.shared().readTree(run.out());
  }

  @ParameterizedTest
  @CsvSource({
    "planar, 2",
    "textured-two-junction, 2",
    "all-thin-film, 2",
    "three-junction, 3",
    "four-terminal, 2"
  })
  void aNewScenarioIsAssessedUnchanged(String like, int subcells) {
    Run made = run("new", "my cell.yaml", "--like", like);
    assertThat(made.status()).isZero();
    assertThat(made.out()).startsWith("my cell.yaml: ").endsWith("assess 'my cell.yaml'\n");
    Run assessed = run("assess", "my cell.yaml", "--format", "json");
    assertThat(assessed.err()).isEmpty();
    assertThat(assessed.status()).isZero();
    assertThat(json(assessed).get("subcells").size()).isEqualTo(subcells);
  }

  @Test
  void theSchemaLineOfANewScenarioPointsToAFile() throws IOException {
    run("new", "cell.yaml");
    String first = Files.readAllLines(folder.resolve("cell.yaml")).get(0);
    Path schema = folder.resolve(first.substring(first.indexOf("$schema=") + 8));
    assertThat(Files.readString(schema)).isEqualTo(run("schema").out());
    assertThat(Files.readString(folder.resolve("cell.yaml"))).contains("evensun assess cell.yaml");
  }

  @Test
  void aSchemaFileThatIsNotOursStays() throws IOException {
    Path other = Files.writeString(folder.resolve("evensun-scenario.schema.json"), "{}");
    assertThat(run("new", "cell.yaml").status()).isZero();
    assertThat(other).hasContent("{}");
  }

  @Test
  void aFileThatExistsStays() throws IOException {
    Path mine = Files.writeString(folder.resolve("cell.yaml"), "mine");
    Run run = run("new", "cell.yaml");
    assertThat(run.status()).isEqualTo(2);
    assertThat(run.err())
        .isEqualTo("cell.yaml: exists already and is left as it is; choose another name\n");
    assertThat(mine).hasContent("mine");
    assertThat(folder.resolve("evensun-scenario.schema.json")).doesNotExist();
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "new cell.yaml --like planer | --like: there is no template \"planer\"; did you mean planar?",
        "new cell.txt | cell.txt: a scenario is YAML; choose a name that ends in .yaml",
        "new nowhere/cell.yaml | nowhere/cell.yaml: there is no such folder; create it first",
      })
  void wrongNamesAreRefused(String arguments, String message) {
    Run run = run(arguments.split(" "));
    assertThat(run.status()).isEqualTo(2);
    assertThat(run.err()).isEqualTo(message + "\n");
    assertThat(folder).isEmptyDirectory();
  }

  @Test
  void aWaferInMicrometresIsAFinding() {
    Run run =
        run(
            "assess",
            Program.scenario("perovskite-on-silicon.yaml").toString(),
            "--set",
            "wafer.thicknessNm=180",
            "--format",
            "json");
    assertThat(json(run).get("findings").findValuesAsString("code"))
        .contains("thickness-in-micrometres");
  }

  /** The program's own prediction, written down as an instrument would, must be found again. */
  @Test
  void measuredCurvesAreLaidOverThePrediction() throws IOException {
    String demo = Program.scenario("perovskite-on-silicon.yaml").toString();
    JsonNode predicted = json(run("assess", demo, "--format", "json"));
    JsonNode spectral = predicted.get("spectral");
    StringBuilder reflectance = new StringBuilder("energy_eV;reflectance_%\n");
    StringBuilder efficiency = new StringBuilder();
    for (int w = 0; w < spectral.get("wavelengthNm").size(); w++) {
      double nm = spectral.get("wavelengthNm").get(w).asDouble();
      reflectance.append(1239.841984 / nm).append(';');
      reflectance.append(100 * spectral.get("reflectance").get(w).asDouble()).append('\n');
      efficiency.append(nm).append(',');
      efficiency.append(spectral.get("absorptance").get("perovskite").get(w).asDouble());
      efficiency.append('\n');
    }
    Files.writeString(folder.resolve("r.csv"), reflectance);
    Files.writeString(folder.resolve("eqe.csv"), efficiency);
    String scenario = Files.readString(Path.of(demo));
    Files.writeString(
        folder.resolve("tandem.yaml"),
        scenario + "measured: {reflectance: r.csv, subcells: {top: eqe.csv}}\n");

    JsonNode measured = json(run("assess", "tandem.yaml", "--format", "json")).get("measured");

    assertThat(measured.get(0).get("readAs").asString())
        .isEqualTo("percent against photon energy in eV");
    assertThat(measured.get(1).get("readAs").asString())
        .isEqualTo("fraction against wavelength in nm");
    assertThat(measured.get(0).get("rmsDifference").asDouble()).isLessThan(1e-3);
    assertThat(measured.get(1).get("rmsDifference").asDouble()).isLessThan(1e-12);
    double current = predicted.get("subcells").get(0).get("photocurrentMaPerCm2").asDouble();
    assertThat(measured.get(1).get("measuredMaPerCm2").asDouble()).isCloseTo(current, within(1e-9));
  }

  @Test
  void everyFindingOfADemoIsExplained() {
    Run demo = run("assess", Program.scenario("badly-matched.yaml").toString(), "--format", "json");
    var codes = json(demo).get("findings").findValuesAsString("code");
    assertThat(codes).isNotEmpty();
    assertThat(json(run("explain", "--format", "json")).findValuesAsString("code"))
        .containsAll(codes);
    assertThat(run("explain", codes.get(0)).out())
        .startsWith(codes.get(0) + "\n")
        .contains("What it means", "What it does to the result", "What to do");
  }

  @Test
  void thePythonExampleRunsAsWritten() throws Exception {
    String readme = Files.readString(Program.scenario("README.md"));
    int start = readme.indexOf("```python\n") + "```python\n".length();
    String example = readme.substring(start, readme.indexOf("```", start));
    Assumptions.assumeTrue(hasPython(), "SKIPPED: no python3 in PATH");
    ProcessBuilder python =
        new ProcessBuilder("python3", "-c", example).directory(Program.folder().toFile());
    python.environment().put("EVENSUN", Program.folder().resolve("bin/evensun").toString());
    Process process = python.redirectError(ProcessBuilder.Redirect.INHERIT).start();
    String out = new String(process.getInputStream().readAllBytes(), StandardCharsets.UTF_8);
    assertThat(process.waitFor()).isZero();
    assertThat(out.lines()).hasSize(7).allMatch(l -> l.matches("\\d+ nm  top .* mA/cm2"));
  }

  private static boolean hasPython() {
    try {
      return new ProcessBuilder("python3", "--version").start().waitFor() == 0;
    } catch (IOException | InterruptedException e) {
      return false;
    }
  }

  @ParameterizedTest
  @ValueSource(strings = {"new", "schema", "explain"})
  void helpFitsAndItsExampleRuns(String command) {
    String help = run(command, "--help").out();
    assertThat(help.lines()).allSatisfy(line -> assertThat(line).hasSizeLessThanOrEqualTo(100));
    String example =
        help.lines().filter(l -> l.startsWith("  evensun " + command)).findFirst().orElseThrow();
    String[] arguments = example.strip().replaceAll(" >.*", "").split(" ");
    assertThat(run(java.util.Arrays.copyOfRange(arguments, 1, arguments.length)).status()).isZero();
  }
}
