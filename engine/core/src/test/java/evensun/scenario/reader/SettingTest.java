package evensun.scenario.reader;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import evensun.scenario.InputException;
import evensun.scenario.Scenario;
import java.util.Arrays;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class SettingTest {

  private static Scenario with(String... settings) {
    List<Setting> parsed =
        Arrays.stream(settings).map(text -> Setting.parse("--set", text)).toList();
    return ScenarioReader.read(ScenarioReaderTest.source(ScenarioReaderTest.PLANAR), parsed);
  }

  @Test
  void layersSectionsAndNestedKeysAreReached() {
    Scenario scenario =
        with(
            "perovskite.thicknessNm=450",
            "grid.stepNm=10",
            "light.angleDeg=60",
            "solver.options.kernel=fast",
            "mirror.material=aluminium",
            "connection=independent",
            "title=Another: one");
    assertThat(scenario.stack().get(1).thicknessNm()).isEqualTo(450);
    assertThat(scenario.grid().stepNm()).isEqualTo(10);
    assertThat(scenario.light().angleDeg()).isEqualTo(60);
    assertThat(scenario.solver().orElseThrow().options())
        .containsEntry("kernel", "fast")
        .containsEntry("depth", "3");
    assertThat(scenario.exit().material()).isEqualTo("aluminium");
    assertThat(scenario.title()).isEqualTo("Another: one");
  }

  @Test
  void subcellsAreReachedByTheirName() {
    Scenario scenario = with("top.idealityFactor=2", "subcells.bottom.collectionFraction=0.9");
    assertThat(scenario.subcells().get(0).diode().idealityFactor()).hasValue(2);
    assertThat(scenario.subcells().get(1).diode().collectionFraction()).hasValue(0.9);
  }

  @Test
  void aLayerGoesBeforeASubcellOfTheSameName() {
    String text = ScenarioReaderTest.PLANAR.replace("name: top", "name: perovskite");
    Scenario scenario =
        ScenarioReader.read(
            ScenarioReaderTest.source(text),
            List.of(
                Setting.parse("--set", "perovskite.thicknessNm=450"),
                Setting.parse("--set", "subcells.perovskite.idealityFactor=2")));
    assertThat(scenario.stack().get(1).thicknessNm()).isEqualTo(450);
    assertThat(scenario.subcells().get(0).diode().idealityFactor()).hasValue(2);
  }

  @Test
  void aKeyThatIsNotWrittenIsAdded() {
    Scenario scenario = with("front-contact.coherence=incoherent", "wafer.bandgapEv=1.1");
    assertThat(scenario.stack().get(0).coherence().name()).isEqualTo("INCOHERENT");
    assertThat(scenario.stack().get(2).gap().value()).isEqualTo(1.1);
  }

  @Test
  void varyKeysAndMaterialsMayHoldDots() {
    Scenario scenario =
        with(
            "search.vary.front-contact.thicknessNm=[10, 20]",
            "search.vary.wafer.thicknessNm=[1e5, 2e5]",
            "materials.my.contact.2.table=x.csv");
    assertThat(scenario.search().orElseThrow().vary()).hasSize(3);
    assertThat(scenario.search().orElseThrow().vary().get(0).high()).isEqualTo(20);
    assertThat(scenario.materials()).containsKey("my.contact.2");
  }

  @Test
  void theLastOfSeveralCounts() {
    assertThat(with("grid.stepNm=10", "grid.stepNm=20").grid().stepNm()).isEqualTo(20);
  }

  @Test
  void oneDraftServesManySettings() {
    Draft draft = ScenarioReader.open(ScenarioReaderTest.source(ScenarioReaderTest.PLANAR));
    Setting thick = Setting.parse("--set", "perovskite.thicknessNm=900");
    assertThat(draft.bind(List.of(thick)).stack().get(1).thicknessNm()).isEqualTo(900);
    assertThat(draft.bind(List.of()).stack().get(1).thicknessNm()).isEqualTo(500);
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "perovskite.thicknessNm=-5 | --set perovskite.thicknessNm: layer \"perovskite\": thicknessNm must be in [0, 1e7] nm but was -5",
        "perovskite.thickness=5 | --set perovskite.thickness: layer \"perovskite\": unknown key thickness; did you mean thicknessNm? (a key ends in the unit of its number)",
        "perovskit.thicknessNm=5 | --set perovskit.thicknessNm: names nothing in this scenario; did you mean perovskite.thicknessNm?",
        "thicknessNm=5 | --set thicknessNm: names nothing in this scenario; write LAYER.KEY, SUBCELL.KEY or SECTION.KEY, such as perovskite.thicknessNm or grid.stepNm",
        "grid.stepNm=7 | --set grid.stepNm: grid: the range of 900 nm must be a multiple of stepNm but that was 7 nm; the nearest legal step is 7.2 nm, or toNm: 1196",
        "grid.stepNm=1,5 | --set grid.stepNm: grid: stepNm must be a number with a decimal point but was 1,5; write 1.5",
        "grid.stepNm= | --set grid.stepNm: grid: stepNm has no value; it must be a number in (0, 1000] nm",
        "grid.stepNm=[ | --set grid.stepNm: \"[\" cannot be read as a value of a scenario",
        "grid=5 | --set grid: grid must be a mapping (key: value) but was 5",
        "grid.=5 | --set grid.: names nothing in this scenario; did you mean grid?",
        "subcells.topp.idealityFactor=1 | --set subcells.topp.idealityFactor: there is no subcell \"topp\"; did you mean top?",
        "top.idealityFactr=1 | --set top.idealityFactr: subcell \"top\": unknown key idealityFactr; did you mean idealityFactor?",
        "=5 | --set: must be KEY=VALUE, such as perovskite.thicknessNm=500, but was \"=5\"",
        "thicknessNm | --set: must be KEY=VALUE, such as perovskite.thicknessNm=500, but was \"thicknessNm\"",
        "connection=serial | --set connection: connection must be one of series, independent, parallel but was serial",
      })
  void wrongSettingsNameTheOption(String setting, String message) {
    assertThatThrownBy(() -> with(setting)).isInstanceOf(InputException.class).hasMessage(message);
  }

  @Test
  void aLayerMayBeCalledLikeASection() {
    String text = ScenarioReaderTest.PLANAR.replace("front-contact", "grid");
    Scenario scenario =
        ScenarioReader.read(
            ScenarioReaderTest.source(text),
            List.of(
                Setting.parse("--set", "grid.thicknessNm=77"),
                Setting.parse("--set", "grid.stepNm=10")));
    assertThat(scenario.stack().get(0).thicknessNm()).isEqualTo(77);
    assertThat(scenario.grid().stepNm()).isEqualTo(10);
  }
}
