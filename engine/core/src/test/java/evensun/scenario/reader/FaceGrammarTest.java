package evensun.scenario.reader;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import com.networknt.schema.InputFormat;
import com.networknt.schema.SchemaRegistry;
import com.networknt.schema.SpecificationVersion;
import evensun.scenario.FaceSpec.IdealSpec;
import evensun.scenario.FaceSpec.ScatterSpec;
import evensun.scenario.FaceSpec.TextureSpec;
import evensun.scenario.InputException;
import evensun.scenario.LayerSpec.Coherence;
import evensun.scenario.Scenario;
import evensun.spi.Texture.Arrangement;
import evensun.spi.Texture.Direction;
import evensun.spi.Texture.Shape;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Textured and scattering boundaries as people write them; the wording is the project's own. */
class FaceGrammarTest {

  private static final String TEXT =
      """
      evensun: 1
      title: Textured
      light: {spectrum: AM1.5G, diffuse: true}
      grid: {fromNm: 300, toNm: 1200, stepNm: 5}
      stack:
        - {medium: air}
        - {name: cover, material: fused-silica, thicknessNm: 50000, planarises: true, scatter: {cosinePower: 3}}
        - {name: perovskite, material: lead-halide-perovskite, thicknessNm: 500, texture: {shape: pyramid}}
        - {name: wafer, material: crystalline-silicon, thicknessNm: 1e5, coherence: incoherent}
        - {name: mirror, material: silver, texture: {shape: dimple, points: down, arrangement: scattered, facetAngleDeg: 40, baseUm: 8}}
      subcells:
        - {name: top, absorbers: [perovskite]}
        - {name: bottom, absorbers: [wafer]}
      connection: series
      search:
        vary:
          perovskite.texture.facetAngleDeg: [40, 60]
          mirror.texture.facetAngleDeg: [30, 60]
      """;

  private static Scenario read(String text) {
    return ScenarioReader.read(ScenarioReaderTest.source(text));
  }

  private static int schemaFaults(String text) {
    return SchemaRegistry.withDefaultDialect(SpecificationVersion.DRAFT_2020_12)
        .getSchema(ScenarioSchema.text())
        .validate(text, InputFormat.YAML)
        .size();
  }

  @Test
  void aTextureHasUsualValues() {
    TextureSpec texture = (TextureSpec) read(TEXT).stack().get(1).features().get(0);
    assertThat(texture.shape()).isEqualTo(Shape.PYRAMID);
    assertThat(texture.points()).isEqualTo(Direction.UP);
    assertThat(texture.arrangement()).isEqualTo(Arrangement.GRID);
    // {111} facets on {100}: arctan √2, by the angle between lattice planes.
    assertThat(texture.facetAngleDeg()).isCloseTo(54.7356, within(1e-4));
    assertThat(texture.baseUm()).isEqualTo(5);
  }

  @Test
  void theExitMediumMayHaveAnyFace() {
    TextureSpec texture = (TextureSpec) read(TEXT).exit().faces().get(0);
    assertThat(texture.shape()).isEqualTo(Shape.DIMPLE);
    assertThat(texture.points()).isEqualTo(Direction.DOWN);
    assertThat(texture.arrangement()).isEqualTo(Arrangement.SCATTERED);
    String ideal = TEXT.replaceFirst("silver, texture: .*", "silver, scatter: ideal}");
    ideal = ideal.replaceFirst("    mirror.texture.*\n", "");
    assertThat(read(ideal).exit().faces().get(0)).isInstanceOf(IdealSpec.class);
    assertThat(schemaFaults(ideal)).isZero();
  }

