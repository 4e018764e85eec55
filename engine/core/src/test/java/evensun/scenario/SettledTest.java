package evensun.scenario;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import evensun.scenario.reader.ScenarioReader;
import evensun.scenario.reader.Setting;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;

/** Witness: the meaning of the keys as the format's description states it. */
class SettledTest {

  private static final String YAML =
      """
      evensun: 1
      title: Choices
      light: {spectrum: AM1.5G}
      grid: {fromNm: 400, toNm: 800, stepNm: 10}
      stack:
        - {medium: air}
        - {name: coating, material: magnesium-fluoride, thicknessNm: 100}
        - {name: contact, material: indium-tin-oxide, thicknessNm: 60}
        - {name: back, material: crystalline-silicon}
      subcells:
        - {name: only, absorbers: [back]}
      search:
        vary:
          coating.thicknessNm: [50, 150]
          contact.thicknessNm: {sameAs: coating.thicknessNm, ratio: 0.5}
          contact.material: [aluminium-zinc-oxide, indium-tin-oxide]
          coating.present: [true, false]
      """;

  /** The scenario with some values replaced: keys and values in turn. */
  private static Scenario scenario(String... replaced) {
    List<Setting> settings = new ArrayList<>();
    for (int i = 0; i < replaced.length; i += 2) {
      settings.add(Setting.parse("--set", replaced[i] + "=" + replaced[i + 1]));
    }
    return ScenarioReader.read(new Source("choices.yaml", Path.of("."), YAML), settings);
  }

  @Test
  void choicesAreReadWithWhatIsDrawn() {
    var choices = scenario().search().orElseThrow().choices();
    assertThat(choices)
        .extracting(c -> c.names().get(c.drawn()))
        .containsExactly("indium-tin-oxide", "present");
  }

  @Test
  void aChoiceThatIsMadeLeavesAPlainScenario() {
    Scenario settled = scenario().settled(List.of("aluminium-zinc-oxide", "present"));
    assertThat(settled.stack())
        .extracting(LayerSpec::material)
        .containsExactly("magnesium-fluoride", "aluminium-zinc-oxide");
    assertThat(settled.search().orElseThrow().choices()).isEmpty();
    assertThat(settled.search().orElseThrow().vary()).hasSize(2);
  }

  @Test
  void anAbsentLayerHasNoThicknessToVaryNorToFollow() {
    Scenario settled = scenario().settled(List.of("indium-tin-oxide", "absent"));
    assertThat(settled.stack()).extracting(LayerSpec::drawnNm).containsExactly(0.0, 60.0);
    assertThat(settled.search().orElseThrow().vary()).isEmpty();
  }

  @Test
  void aLayerDrawnAbsentMayComeBack() {
    Scenario drawn = scenario("coating.present", "false");
    assertThat(drawn.stack().get(0).drawnNm()).isZero();
    assertThat(drawn.search().orElseThrow().vary()).hasSize(2);
    Scenario settled = drawn.settled(List.of("indium-tin-oxide", "present"));
    assertThat(settled.stack().get(0).drawnNm()).isEqualTo(100.0);
  }

  @Test
  void aLayerLeftOutForGoodHasNoThicknessToVary() {
    Scenario drawn = scenario("coating.present", "false", "search.vary.coating.present", "[false]");
    assertThat(drawn.settled(List.of("indium-tin-oxide", "absent")).search().orElseThrow().vary())
        .isEmpty();
    Scenario withoutChoice =
        scenario("contact.present", "false", "search.vary.contact.material", "[indium-tin-oxide]");
    assertThat(withoutChoice.search().orElseThrow().vary())
        .extracting(v -> v.key())
        .containsExactly("coating.thicknessNm");
  }

  @Test
  void whatIsDrawnMustBeAmongTheAlternatives() {
    assertThatThrownBy(() -> scenario("contact.material", "zinc-oxide"))
        .hasMessageContaining("choices.yaml:16")
        .hasMessageContaining("the layer is of zinc-oxide, the alternatives are aluminium-zinc");
    assertThatThrownBy(() -> scenario("search.vary.coating.present", "[false]"))
        .hasMessageContaining("coating.present must list what is drawn as well, which is true");
  }
}
