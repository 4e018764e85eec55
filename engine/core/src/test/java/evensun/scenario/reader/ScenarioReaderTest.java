package evensun.scenario.reader;

import static org.assertj.core.api.Assertions.assertThat;

import evensun.scenario.Connection;
import evensun.scenario.LayerSpec;
import evensun.scenario.LayerSpec.Coherence;
import evensun.scenario.MaterialSpec;
import evensun.scenario.Place;
import evensun.scenario.Scenario;
import evensun.scenario.SearchSpec;
import evensun.scenario.SearchSpec.VarySpec;
import evensun.scenario.Source;
import evensun.spi.Polarisation;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;

class ScenarioReaderTest {

  static final String PLANAR =
      """
      evensun: 1
      title: Planar perovskite on silicon, two terminals
      light:
        spectrum: AM1.5G            # a comment
        angleDeg: 30
        polarisation: s
      grid: {fromNm: 300, toNm: 1200, stepNm: 5}
      materials:
        my-contact: {table: data/my-contact.csv, extrapolate: hold}
      stack:
        - {medium: air}
        - {name: front-contact, material: my-contact, thicknessNm: 60}
        - {name: perovskite, material: lead-halide-perovskite, bandgapEv: 1.68, thicknessNm: 500}
        - {name: wafer, material: crystalline-silicon, thicknessNm: 180000, coherence: incoherent}
        - {name: mirror, material: silver}
      subcells:
        - {name: top, absorbers: [perovskite]}
        - {name: bottom, absorbers: [wafer]}
      connection: series
      solver: {id: transfer-matrix, options: {kernel: reference, depth: 3}}
      search:
        vary:
          front-contact.thicknessNm: [40, 120]
          perovskite.bandgapEv: [1.6, 1.8]
        aim: matched-current
        seed: 7
        evaluations: 20000
      """;

  static final String WITH_LIMITS =
      PLANAR
          .replace("[40, 120]", "{low: 40, high: 120, step: 5}")
          .replace(
              "perovskite.bandgapEv: [1.6, 1.8]",
              "perovskite.thicknessNm: {sameAs: front-contact.thicknessNm, ratio: 2}")
          .replace(
              "  seed: 7\n",
              """
                seed: 7
                timeSeconds: 2.5
                limits:
                  - {quantity: mismatchMaPerCm2, atMost: 0.3}
                  - {quantity: thicknessNm, of: [perovskite], atLeast: 100, atMost: 900}
              """);

  static Source source(String text) {
    return new Source("tandem.yaml", Path.of("."), text);
  }

  private final Scenario scenario = ScenarioReader.read(source(PLANAR));

  @Test
  void everySectionArrives() {
    assertThat(scenario.title()).isEqualTo("Planar perovskite on silicon, two terminals");
    assertThat(scenario.light().spectrum()).isEqualTo("AM1.5G");
    assertThat(scenario.light().angleDeg()).isEqualTo(30);
    assertThat(scenario.light().polarisation()).isEqualTo(Polarisation.S);
    assertThat(scenario.grid().toNm()).isEqualTo(1200);
    assertThat(scenario.incidentMedium().material()).isEqualTo("air");
    assertThat(scenario.exit().name()).isEqualTo("mirror");
    assertThat(scenario.exit().material()).isEqualTo("silver");
    assertThat(scenario.connection()).isEqualTo(Connection.SERIES);
    assertThat(scenario.subcells().get(1).absorbers()).containsExactly("wafer");
    assertThat(scenario.solver().orElseThrow().options())
        .containsEntry("kernel", "reference")
        .containsEntry("depth", "3");
  }

  @Test
  void layersKeepWhatWasWritten() {
    List<LayerSpec> layers = scenario.stack();
    assertThat(layers)
        .extracting(LayerSpec::name)
        .containsExactly("front-contact", "perovskite", "wafer");
    assertThat(layers.get(1).gap().value()).isEqualTo(1.68);
    assertThat(layers.get(1).coherence()).isEqualTo(Coherence.DEFAULT);
    assertThat(layers.get(2).coherence()).isEqualTo(Coherence.INCOHERENT);
    assertThat(layers.get(2).thicknessNm()).isEqualTo(180000);
  }

  @Test
  void materialsKeepTheirTable() {
    MaterialSpec.Table table = (MaterialSpec.Table) scenario.materials().get("my-contact");
    assertThat(table.path()).isEqualTo("data/my-contact.csv");
    assertThat(table.hold()).isTrue();
  }

  @Test
  void searchKeepsTheOrderOfTheFile() {
    assertThat(scenario.search().orElseThrow().vary())
        .extracting(VarySpec::key)
        .containsExactly("front-contact.thicknessNm", "perovskite.bandgapEv");
    assertThat(scenario.search().orElseThrow().seed()).isEqualTo(7);
    assertThat(scenario.search().orElseThrow().evaluations()).hasValue(20000);
  }

  @Test
  void searchTakesStepsTiesAndLimits() {
    SearchSpec search = ScenarioReader.read(source(WITH_LIMITS)).search().orElseThrow();
    assertThat(search.vary().get(0).step()).isEqualTo(5);
    assertThat(search.vary().get(0).high()).isEqualTo(120);
    assertThat(search.vary().get(1).isTied()).isTrue();
    assertThat(search.vary().get(1).ratio()).isEqualTo(2);
    assertThat(search.limits()).hasSize(2);
    assertThat(search.limits().get(0).atMost()).hasValue(0.3);
    assertThat(search.limits().get(1).of()).containsExactly("perovskite");
    assertThat(search.timeSeconds()).hasValue(2.5);
  }

  @Test
  void placesPointIntoTheFile() {
    Place place = scenario.stack().get(1).place();
    assertThat(place.line()).isEqualTo(13);
    assertThat(place.column()).isEqualTo(5);
    assertThat(place.key()).isEqualTo("stack[2]");
  }

  @Test
  void jsonIsReadToo() {
    String json =
        """
        {"evensun": 1, "title": "As JSON",
        \t"light": {"spectrum": "AM0"}, "grid": {"fromNm": 300, "toNm": 1200, "stepNm": 10},
        \t"stack": [{"medium": "air"}, {"name": "no", "material": "silver"}],
        \t"subcells": [{"name": "1", "absorbers": ["no"]}]}
        """;
    Scenario read = ScenarioReader.read(source(json));
    assertThat(read.exit().name()).isEqualTo("no");
    assertThat(read.subcells().get(0).name()).isEqualTo("1");
    assertThat(read.light().spectrum()).isEqualTo("AM0");
  }
}