  @Test
  void filmsMayPlanariseAndScatterAndLightMayBeDiffuse() {
    Scenario scenario = read(TEXT);
    assertThat(scenario.light().diffuse()).isTrue();
    assertThat(scenario.stack().get(0).coherence()).isEqualTo(Coherence.PLANARISES);
    ScatterSpec scatter = (ScatterSpec) scenario.stack().get(0).features().get(0);
    assertThat(scatter.specularFraction()).isZero();
    assertThat(scatter.cosinePower()).isEqualTo(3);
    assertThat(schemaFaults(TEXT)).isZero();
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "{shape: groove, points: down, facetAngleDeg: 30}",
        "{shape: dimple, facetAngleDeg: 70}",
        "{shape: pyramid, arrangement: scattered, baseUm: 2.5}",
      })
  void readerAndSchemaTakeEveryShape(String texture) {
    String text = TEXT.replace("{shape: pyramid}", texture);
    assertThat(read(text).stack().get(1).features()).hasSize(1);
    assertThat(schemaFaults(text)).isZero();
  }

  @Test
  void aHeightMapIsAFile() {
    String text =
        TEXT.replace("{shape: pyramid}", "{shape: height-map, table: s.csv, pitchUm: 0.5}")
            .replaceFirst("    perovskite.texture.*\n", "");
    TextureSpec texture = (TextureSpec) read(text).stack().get(1).features().get(0);
    assertThat(texture.heightMap().orElseThrow().table()).isEqualTo("s.csv");
    assertThat(texture.heightMap().orElseThrow().pitchUm()).isEqualTo(0.5);
    assertThat(schemaFaults(text)).isZero();
  }

  @Test
  void settingsReachTextures() {
    Scenario scenario =
        ScenarioReader.read(
            ScenarioReaderTest.source(TEXT),
            List.of(
                Setting.parse("--set", "perovskite.texture.facetAngleDeg=50"),
                Setting.parse("--set", "mirror.texture={shape: groove}")));
    TextureSpec front = (TextureSpec) scenario.stack().get(1).features().get(0);
    assertThat(front.facetAngleDeg()).isEqualTo(50);
    assertThat(((TextureSpec) scenario.exit().faces().get(0)).shape()).isEqualTo(Shape.GROOVE);
  }

  /** Each row breaks the scenario in one place; reader and schema must both refuse it. */
  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "shape: pyramid | shape: pyramide | tandem.yaml:8: layer \"perovskite\".texture: shape must be one of pyramid, groove, dimple, height-map but was pyramide; did you mean pyramid?",
        "shape: pyramid | points: up | tandem.yaml:8: layer \"perovskite\".texture: shape is missing: pyramid, groove, dimple or height-map",
        "shape: pyramid | 'shape: pyramid, facetAngleDeg: 90' | tandem.yaml:8: layer \"perovskite\".texture: facetAngleDeg must be in (0, 90) degrees but was 90",
        "shape: pyramid | 'shape: pyramid, baseUm: 0' | tandem.yaml:8: layer \"perovskite\".texture: baseUm must be in (0, 100000] µm but was 0",
        "shape: pyramid | 'shape: pyramid, pitchUm: 1' | tandem.yaml:8: layer \"perovskite\".texture: pitchUm goes with shape: height-map; remove it",
        "'facetAngleDeg: 40, ' | '' | tandem.yaml:10: layer \"mirror\".texture: facetAngleDeg is missing: a number in (0, 90) degrees",
        "shape: pyramid | 'shape: height-map, table: s.csv' | tandem.yaml:8: layer \"perovskite\".texture: pitchUm is missing: a number in (0, 10000] µm",
        "shape: pyramid | 'shape: height-map, table: s.csv, pitchUm: 1, baseUm: 3' | tandem.yaml:8: layer \"perovskite\".texture: baseUm says nothing about a measured surface; remove it",
        "'scatter: {cosinePower: 3}' | scatter: perfect | tandem.yaml:7: layer \"cover\": scatter must be {specularFraction: …, cosinePower: …} or the word ideal but was perfect",
        "cosinePower: 3 | specularFraction: 2 | tandem.yaml:7: layer \"cover\".scatter: specularFraction must be in [0, 1] but was 2",
        "planarises: true | 'planarises: true, coherence: coherent' | tandem.yaml:7: layer \"cover\": coherence does not go with planarises: true, since intensities add in a film that fills a texture; remove it",
        "planarises: true | 'planarises: true, texture: {shape: groove}' | tandem.yaml:7: layer \"cover\": texture does not go with planarises: true, whose upper face is flat; the texture belongs to a layer below; remove it",
        "planarises: true | planarises: yes | tandem.yaml:7: layer \"cover\": planarises must be one of true, false but was yes",
        "diffuse: true | 'diffuse: true, angleDeg: 30' | tandem.yaml:3: light: angleDeg says nothing about diffuse light; remove it",
        "'facetAngleDeg: [40, 60]' | 'facetAngleDeg: [40, 95]' | tandem.yaml:17: search.vary: perovskite.texture.facetAngleDeg must be in (0, 90) degrees but was 95",
      })
  void bothRefuse(String right, String wrong, String message) {
    String text = TEXT.replace(right, wrong);
    assertThat(text).isNotEqualTo(TEXT);
    assertThat(schemaFaults(text)).isPositive();
    assertThatThrownBy(() -> read(text))
        .isInstanceOf(InputException.class)
        .hasMessageContaining(message);
  }

  @Test
  void anAngleThatIsNotThereCannotVary() {
    String text = TEXT.replace(", texture: {shape: pyramid}", "");
    assertThatThrownBy(() -> read(text))
        .hasMessageContaining(
            "search.vary: perovskite.texture.facetAngleDeg names nothing that can vary");
  }
}
