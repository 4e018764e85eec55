package evensun.scenario.reader;

import static org.assertj.core.api.Assertions.assertThat;

import evensun.scenario.Fault;
import evensun.scenario.InputException;
import evensun.scenario.Scenario;
import java.io.ByteArrayInputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.List;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Whatever a file holds: it is read, or refused in lines that a person can act on. */
class HostileScenarioTest {

  private static final String VALID = ScenarioReaderTest.PLANAR;

  @Test
  void everyTruncationIsReadOrRefused() {
    byte[] bytes = VALID.getBytes(StandardCharsets.UTF_8);
    for (int length = 0; length < bytes.length; length++) {
      readOrRefuse(java.util.Arrays.copyOf(bytes, length));
    }
  }

  @Test
  void everyDroppedLineIsReadOrRefused() {
    List<String> lines = VALID.lines().toList();
    for (int drop = 0; drop < lines.size(); drop++) {
      StringBuilder text = new StringBuilder();
      for (int i = 0; i < lines.size(); i++) {
        text.append(i == drop ? "" : lines.get(i) + "\n");
      }
      readOrRefuse(text.toString());
    }
  }

  @Test
  void changedBytesAreReadOrRefused() {
    SplittableRandom random = new SplittableRandom(20);
    byte[] valid = VALID.getBytes(StandardCharsets.UTF_8);
    for (int i = 0; i < 1000; i++) {
      byte[] bytes = valid.clone();
      for (int changes = random.nextInt(1, 6); changes > 0; changes--) {
        bytes[random.nextInt(bytes.length)] = (byte) random.nextInt(256);
      }
      readOrRefuse(bytes);
    }
  }

  @Test
  void changedMarksAreReadOrRefused() {
    SplittableRandom random = new SplittableRandom(21);
    String marks = ":,-[]{}#&*!|>'\"%@`?~ \n\t.0eE+<=\\/";
    for (int i = 0; i < 2000; i++) {
      StringBuilder text = new StringBuilder(VALID);
      for (int changes = random.nextInt(1, 5); changes > 0; changes--) {
        text.setCharAt(random.nextInt(text.length()), marks.charAt(random.nextInt(marks.length())));
      }
      readOrRefuse(text.toString());
    }
  }

  @Test
  void randomBytesAreRefused() {
    SplittableRandom random = new SplittableRandom(22);
    for (int i = 0; i < 300; i++) {
      byte[] bytes = new byte[random.nextInt(1, 400)];
      random.nextBytes(bytes);
      readOrRefuse(bytes);
    }
  }

  @ParameterizedTest
  @ValueSource(
      strings = {"[", "{", "{a: ", "- ", "? ", "!!map ", "&a ", "'", "\"", "|\n", "<<: ", "%"})
  void deepOrRepeatedMarksAreRefused(String mark) {
    readOrRefuse(mark.repeat(3000));
    readOrRefuse(VALID + "x: " + mark.repeat(3000));
    readOrRefuse("{" + VALID.replace("\n", mark));
  }

  @Test
  void manyAliasesCannotMultiply() {
    StringBuilder text = new StringBuilder("a: &a [x, x]\n");
    for (char c = 'b'; c < 'z'; c++) {
      char before = (char) (c - 1);
      text.append(c).append(": &").append(c).append(" [*").append(before);
      text.append(", *").append(before).append("]\n");
    }
    readOrRefuse(text.toString());
  }

  @Test
  void sixtyLayersAreRead() {
    StringBuilder layers = new StringBuilder("  - {medium: air}\n");
    for (int i = 0; i < 60; i++) {
      layers.append("  - {name: extra-").append(i);
      layers.append(", material: silver, thicknessNm: ").append(i).append("}\n");
    }
    Scenario scenario =
        ScenarioReader.read(
            ScenarioReaderTest.source(VALID.replace("  - {medium: air}\n", layers)));
    assertThat(scenario.stack()).hasSize(63);
  }

  @ParameterizedTest
  @ValueSource(
      strings = {"תא סולרי כפול", "خلية شمسية", "Zelle mit Öffnungen 🌞👩‍🔬", "太陽電池", "x"})
  void titlesOfAllLanguagesAreKept(String title) {
    String text = VALID.replace("Planar perovskite on silicon, two terminals", title);
    assertThat(ScenarioReader.read(ScenarioReaderTest.source(text)).title()).isEqualTo(title);
  }

  @Test
  void longForeignTextIsShortenedInMessages() {
    String text = VALID.replace("material: silver", "material: " + "é".repeat(10_000));
    List<Fault> faults = readOrRefuse(text);
    assertThat(faults).hasSize(1);
    assertThat(faults.get(0).message()).hasSizeLessThan(250);
  }

  private static List<Fault> readOrRefuse(String text) {
    return readOrRefuse(text.getBytes(StandardCharsets.UTF_8));
  }

  private static List<Fault> readOrRefuse(byte[] bytes) {
    try {
      ScenarioReader.read(Sources.open("fuzz.yaml", Path.of("."), new ByteArrayInputStream(bytes)));
      return List.of();
    } catch (InputException e) {
      assertThat(e.faults()).isNotEmpty();
      for (Fault fault : e.faults()) {
        assertActionable(fault);
      }
      return e.faults();
    }
  }

  private static void assertActionable(Fault fault) {
    assertThat(fault.place().file()).isEqualTo("fuzz.yaml");
    assertThat(fault.message())
        .isNotBlank()
        .hasSizeLessThan(600)
        .doesNotContain("\n", "\r", "\t", "Exception", "tools.jackson", "snakeyaml", "null");
  }
}
