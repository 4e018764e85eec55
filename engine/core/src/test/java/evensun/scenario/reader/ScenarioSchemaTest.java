package evensun.scenario.reader;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.catchThrowable;

import com.networknt.schema.InputFormat;
import com.networknt.schema.Schema;
import com.networknt.schema.SchemaRegistry;
import com.networknt.schema.SpecificationVersion;
import evensun.scenario.InputException;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;
import tools.jackson.databind.JsonNode;
import tools.jackson.databind.json.JsonMapper;

/** The schema is written by hand, so it is held against the reader from both sides. */
class ScenarioSchemaTest {

  private static final Path SCENARIOS = Path.of("../../scenarios");

  private final Schema schema = schema();

  private static Schema schema() {
    return SchemaRegistry.withDefaultDialect(SpecificationVersion.DRAFT_2020_12)
        .getSchema(ScenarioSchema.text());
  }

  static List<Path> scenarios() throws IOException {
    try (Stream<Path> files = Files.list(SCENARIOS)) {
      return files.filter(f -> f.toString().endsWith(".yaml")).sorted().toList();
    }
  }

  @Test
  void thereAreScenariosToCheck() throws IOException {
    assertThat(scenarios()).hasSizeGreaterThanOrEqualTo(4);
  }

  @ParameterizedTest
  @MethodSource("scenarios")
  void everyScenarioFitsTheSchema(Path file) throws IOException {
    assertThat(schema.validate(Files.readString(file), InputFormat.YAML)).isEmpty();
  }

  @ParameterizedTest
  @MethodSource("scenarios")
  void everyScenarioCanBeRead(Path file) {
    assertThat(ScenarioReader.read(file).subcells()).isNotEmpty();
  }

  static Set<String> templates() {
    return Templates.names().keySet();
  }

  @ParameterizedTest
  @MethodSource("templates")
  void everyTemplateFitsTheSchemaAndCanBeRead(String name) {
    String text = Templates.text(name).orElseThrow();
    assertThat(schema.validate(text, InputFormat.YAML)).isEmpty();
    assertThat(ScenarioReader.read(ScenarioReaderTest.source(text)).search()).isPresent();
    assertThat(text).startsWith("# yaml-language-server: $schema=" + Templates.SCHEMA_FILE);
  }

  /** README.md of the scenarios is where people look keys up. */
  @Test
  void everyKeyOfTheSchemaIsInTheReadme() throws IOException {
    String readme = Files.readString(SCENARIOS.resolve("README.md"));
    Set<String> keys = new TreeSet<>();
    collectKeys(JsonMapper.shared().readTree(ScenarioSchema.text()), keys);
    assertThat(keys).hasSizeGreaterThan(40);
    assertThat(keys).allSatisfy(key -> assertThat(readme).contains(key));
  }

  private static void collectKeys(JsonNode node, Set<String> keys) {
    if (node.has("properties")) {
      keys.addAll(node.get("properties").propertyNames());
    }
    node.forEach(child -> collectKeys(child, keys));
  }

  @Test
  void theSchemaHasItsId() {
    assertThat(ScenarioSchema.text()).contains("\"$id\": \"" + ScenarioSchema.ID + "\"");
  }

  @Test
  void theSchemaTakesWhatTheReaderTakes() {
    assertThat(schema.validate(ScenarioReaderTest.PLANAR, InputFormat.YAML)).isEmpty();
  }

  /** Each row breaks the valid scenario in one place; schema and reader must both refuse it. */
  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "evensun: 1 | evensun: 2",
        "evensun: 1 | title2: x",
        "title: Planar perovskite on silicon, two terminals | title: [a]",
        "title: Planar perovskite on silicon, two terminals | title: ''",
        "AM1.5G | AM15G",
        "AM1.5G | {tabel: x.csv}",
        "angleDeg: 30 | angleDeg: 90",
        "angleDeg: 30 | angleDeg: -1",
        "angleDeg: 30 | angleDeg: '30'",
        "angleDeg: 30 | angleDeg: 1,5",
        "angleDeg: 30 | angle: 30",
        "polarisation: s | polarisation: circular",
        "fromNm: 300 | fromNm: 0.3",
        "stepNm: 5 | stepNm: 0",
        "stepNm: 5 | step: 5",
        "toNm: 1200, |",
        "{table: data/my-contact.csv, extrapolate: hold} | data/my-contact.csv",
        "extrapolate: hold | extrapolate: guess",
        "my-contact: {table | 'my contact: {table'",
        "- {medium: air} | - {name: air}",
        "thicknessNm: 60} | thicknessNm: -12.0}",
        "thicknessNm: 60} | thickness: 60}",
        "thicknessNm: 60} | thicknessNm: 60 nm}",
        "name: perovskite | name: pérovskite",
        "name: perovskite | name: 1",
        "bandgapEv: 1.68 | bandgapEv: 738",
        "bandgapEv: 1.68 | compositionFraction: 1.5",
        "bandgapEv: 1.68 | 'bandgapEv: 1.68, compositionFraction: 0.2'",
        "coherence: incoherent | coherence: partly",
        "material: silver | materail: silver",
        "absorbers: [perovskite] | absorbers: []",
        "absorbers: [perovskite] | absorbers: perovskite",
        "absorbers: [wafer] | absorber: [wafer]",
        "connection: series | connection: serial",
        "connection: series |",
        "id: transfer-matrix | id: Transfer_Matrix",
        "id: transfer-matrix, |",
        "[40, 120] | [40]",
        "[40, 120] | [40, 120, 130]",
        "[40, 120] | [-1, 120]",
        "[40, 120] | 40",
        "front-contact.thicknessNm: | front-contact.thickness:",
        "aim: matched-current | aim: matched",
        "seed: 7 | seed: 7.5",
        "seed: 7 | seed: -1",
        "evaluations: 20000 | evaluations: 0",
        "evaluations: 20000 | timeSeconds: 0",
        "[40, 120] | '{low: 40}'",
        "[40, 120] | '{low: 40, high: 120, step: 0}'",
        "[40, 120] | '{sameAs: perovskite.bandgapEv, ratio: 0}'",
        "evaluations: 20000 | 'limits: [{quantity: mismatch, atMost: 1}]'",
        "evaluations: 20000 | 'limits: [{quantity: mismatchMaPerCm2}]'",
      })
  void bothRefuse(String right, String wrong) {
    String text = ScenarioReaderTest.PLANAR.replace(right, wrong == null ? "" : wrong);
    assertThat(text).isNotEqualTo(ScenarioReaderTest.PLANAR);
    assertThat(schema.validate(text, InputFormat.YAML)).isNotEmpty();
    assertThat(catchThrowable(() -> read(text))).isInstanceOf(InputException.class);
  }

  private static void read(String text) {
    ScenarioReader.read(ScenarioReaderTest.source(text));
  }

  @Test
  void bothTakeStepsTiesAndLimits() {
    assertThat(schema.validate(ScenarioReaderTest.WITH_LIMITS, InputFormat.YAML)).isEmpty();
    read(ScenarioReaderTest.WITH_LIMITS);
  }
}
