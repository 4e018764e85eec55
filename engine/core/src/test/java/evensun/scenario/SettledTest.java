package evensun.scenario;

import static org.assertj.core.api.Assertions.assertThat;

import evensun.scenario.reader.ScenarioReader;
import java.nio.file.Path;
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

  private static Scenario scenario() {
    return ScenarioReader.read(new Source("choices.yaml", Path.of("."), YAML));
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
    assertThat(settled.stack()).extracting(LayerSpec::thicknessNm).containsExactly(0.0, 60.0);
    assertThat(settled.search().orElseThrow().vary()).isEmpty();
  }
}
