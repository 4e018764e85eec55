package evensun.material;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import evensun.material.table.Bandgap;
import evensun.material.table.OpticalTable;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class TunableMaterialTest {

  private static final double[] FINE_NM =
      IntStream.rangeClosed(0, 4 * 920).mapToDouble(i -> 280 + i / 4.0).toArray();

  private static Material material(String name) {
    return MaterialLibrary.builtIn().find(name).orElseThrow();
  }

  private static OpticalTable at(String name, double gapEv) {
    double[] n = new double[FINE_NM.length];
    double[] k = new double[FINE_NM.length];
    material(name).on(FINE_NM).fill(gapEv, n, k);
    return OpticalTable.of(FINE_NM, n, k);
  }

  // Definition of the gap: steepest rise of the absorption coefficient.
  @ParameterizedTest
  @ValueSource(
      strings = {
        "lead-halide-perovskite",
        "lead-halide-perovskite.caesium",
        "gallium-indium-phosphide",
        "aluminium-gallium-arsenide"
      })
  void meetsEveryWantedGapToOneMillielectronvolt(String name) {
    Tuning tuning = material(name).tuning().orElseThrow();
    for (double gapEv = tuning.lowEv(); gapEv <= tuning.highEv(); gapEv += 0.0331) {
      assertThat(Bandgap.of(at(name, gapEv)).orElseThrow())
          .as("gap of %s", name)
          .isCloseTo(gapEv, within(1e-3));
    }
  }

  // The measured tables of the anchors, as the library itself holds them after cleaning.
  @ParameterizedTest
  @CsvSource({
    "lead-halide-perovskite, methylammonium-lead-iodide",
    "lead-halide-perovskite.caesium, caesium-lead-iodide",
    "gallium-indium-phosphide, gallium-indium-phosphide.disordered"
  })
  void reproducesTheMeasuredTableAtItsGap(String name, String anchor) {
    TableMaterial measured = (TableMaterial) material(anchor);
    OpticalTable moved = at(name, measured.bandgapEv().orElseThrow());
    for (double nm = 300; nm <= 1200; nm += 7) {
      assertThat(moved.nAt(nm))
          .as("n at %s nm", nm)
          .isCloseTo(measured.table().nAt(nm), within(0.02));
      assertThat(moved.kAt(nm))
          .as("k at %s nm", nm)
          .isCloseTo(measured.table().kAt(nm), within(0.012));
    }
  }

  // D. E. Aspnes et al., J. Appl. Phys. 60, 754 (1986): single values of the published tables, away
  // from the direct edge, which the table's step of 0.1 eV does not resolve.
  @ParameterizedTest
  @CsvSource({
    "0.000, 399.9, 4.374, 2.148",
    "0.315, 413.3, 4.781, 1.012",
    "0.315, 495.9, 4.032, 0.305",
    "0.315, 826.6, 3.404, 0",
    "0.804, 826.6, 3.124, 0"
  })
  void reproducesTheMeasuredCompositions(double fraction, double nm, double n, double k) {
    double gapEv = 1.424 + 1.155 * fraction + 0.37 * fraction * fraction;
    OpticalTable alloy = at("aluminium-gallium-arsenide", gapEv);
    assertThat(alloy.nAt(nm)).isCloseTo(n, within(0.03));
    assertThat(alloy.kAt(nm)).isCloseTo(k, within(0.03));
  }

  // A law: nothing a search moves through may jump. The step is 0.1 meV, far below every width.
  @ParameterizedTest
  @ValueSource(
      strings = {
        "lead-halide-perovskite",
        "lead-halide-perovskite.caesium",
        "gallium-indium-phosphide",
        "aluminium-gallium-arsenide"
      })
  void movesWithoutJumps(String name) {
    double[] nm = IntStream.rangeClosed(0, 180).mapToDouble(i -> 300 + 5.0 * i).toArray();
    Material.Filler filler = material(name).on(nm);
    Tuning tuning = material(name).tuning().orElseThrow();
    double[] n = new double[nm.length];
    double[] k = new double[nm.length];
    double[] nextN = new double[nm.length];
    double[] nextK = new double[nm.length];
    filler.fill(tuning.lowEv(), n, k);
    double largest = 0;
    for (double gapEv = tuning.lowEv() + 1e-4; gapEv < tuning.highEv(); gapEv += 1e-4) {
      filler.fill(gapEv, nextN, nextK);
      for (int w = 0; w < nm.length; w++) {
        largest = Math.max(largest, Math.abs(nextN[w] - n[w]));
        largest = Math.max(largest, Math.abs(nextK[w] - k[w]));
      }
      System.arraycopy(nextN, 0, n, 0, n.length);
      System.arraycopy(nextK, 0, k, 0, k.length);
    }
    assertThat(largest).isLessThan(0.02);
  }

  @Test
  void absorbsNothingBelowTheGapBeyondItsUrbachTail() {
    OpticalTable table = at("lead-halide-perovskite", 1.68);
    double oneUrbach = table.alphaPerCmAt(1239.842 / 1.55) / table.alphaPerCmAt(1239.842 / 1.535);
    assertThat(Math.log(oneUrbach)).isCloseTo(1, within(0.1));
    assertThat(table.alphaPerCmAt(1239.842 / 1.38)).isLessThan(1);
    assertThat(table.kAt(1200)).isLessThan(1e-9);
  }

  // The part of a bin above the gap, by hand: bins of 10 nm, gap at 803 nm, bin 795 to 805 nm.
  @Test
  void weighsTheBinThatHoldsTheStepByItsPartAboveTheGap() {
    double[] nm = {780, 790, 800, 810};
    double[] n = new double[4];
    double[] k = new double[4];
    material("ideal-absorber").on(nm).fill(1239.8419843 / 803, n, k);
    double full = 1e5 * 800e-7 / (4 * Math.PI);
    assertThat(k[2]).isCloseTo(0.8 * full, within(1e-6));
    assertThat(k[1]).isGreaterThan(0.6);
    assertThat(k[3]).isZero();
    assertThat(n).containsOnly(2.5);
  }

  @Test
  void saysWhereItsGapIsAnEstimate() {
    Material perovskite = material("lead-halide-perovskite");
    assertThat(perovskite.findingsAt(1.3)).hasSize(1);
    assertThat(perovskite.findingsAt(1.68)).isEmpty();
    assertThat(material("aluminium-gallium-arsenide").findingsAt(2.1)).hasSize(1);
  }
}
