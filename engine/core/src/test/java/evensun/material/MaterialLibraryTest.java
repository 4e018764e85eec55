package evensun.material;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import evensun.material.table.Bandgap;
import java.util.Arrays;
import java.util.List;
import java.util.OptionalDouble;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;

class MaterialLibraryTest {

  private static final double[] GRID_NM =
      IntStream.rangeClosed(0, 304).mapToDouble(i -> 280 + 5.0 * i).toArray();

  private static List<String> names() {
    return MaterialLibrary.builtIn().names();
  }

  @Test
  void holdsAtLeastThirtyMaterials() {
    assertThat(names()).hasSizeGreaterThanOrEqualTo(45).isSorted();
  }

  @ParameterizedTest
  @MethodSource("names")
  void coversTheUsualGridsWithFinitePositiveNumbers(String name) {
    Material material = MaterialLibrary.builtIn().find(name).orElseThrow();
    double[] n = new double[GRID_NM.length];
    double[] k = new double[GRID_NM.length];
    material.on(GRID_NM).fill(material.bandgapEv().orElse(1), n, k);
    assertThat(Arrays.stream(n).min().orElseThrow()).isGreaterThan(0);
    assertThat(Arrays.stream(n).max().orElseThrow()).isLessThan(7);
    assertThat(Arrays.stream(k).min().orElseThrow()).isGreaterThanOrEqualTo(0);
    assertThat(Arrays.stream(k).max().orElseThrow()).isLessThan(20);
  }

  @ParameterizedTest
  @MethodSource("names")
  void saysWhereItsNumbersComeFromAndWhatToBewareOf(String name) {
    MaterialRecord record = MaterialLibrary.builtIn().record(name).orElseThrow();
    assertThat(name)
        .satisfiesAnyOf(
            n -> assertThat(record.name()).isEqualTo(n),
            n -> assertThat(record.name()).startsWith(n + "."));
    assertThat(record.source()).isNotBlank();
    assertThat(record.form()).isNotBlank();
    assertThat(record.kind())
        .isIn(
            "absorber", "conductor", "dielectric", "metal", "transport", "encapsulant", "ambient");
    if (!name.equals("air")) {
      assertThat(record.hazards()).isNotEmpty();
    }
  }

  // Independent of the header, which holds the gap so that no start has to seek it: the definition
  // itself on the numbers. Where an edge has no gap by it, a note says so.
  @ParameterizedTest
  @MethodSource("names")
  void holdsTheGapThatTheDefinitionGives(String name) {
    Material material = MaterialLibrary.builtIn().find(name).orElseThrow();
    OptionalDouble stated = material.bandgapEv();
    if (material instanceof TableMaterial measured && stated.isPresent() && !saysWhy(measured)) {
      assertThat(Bandgap.of(measured.table())).hasValueCloseTo(stated.getAsDouble(), within(1e-6));
    } else if (material instanceof ModelMaterial model) {
      OptionalDouble found = ModelMaterial.of(model.record(), model.dispersion()).bandgapEv();
      assertThat(found.isPresent()).isEqualTo(stated.isPresent());
      assertThat(found.orElse(0)).isCloseTo(stated.orElse(0), within(1e-6));
    }
  }

  private static boolean saysWhy(Material material) {
    return material.record().notes().stream()
        .anyMatch(
            note -> note.matches("(indirect gap|an amorphous edge|from memory; the data end).*"));
  }

  @Test
  void findsWhatIsMarkedAsFromMemory() {
    Material tinOxide = MaterialLibrary.builtIn().find("tin-oxide").orElseThrow();
    assertThat(tinOxide.on(GRID_NM).findings())
        .extracting(finding -> finding.code())
        .containsExactly("material-from-memory");
  }

  // I. H. Malitson (1965), fused silica 1.45846; Malitson (1962), sapphire ordinary ray 1.7682; BK7
  // glass 1.51680 (from memory); all at the sodium d line, 587.56 nm, sapphire at 589.3 nm.
  @ParameterizedTest
  @CsvSource({
    "fused-silica, 587.56, 1.45846, 1e-5",
    "sapphire, 589.3, 1.7682, 2e-4",
    "borosilicate-crown-glass, 587.56, 1.51680, 1e-5"
  })
  void meetsThePublishedIndexOfGlasses(String name, double nm, double index, double tolerance) {
    double[] n = new double[1];
    MaterialLibrary.builtIn()
        .find(name)
        .orElseThrow()
        .on(new double[] {nm})
        .fill(0, n, new double[1]);
    assertThat(n[0]).isCloseTo(index, within(tolerance));
  }

  // M. A. Green, Sol. Energy Mater. Sol. Cells 92, 1305 (2008): absorption coefficient at 300 K of
  // 4.14e3 per cm at 600 nm and 64 per cm at 1000 nm; absorption depth is its inverse.
  @ParameterizedTest
  @CsvSource({"600, 4.14e3", "1000, 64"})
  void meetsThePublishedAbsorptionOfSilicon(double nm, double alphaPerCm) {
    TableMaterial silicon =
        (TableMaterial) MaterialLibrary.builtIn().find("crystalline-silicon").orElseThrow();
    assertThat(silicon.table().alphaPerCmAt(nm)).isCloseTo(alphaPerCm, within(0.01 * alphaPerCm));
  }

  // Fresnel at normal incidence with n and k of the published table (Green 2008): 400 nm 5.613 +
  // 0.296i gives 48.6 %, 600 nm 3.939 + 0.02i 35.4 %, 900 nm 3.620 + 0.0022i 32.2 %.
  @ParameterizedTest
  @CsvSource({"400, 0.486", "600, 0.354", "900, 0.322"})
  void reflectsLikeABarePolishedSiliconSurface(double nm, double reflectance) {
    TableMaterial silicon =
        (TableMaterial) MaterialLibrary.builtIn().find("crystalline-silicon").orElseThrow();
    double n = silicon.table().nAt(nm);
    double k = silicon.table().kAt(nm);
    double got = ((n - 1) * (n - 1) + k * k) / ((n + 1) * (n + 1) + k * k);
    assertThat(got).isCloseTo(reflectance, within(0.003));
  }

  // Doping and composition make another film; only another measurement of the same one is a second
  // opinion on it.
  @Test
  void namesOtherSourcesOfTheSameFilmOnly() {
    MaterialLibrary library = MaterialLibrary.builtIn();
    assertThat(library.alternatives("hydrogenated-amorphous-silicon.n")).isEmpty();
    assertThat(library.alternatives("hydrogenated-amorphous-silicon")).isEmpty();
    assertThat(library.alternatives("lead-halide-perovskite")).isEmpty();
    assertThat(library.alternatives("lead-halide-perovskite.caesium")).isEmpty();
    assertThat(library.alternatives("crystalline-silicon"))
        .containsExactly("crystalline-silicon.295-k");
    assertThat(library.alternatives("methylammonium-lead-iodide.spun"))
        .containsExactly(
            "methylammonium-lead-iodide.crystal", "methylammonium-lead-iodide.vapour-reacted");
    assertThat(library.alternatives("nothing-of-the-kind")).isEmpty();
  }

  @Test
  void suggestsTheNearestName() {
    assertThat(MaterialLibrary.builtIn().nearest("Magnesium flouride"))
        .isEqualTo("magnesium-fluoride");
    assertThat(MaterialLibrary.builtIn().nearest("crystaline-silicon"))
        .isEqualTo("crystalline-silicon");
  }
}
