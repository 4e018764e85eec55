package evensun.cli;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import tools.jackson.databind.JsonNode;
import tools.jackson.databind.json.JsonMapper;

/** The bandgap map as people and scripts ask for it. */
class GapsCommandTest {

  @TempDir Path folder;
  private final ByteArrayOutputStream out = new ByteArrayOutputStream();
  private final ByteArrayOutputStream err = new ByteArrayOutputStream();

  /** Witness: 45.1 % near 1.73 eV on a bottom cell of 1.12 eV (from memory). */
  @Test
  void bestPartnerAsJson() {
    assertThat(run("gaps", "--fix", "bottom=1.12", "--format", "json")).isZero();
    JsonNode json = JsonMapper.builder().build().readTree(out.toByteArray());
    assertThat(json.get("optimum").get("gapsEv").get(0).asDouble()).isEqualTo(1.73);
    assertThat(json.get("optimum").get("gapsEv").get(1).asDouble()).isEqualTo(1.12);
    assertThat(json.get("optimum").get("efficiencyPercent").asDouble())
        .isCloseTo(45.1, within(0.1));
    assertThat(err.size()).isZero();
  }

  @Test
  void tableAndPageAreWritten() throws IOException {
    Path csv = folder.resolve("gaps.csv");
    Path html = folder.resolve("gaps.html");
    int status =
        run(
            "gaps",
            "--subcells",
            "3",
            "--step-ev",
            "0.1",
            "--csv",
            csv.toString(),
            "--html",
            html.toString());
    assertThat(status).isZero();
    List<String> lines = Files.readAllLines(csv);
    assertThat(lines.get(0)).isEqualTo("top_ev,middle_ev,bottom_ev,efficiency_percent");
    // 21 gaps, falling, with room for one between: 20·19/2 pairs
    assertThat(lines).hasSize(1 + 190);
    assertThat(Files.readString(html)).contains("<svg", "wrong order for the light");
    assertThat(out.toString(StandardCharsets.UTF_8)).startsWith("Best: ").contains("Page: ");
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      textBlock =
          """
          --subcells=4 | --subcells: must be 2 or 3 but was 4
          --fix=left=1 | --fix: must be bottom=VALUE with a junction of top, bottom but was "left=1"
          --fix=bottom=1,2 | --fix: must be bottom=VALUE with a junction of top, bottom but was "2"
          --fix=bottom=-1 | --fix: must be in [0.3, 4.4] eV but was -1.0
          --temperature-k=0 | --temperature-k: must be in [50.0, 1000.0] K but was 0.0
          --absorptance=1.2 | --absorptance: must be in [0.0, 1.0] but was 1.2
          --radiative-efficiency=0 | --radiative-efficiency: top: must be greater than 0 but was 0.0
          --fix=top=1.1,bottom=1.3 | gaps: fixed gaps must fall from the top to the bottom but 1.3 eV follows 1.1 eV
          --spectrum=moonlight | --spectrum: must be one of AM1.5G, AM1.5D, AM0, clear-sky, blackbody or a file but was "moonlight"
          --spectrum=blackbody | --light: light: temperatureK is missing: a number in [100, 20000] K
          """)
  void wrongInputIsOneClearLine(String option, String line) {
    assertThat(run("gaps", option)).isEqualTo(2);
    assertThat(err.toString(StandardCharsets.UTF_8).strip()).isEqualTo(line);
    assertThat(out.size()).isZero();
  }

  private double best(String... light) {
    List<String> arguments =
        new ArrayList<>(List.of("gaps", "--step-ev", "0.02", "--format", "json"));
    arguments.addAll(List.of(light));
    Called called = Called.with(arguments.toArray(String[]::new));
    assertThat(called.status()).as(called.err()).isZero();
    return JsonMapper.builder()
        .build()
        .readTree(called.out())
        .get("optimum")
        .get("efficiencyPercent")
        .asDouble();
  }

  // Witness: A. De Vos, J. Phys. D: Appl. Phys. 13, 839 (1980), two cells under the unconcentrated
  // light of a sun of 6000 K: 42 % (from memory). Fewer photons of high energy leave less.
  @Test
  void theLightOfABlackbodyGivesTheClassicalLimit() {
    double sun = best("--spectrum", "blackbody", "--light", "temperatureK=6000");
    assertThat(sun).isCloseTo(42.5, within(1.0));
    assertThat(best("--spectrum", "blackbody", "--light", "temperatureK=4000")).isLessThan(sun);
  }

  // Witness: the clear sky of the standard's own conditions comes near the standard, 45.7 % (from
  // memory); the model is older and a few percent richer in blue.
  @Test
  void theLightOfAClearSkyComesNearTheStandard() {
    assertThat(best("--spectrum", "clear-sky")).isCloseTo(45.7, within(1.0));
    assertThat(best("--spectrum", "clear-sky", "--light", "precipitableWaterCm=5"))
        .isNotEqualTo(best("--spectrum", "clear-sky"));
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      textBlock =
          """
          AM1.5G | airMass=2 | --light: airMass belongs to spectrum: clear-sky
          clear-sky | airMass=0.5 | --light: airMass must be 0 (outside the atmosphere) or in [1, 38]
          clear-sky | airmass=2 | --light: light: unknown key airmass; did you mean airMass?
          clear-sky | airMass | --light: must be KEY=VALUE
          clear-sky | angleDeg=30 | --light: "angleDeg" says nothing about a map of gaps
          ../../scenarios/data/measured-film.csv | airMass=2 | --light: goes with a spectrum by name
          """)
  void aWrongLightIsOneClearLine(String spectrum, String light, String line) {
    Called called = Called.with("gaps", "--spectrum", spectrum, "--light", light);
    assertThat(called.status()).isEqualTo(2);
    assertThat(called.err().strip()).contains(line.substring(line.indexOf(' ') + 1));
    assertThat(called.err().strip()).startsWith("--light: ");
    assertThat(called.err().strip().lines()).hasSize(1);
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
