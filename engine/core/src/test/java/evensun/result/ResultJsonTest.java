package evensun.result;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import com.networknt.schema.InputFormat;
import com.networknt.schema.SchemaRegistry;
import com.networknt.schema.SpecificationVersion;
import java.io.IOException;
import java.lang.reflect.ParameterizedType;
import java.lang.reflect.RecordComponent;
import java.lang.reflect.Type;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeSet;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import tools.jackson.databind.JsonNode;
import tools.jackson.databind.json.JsonMapper;

/** The file format of results. What it must look like: the project's own published format. */
class ResultJsonTest {

  private static final JsonMapper JSON = new JsonMapper();

  @Test
  void readsBackExactlyWhatItWrote() {
    for (RunResult result : List.of(SampleResult.full(), SampleResult.sparse())) {
      assertThat(ResultJson.parse(ResultJson.write(result), "r")).isEqualTo(result);
      assertThat(ResultJson.parse(ResultJson.writeLine(result), "r")).isEqualTo(result);
    }
  }

  @Test
  void writesTheSameBytesEveryTime() {
    assertThat(ResultJson.write(SampleResult.full()))
        .isEqualTo(ResultJson.write(SampleResult.full()))
        .endsWith("}\n")
        .doesNotContain("\r");
  }

  @Test
  void aLineIsOneLine() {
    assertThat(ResultJson.writeLine(SampleResult.full())).doesNotContain("\n");
  }

  @Test
  void theFoundDesignStandsAtTheTopLevelAndTheDrawnOneHasItsShape() {
    JsonNode tree = JSON.readTree(ResultJson.write(SampleResult.full()));
    assertThat(tree.propertyNames().iterator().next()).isEqualTo("title");
    assertThat(tree.has("found")).isFalse();
    assertThat(tree.at("/matchedCurrentMaPerCm2").doubleValue()).isEqualTo(19.5);
    assertThat(tree.at("/subcells/0/photocurrentMaPerCm2").doubleValue()).isEqualTo(19.5);
    assertThat(tree.at("/losses/parasitic/0/layer").stringValue()).isEqualTo("front-contact");
    assertThat(tree.at("/spectral/absorptance/absorber/0").doubleValue()).isEqualTo(0.2);
    assertThat(tree.at("/provenance/solver/id").stringValue()).isEqualTo("transfer-matrix");
    assertThat(tree.at("/asDrawn/subcells/1/photocurrentMaPerCm2").doubleValue()).isEqualTo(21.25);
    assertThat(tree.get("asDrawn").propertyStream().map(Map.Entry::getKey).toList())
        .containsExactlyElementsOf(names(Outcome.class));
  }

  @Test
  void whatDoesNotApplyIsNullAndNotLeftOut() {
    JsonNode tree = JSON.readTree(ResultJson.write(SampleResult.sparse()));
    for (String field : List.of("matchedCurrentMaPerCm2", "limitingSubcell", "losses", "search")) {
      assertThat(tree.has(field)).as(field).isTrue();
      assertThat(tree.get(field).isNull()).as(field).isTrue();
    }
  }

  @Test
  void numbersAreTheShortestTextThatReadsBack() {
    // IEEE 754: -2e-3 and the smallest double need one digit, 0.1 + 0.2 seventeen.
    assertThat(ResultJson.write(SampleResult.full()))
        .contains("-0.002,")
        .contains("0.30000000000000004")
        .contains("5.0E-324");
  }

  @Test
  void refusesWhatJsonCannotHold() {
    RunResult full = SampleResult.full();
    RunResult broken =
        new RunResult(
            full.formatVersion(),
            full.kind(),
            full.title(),
            full.found(),
            null,
            null,
            List.of(),
            new SpectrumUse("x", "x", Double.NaN, 0, "s"),
            null,
            null,
            null,
            null,
            null,
            List.of(),
            List.of(),
            full.provenance());
    assertThatThrownBy(() -> ResultJson.write(broken))
        .hasMessageContaining("/spectrum/totalWPerM2");
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "''|formatVersion is missing",
        "[1]|formatVersion is missing",
        "{}|formatVersion is missing",
        "{\"formatVersion\":0}|must be a whole number from 1",
        "{\"formatVersion\":99}|use a newer Evensun",
        "{\"formatVersion\":1,|is not a result of Evensun",
        "not json|is not a result of Evensun",
        "{\"formatVersion\":1,\"subcells\":3}|is not a result of Evensun",
      })
  void saysInOneLineWhyAFileIsNoResult(String text, String message) {
    assertThatThrownBy(() -> ResultJson.parse(text, "old/result.json"))
        .isInstanceOf(ResultFormatException.class)
        .hasMessageStartingWith("old/result.json: ")
        .hasMessageContaining(message)
        .message()
        .hasLineCount(1);
  }

  @Test
  void theSchemaAcceptsWhatIsWrittenAndRefusesWhatIsNot() throws IOException {
    assertThat(problems(ResultJson.write(SampleResult.full()))).isEmpty();
    assertThat(problems(ResultJson.write(SampleResult.sparse()))).isEmpty();
    assertThat(problems(ResultJson.write(SampleResult.full()).replace("46.456", "\"46\"")))
        .isNotEmpty();
    assertThat(problems("{}")).isNotEmpty();
  }

  @Test
  void theSchemaDescribesEveryField() throws IOException {
    JsonNode schema = JSON.readTree(schemaText());
    Set<String> missing = new TreeSet<>();
    collect(RunResult.class, schema, schema, "", missing);
    assertThat(missing).as("add these to result.schema.json").isEmpty();
  }

  private static void collect(
      Class<?> record, JsonNode schema, JsonNode root, String path, Set<String> missing) {
    for (RecordComponent component : record.getRecordComponents()) {
      boolean flattened = component.getName().equals("found");
      JsonNode node =
          flattened ? schema : resolve(schema.at("/properties/" + component.getName()), root);
      String at = path + "/" + component.getName();
      if (node.isMissingNode()) {
        missing.add(at);
      } else {
        recordWithin(component.getGenericType())
            .ifPresent(inner -> collect(inner, items(node, root), root, at, missing));
      }
    }
  }

  private static JsonNode items(JsonNode node, JsonNode root) {
    return node.has("items") ? resolve(node.get("items"), root) : node;
  }

  private static JsonNode resolve(JsonNode node, JsonNode root) {
    JsonNode first = node.has("anyOf") ? node.at("/anyOf/0") : node;
    return first.has("$ref") ? root.at(first.get("$ref").stringValue().substring(1)) : first;
  }

  private static java.util.Optional<Class<?>> recordWithin(Type type) {
    if (type instanceof ParameterizedType list && list.getRawType() == List.class) {
      return recordWithin(list.getActualTypeArguments()[0]);
    }
    return type instanceof Class<?> c && c.isRecord()
        ? java.util.Optional.of(c)
        : java.util.Optional.empty();
  }

  private static List<String> names(Class<?> record) {
    return java.util.Arrays.stream(record.getRecordComponents())
        .map(RecordComponent::getName)
        .toList();
  }

  private static List<?> problems(String json) throws IOException {
    return SchemaRegistry.withDefaultDialect(SpecificationVersion.DRAFT_2020_12)
        .getSchema(schemaText(), InputFormat.JSON)
        .validate(json, InputFormat.JSON);
  }

  private static String schemaText() throws IOException {
    try (var in = ResultJson.class.getResourceAsStream("/evensun/result.schema.json")) {
      return new String(in.readAllBytes(), StandardCharsets.UTF_8);
    }
  }
}
