package evensun.stack;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import evensun.light.Spectra;
import evensun.material.MaterialLibrary;
import evensun.scenario.InputException;
import evensun.scenario.Source;
import evensun.scenario.reader.ScenarioReader;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;

class StackResolverTest {

  private static final String CELL =
      """
      evensun: 1
      title: A wafer
      light: {spectrum: AM1.5G}
      grid: {fromNm: 300, toNm: 1200, stepNm: 5}
      stack:
        - {medium: air}
        - {name: coating, material: silicon-nitride, thicknessNm: 75}
        - {name: wafer, material: crystalline-silicon, thicknessNm: 180000, coherence: incoherent}
        - {name: mirror, material: silver}
      subcells:
        - {name: only, absorbers: [wafer]}
      connection: series
      """;

  private static ResolvedStack resolve(String yaml) {
    MaterialLibrary library = MaterialLibrary.builtIn();
    return StackResolver.resolve(
        ScenarioReader.read(new Source("wafer.yaml", Path.of("."), yaml)),
        (name, place) ->
            library.find(name).orElseThrow(() -> new InputException(place, "no " + name)),
        Spectra.named("AM1.5G"));
  }

  @Test
  void aThickLayerThatIsLeftCoherentIsRefused() {
    // fringes λ²/(2nd): 1200²/(2·3.5·180000) = 1.1 nm and finer towards the band edge
    assertThatThrownBy(() -> resolve(CELL.replace(", coherence: incoherent", "")))
        .isInstanceOf(InputException.class)
        .hasMessageContaining("wafer.yaml:8")
        .hasMessageContaining("180000 nm is too thick to be coherent on a 5 nm grid (fringes 0.")
        .hasMessageContaining("write coherence: incoherent");
  }

  @Test
  void aThickLayerThatIsWrittenCoherentIsAFinding() {
    ResolvedStack stack = resolve(CELL.replace("coherence: incoherent", "coherence: coherent"));
    assertThat(stack.findings()).anyMatch(f -> f.code().equals("coherence-written"));
  }

  @Test
  void aThinLayerNeedsNoWord() {
    assertThat(resolve(CELL).findings()).noneMatch(f -> f.code().equals("coherence-written"));
    assertThat(resolve(CELL).layers().get(0).coherent()).isTrue();
    assertThat(resolve(CELL).layers().get(1).coherent()).isFalse();
  }

  @Test
  void everyMaterialFaultIsToldAtOnce() {
    String yaml =
        CELL.replace("material: silver", "material: sliver")
            .replace("material: silicon-nitride", "material: nothing");
    assertThatThrownBy(() -> resolve(yaml))
        .isInstanceOfSatisfying(InputException.class, e -> assertThat(e.faults()).hasSize(2));
  }

  @Test
  void aBandgapOfAFixedMaterialIsRefused() {
    assertThatThrownBy(
            () ->
                resolve(
                    CELL.replace(
                        "material: crystalline-silicon,",
                        "material: crystalline-silicon, bandgapEv: 1.2,")))
        .isInstanceOf(InputException.class)
        .hasMessageContaining("the bandgap of crystalline-silicon cannot be chosen");
  }

  @Test
  void aGridBeyondTheDataSaysWhatIsAtStake() {
    assertThatThrownBy(() -> resolve(CELL.replace("toNm: 1200", "toNm: 3000")))
        .isInstanceOf(InputException.class)
        .hasMessageContaining("mA cm⁻² of the available current are at stake");
  }

  @Test
  void anIncidentMediumThatAbsorbsIsRefused() {
    assertThatThrownBy(() -> resolve(CELL.replace("medium: air", "medium: silver")))
        .isInstanceOf(InputException.class)
        .hasMessageContaining("the incident medium must not absorb");
  }
}
