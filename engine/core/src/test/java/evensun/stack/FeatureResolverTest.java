package evensun.stack;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import evensun.light.Spectrum;
import evensun.material.MaterialLibrary;
import evensun.scenario.InputException;
import evensun.scenario.Source;
import evensun.scenario.reader.ScenarioReader;
import evensun.spi.Design;
import evensun.spi.Grading;
import evensun.spi.Mixture;
import evensun.spi.Roughness;
import evensun.spi.Side;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;

class FeatureResolverTest {

  private static final String TEXT =
      """
      evensun: 1
      title: Mixed, graded and rough
      light: {spectrum: AM1.5G}
      grid: {fromNm: 400, toNm: 800, stepNm: 10}
      stack:
        - {medium: air}
        - {name: coating, material: fused-silica, thicknessNm: 100, mixture: {porosity: 0.3, pores: ambient}}
        - name: scaffold
          thicknessNm: 300
          mixture:
            components:
              absorber: {material: lead-halide-perovskite, bandgapEv: 1.6, fraction: 0.5}
              titania: {material: titanium-dioxide, fraction: 0.3}
              air: {material: air}
        - name: slope
          thicknessNm: 40
          grading: {from: titanium-dioxide, to: air, profile: linear}
        - {name: contact, material: indium-tin-oxide, thicknessNm: 80, roughnessNm: 3, correlationLengthNm: 20}
        - {name: mirror, material: silver, roughnessNm: 5, correlationLengthNm: 9000}
      subcells:
        - {name: top, absorbers: [scaffold/absorber]}
      search:
        vary:
          scaffold/absorber.fraction: [0.1, 0.6]
          coating.mixture.porosity: [0, 0.5]
      """;

  private static ResolvedStack resolve(String text) {
    Spectrum flat =
        Spectrum.of("flat", "invented", new double[] {200, 2000}, new double[] {1.5, 1.5});
    return StackResolver.resolve(
        ScenarioReader.read(new Source("cell.yaml", Path.of("."), text)),
        (name, place) -> MaterialLibrary.builtIn().find(name).orElseThrow(),
        flat);
  }

  @Test
  void componentsPointAtTheRowsOfTheirMaterials() {
    ResolvedStack stack = resolve(TEXT);
    Mixture coating = (Mixture) stack.layers().get(0).features().get(0);
    Grading slope = (Grading) stack.layers().get(2).features().get(0);
    assertThat(coating.components().get(1).material()).isEqualTo(stack.incidentSlot());
    assertThat(stack.slots().get(coating.components().get(0).material()).name())
        .isEqualTo("fused-silica");
    assertThat(stack.slots().get(slope.upper().material()).name()).isEqualTo("titanium-dioxide");
    assertThat(slope.lower().material()).isEqualTo(stack.incidentSlot());
  }

  @Test
  void theBandgapOfAComponentIsThatOfItsSubcell() {
    ResolvedStack stack = resolve(TEXT);
    MaterialSlot slot = stack.slots().get(stack.subcells().get(0).absorbers().get(0).slot());
    assertThat(slot.name()).isEqualTo("lead-halide-perovskite");
    assertThat(slot.bandgapEv()).hasValue(1.6);
  }

  @Test
  void onlyWhatVariesIsAKnob() {
    ResolvedStack stack = resolve(TEXT);
    assertThat(stack.knobs())
        .extracting(ResolvedKnob::key)
        .containsExactly("coating.mixture.porosity", "scaffold/absorber.fraction");
    Mixture scaffold = (Mixture) stack.layers().get(1).features().get(0);
    Design design = new Design(4, stack.slots().size(), 1, 2);
    design.knob[1] = 0.6;
    double[] fractions = new double[3];
    scaffold.fractions(design, fractions);
    // By hand: 0.4 is left for titania and air, drawn as 0.3 to 0.2.
    assertThat(fractions).containsExactly(new double[] {0.6, 0.24, 0.16}, within(1e-12));
  }

  @Test
  void theRoughExitStandsOnTheLastLayer() {
    assertThat(resolve(TEXT).layers().get(3).features())
        .containsExactly(new Roughness(3, 20, Side.FRONT), new Roughness(5, 9000, Side.REAR));
  }

  @Test
  void oneFractionMustStayFixed() {
    String text =
        TEXT.replace(
            "coating.mixture.porosity: [0, 0.5]",
            "scaffold/titania.fraction: [0, 0.3]\n    scaffold/air.fraction: [0, 0.3]");
    assertThatThrownBy(() -> resolve(text))
        .isInstanceOf(InputException.class)
        .hasMessageContaining("cell.yaml:11: layer \"scaffold\": every component of the mixture");
  }
}
