package evensun.stack;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import evensun.light.Spectra;
import evensun.material.MaterialLibrary;
import evensun.scenario.InputException;
import evensun.scenario.Source;
import evensun.scenario.reader.ScenarioReader;
import evensun.spi.Finding;
import evensun.spi.HeightMap;
import evensun.spi.IdealFace;
import evensun.spi.Samples;
import evensun.spi.Scatter;
import evensun.spi.Side;
import evensun.spi.Texture;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Where textures and scattering stand; the rules and their wording are the project's own. */
class BoundaryTest {

  private static final String TEXT =
      """
      evensun: 1
      title: Textured on both sides
      light: {spectrum: AM1.5G}
      grid: {fromNm: 600, toNm: 800, stepNm: 10}
      stack:
        - {medium: air}
        - {name: coating, material: magnesium-fluoride, thicknessNm: 100}
        - {name: contact, material: indium-tin-oxide, thicknessNm: 80, texture: {shape: pyramid, baseUm: 6}}
        - {name: wafer, material: crystalline-silicon, thicknessNm: 100000, coherence: incoherent}
        - {name: spacer, material: silicon-nitride, thicknessNm: 90}
        - {name: mirror, material: silver, scatter: {specularFraction: 0.2}}
      subcells:
        - {name: only, absorbers: [wafer]}
      search:
        vary:
          contact.texture.facetAngleDeg: [20, 60]
          contact.thicknessNm: [50, 200]
      """;

  private static ResolvedStack resolve(String text) {
    return StackResolver.resolve(
        ScenarioReader.read(new Source("cell.yaml", Path.of("."), text)),
        (name, place) -> MaterialLibrary.builtIn().find(name).orElseThrow(),
        spec -> new HeightMap(2, 2, spec.pitchUm(), Samples.of(0, 2, 1, 1)),
        Spectra.named("AM1.5G"));
  }

  @Test
  void filmsLieOnTheBoundaryOfTheThickMediaAroundThem() {
    List<Boundary> boundaries = Boundary.of(resolve(TEXT).layers());
    assertThat(boundaries).extracting(Boundary::firstFilm).containsExactly(0, 3);
    assertThat(boundaries).extracting(Boundary::below).containsExactly(2, 4);
    assertThat(boundaries.get(0).texture()).isPresent();
    assertThat(boundaries.get(1).features()).containsExactly(new Scatter(0.2, 1, Side.FRONT));
  }

  @Test
  void theFaceOfABareExitIsTheRearOfTheLastLayer() {
    String bare =
        TEXT.replaceFirst("  - \\{name: spacer.*\n", "")
            .replace("scatter: {specularFraction: 0.2}", "scatter: ideal");
    ResolvedStack stack = resolve(bare);
    assertThat(stack.layers().get(2).features()).containsExactly(new IdealFace(Side.REAR));
    assertThat(Boundary.of(stack.layers()).get(1).features()).hasSize(1);
  }

  @Test
  void theFacetAngleIsAKnob() {
    ResolvedStack stack = resolve(TEXT);
    Texture texture = Boundary.of(stack.layers()).get(0).texture().orElseThrow();
    assertThat(stack.knobs())
        .extracting(ResolvedKnob::key)
        .containsExactly("contact.texture.facetAngleDeg");
    assertThat(texture.knobs()).hasSize(1);
    // Facets of {111} on {100}: arctan √2 by the angle between the lattice planes.
    assertThat(texture.facetAngleDeg().value()).isCloseTo(54.7356, within(1e-4));
  }

  @Test
  void aPlanarisingFilmIsThickAndSaysSo() {
    String text =
        TEXT.replaceFirst("  - \\{name: coating.*\n", "")
            .replace(
                "- {medium: air}",
                "- {medium: air}\n  - {name: fill, material: fused-silica, thicknessNm: 9000, planarises: true}");
    ResolvedStack stack = resolve(text);
    assertThat(stack.layers().get(0).coherent()).isFalse();
    assertThat(stack.findings())
        .extracting(Finding::code)
        .contains("planarised-interference-ignored");
  }

  /** Heights by hand: a pyramid of base b and angle a is b/2 · tan a high, its mean a third. */
  @ParameterizedTest
  @CsvSource({
    "PYRAMID, UP, 54.7356, 2.8284, 1.4142",
    "PYRAMID, DOWN, 54.7356, 1.4142, 2.8284",
    "GROOVE, UP, 45, 1.5, 1.5",
    // A half sphere of radius 3 in a square of 6: volume 2π·27/3 over 36 is 1.5708 on the mean.
    "DIMPLE, UP, 89.9999, 1.4292, 1.5708",
  })
  void aReliefReachesFromItsMeanPlane(
      Texture.Shape shape, Texture.Direction points, double angle, double above, double below) {
    Texture texture =
        new Texture(
            shape,
            points,
            Texture.Arrangement.GRID,
            evensun.spi.Parameter.fixed(angle),
            6,
            java.util.Optional.empty(),
            Side.FRONT);
    Relief relief = Relief.of(texture, angle);
    assertThat(relief.aboveUm()).isCloseTo(above, within(1e-3));
    assertThat(relief.belowUm()).isCloseTo(below, within(1e-3));
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "'thicknessNm: 100}' | 'thicknessNm: 100, texture: {shape: groove}}' | cell.yaml:8: layer \"contact\": the boundary between \"air\" and \"wafer\" has a texture or scatter already, in layer \"coating\"",
        "coherence: incoherent} | 'coherence: incoherent, texture: {shape: groove}}' | cell.yaml:9: layer \"wafer\": the boundary between \"air\" and \"wafer\" has a texture or scatter already, in layer \"contact\"",
        "thicknessNm: 100000 | thicknessNm: 1000 | cell.yaml:9: layer \"wafer\": thicknessNm, counted between mean planes, must exceed the 1732 nm that the textures",
        "baseUm: 6 | baseUm: 0.5 | cell.yaml:8: layer \"contact\": texture must be higher than its films are thick, 300 nm together where they are thickest, but is 91 nm high",
        "'thicknessNm: 100}' | 'thicknessNm: 100, scatter: ideal}' | cell.yaml:8: layer \"contact\": the boundary between \"air\" and \"wafer\" has a texture or scatter already, in layer \"coating\"",
        "'thicknessNm: 100}' | 'thicknessNm: 1000, planarises: true, scatter: {}}\n  - {name: film, material: silicon-nitride, thicknessNm: 10, scatter: ideal}' | cell.yaml:8: layer \"film\": scatter: ideal is the limit of an outer boundary, but this one lies between \"coating\" and \"wafer\"",
        "coherence: incoherent | planarises: true | cell.yaml:9: layer \"wafer\": planarises: true needs a texture below it, but the boundary between \"wafer\" and \"mirror\" is flat",
      })
  void refuses(String right, String wrong, String message) {
    String text = TEXT.replace(right, wrong.replace("\\n", "\n"));
    assertThat(text).isNotEqualTo(TEXT);
    assertThatThrownBy(() -> resolve(text))
        .isInstanceOf(InputException.class)
        .hasMessageContaining(message);
  }
}
