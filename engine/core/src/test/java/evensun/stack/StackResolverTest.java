package evensun.stack;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import evensun.evaluation.Parameter;
import evensun.light.Spectra;
import evensun.material.MaterialLibrary;
import evensun.scenario.InputException;
import evensun.scenario.Source;
import evensun.scenario.reader.ScenarioReader;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

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

  private static String alloy(String choice) {
    return CELL.replace(
        "material: silicon-nitride", "material: aluminium-gallium-arsenide, " + choice);
  }

  // By hand: the record's gap 1.424 + 1.155 x + 0.37 x² eV is 1.8038 eV at x = 0.3.
  @Test
  void aCompositionChoosesTheBandgapOfAnAlloy() {
    ResolvedStack stack = resolve(alloy("compositionFraction: 0.3"));
    MaterialSlot slot = stack.slots().get(stack.layers().get(0).slot());
    assertThat(slot.bandgapEv().orElseThrow()).isCloseTo(1.8038, within(1e-12));
    Parameter moved = Parameter.of("coating.compositionFraction", stack).orElseThrow();
    assertThat(moved.drawn()).isCloseTo(0.3, within(1e-12));
    assertThat(moved.materialLow(stack)).isZero();
    // By hand: the largest gap, 2.5918 eV, has x = (−1.155 + √(1.155² + 4·0.37·1.1678)) / 0.74.
    assertThat(moved.materialHigh(stack)).isCloseTo(0.8040, within(2e-5));
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "compositionFraction: 0.95 | cell.yaml:7: layer \"coating\": compositionFraction must be in"
            + " [0, 0.804] for aluminium-gallium-arsenide but was 0.95",
        "bandgapEv: 1.2 | cell.yaml:7: layer \"coating\": bandgapEv must be in [1.424, 2.5918] eV for"
            + " aluminium-gallium-arsenide but was 1.2",
        "bandgapEv: 1.6, compositionFraction: 0.2 | cell.yaml:7: layer \"coating\": bandgapEv follows"
            + " from compositionFraction beside it; remove it"
      })
  void refusesACompositionThatThereIsNot(String choice, String message) {
    assertThatThrownBy(() -> resolve(alloy(choice)))
        .isInstanceOf(InputException.class)
        .hasMessageContaining(message.replace("cell.yaml", "wafer.yaml"));
  }

  @Test
  void refusesACompositionOfAMaterialThatHasNone() {
    String perovskite =
        alloy("compositionFraction: 0.3")
            .replace("aluminium-gallium-arsenide", "lead-halide-perovskite");
    assertThatThrownBy(() -> resolve(perovskite))
        .hasMessageContaining(
            "lead-halide-perovskite has no composition to choose by; write bandgapEv instead");
    assertThatThrownBy(() -> resolve(perovskite.replace("lead-halide-perovskite", "gold")))
        .hasMessageContaining(
            "the bandgap of gold cannot be chosen; leave compositionFraction out");
  }
}
