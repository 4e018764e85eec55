package evensun.scenario.reader;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.catchThrowableOfType;

import evensun.scenario.Fault;
import evensun.scenario.InputException;
import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * Every row breaks a valid scenario in one place and must be answered by exactly one line that says
 * where, what the rule is, what was found, and what to do. The wording is the project's own; the
 * rules are those of the format's description.
 */
class WrongScenarioTest {

  private static final String VALID = ScenarioReaderTest.PLANAR;

  @ParameterizedTest(name = "{0}")
  @MethodSource("rows")
  void oneLineSaysWhereWhatAndTheRemedy(Row row) {
    String text = VALID.replace(row.right(), row.wrong());
    assertThat(text).isNotEqualTo(VALID);
    List<Fault> faults = faultsOf(text);
    assertThat(faults)
        .extracting(Fault::toString)
        .contains("tandem.yaml:" + row.line() + ": " + row.message())
        .allSatisfy(line -> assertThat(line).doesNotContain("\n", "Exception"));
    assertThat(faults).hasSizeLessThanOrEqualTo(1 + row.others());
  }

  @Test
  void theTableIsNotEmpty() throws IOException {
    assertThat(rows()).hasSizeGreaterThan(60);
  }

  static List<Row> rows() throws IOException {
    try (InputStream in = WrongScenarioTest.class.getResourceAsStream("wrong-scenarios.txt")) {
      return new String(in.readAllBytes(), StandardCharsets.UTF_8)
          .lines()
          .filter(line -> !line.startsWith("#"))
          .map(Row::of)
          .toList();
    }
  }

  private record Row(int line, String right, String wrong, int others, String message) {

    static Row of(String text) {
      String[] cells = text.split("\\|", 5);
      return new Row(
          Integer.parseInt(cells[0].strip()),
          unescaped(cells[1]),
          unescaped(cells[2]),
          Integer.parseInt(cells[3].strip()),
          cells[4].strip());
    }

    private static String unescaped(String cell) {
      return cell.strip()
          .replace("\\n", "\n")
          .replace("\\t", "\t")
          .replace("\\s", " ")
          .replace("\\_", "\u00a0")
          .replace("\\r", "\u202e");
    }
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "'' | the file is empty; `evensun new FILE` writes a scenario to start from",
        "'# nothing' | the file is empty; `evensun new FILE` writes a scenario to start from",
        "'- a' | a scenario is a mapping that starts with evensun: 1, but this is a list",
        "hello | a scenario is a mapping that starts with evensun: 1, but this is hello",
      })
  void whatIsNoScenarioIsSaidOfTheWholeFile(String text, String message) {
    assertThat(faultsOf(text))
        .extracting(Fault::toString)
        .containsExactly("tandem.yaml: " + message);
  }

  @Test
  void aSecondDocumentIsRefused() {
    assertThat(faultsOf(VALID + "---\nevensun: 1\n"))
        .extracting(Fault::message)
        .containsExactly(
            "a second document starts here; a file holds one scenario, give each its own file");
  }

  @Test
  void allFaultsAreReportedTogetherInTheOrderOfTheFile() {
    String text =
        VALID
            .replace("AM1.5G", "AM2")
            .replace("stepNm: 5", "stepNm: 7")
            .replace("thicknessNm: 60}", "thickness: 60}")
            .replace("[wafer]", "[waver]")
            .replace("seed: 7", "seed: x");
    assertThat(faultsOf(text)).extracting(f -> f.place().line()).containsExactly(4, 7, 12, 18, 26);
  }

  @Test
  void aPlaceHasColumnAndKeyPathToo() {
    String text = VALID.replace("thicknessNm: 60}", "thicknessNm: -1}");
    String line = text.lines().skip(11).findFirst().orElseThrow();
    Fault fault = faultsOf(text).get(0);
    assertThat(fault.place().column()).isEqualTo(line.indexOf("-1") + 1);
    assertThat(fault.place().key()).isEqualTo("stack[1].thicknessNm");
  }

  @Test
  void hundredsOfFaultsAreCutOff() {
    StringBuilder text = new StringBuilder(VALID);
    for (int i = 0; i < 300; i++) {
      text.append("unknown").append(i).append(": 1\n");
    }
    List<Fault> faults = faultsOf(text.toString());
    assertThat(faults).hasSize(51);
    assertThat(faults.get(50).message()).isEqualTo("and 250 more faults after this one");
  }

  private static List<Fault> faultsOf(String text) {
    InputException thrown =
        catchThrowableOfType(
            InputException.class, () -> ScenarioReader.read(ScenarioReaderTest.source(text)));
    assertThat(thrown).isNotNull();
    return thrown.faults();
  }
}
