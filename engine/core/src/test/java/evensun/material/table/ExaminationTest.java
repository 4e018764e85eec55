package evensun.material.table;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import evensun.light.Spectra;
import evensun.light.Spectrum;
import evensun.material.Material;
import evensun.material.MaterialLibrary;
import evensun.spi.Finding;
import java.util.List;
import java.util.function.DoubleUnaryOperator;
import org.junit.jupiter.api.Test;

class ExaminationTest {

  private static final Spectrum LIGHT = Spectra.named("AM1.5G");

  /** A clean absorber of 1.68 eV from the library, with something done to its k or n. */
  private static OpticalTable absorber(DoubleUnaryOperator moreK, DoubleUnaryOperator moreN) {
    double[] nm = new double[460];
    for (int i = 0; i < nm.length; i++) {
      nm[i] = 282 + 2.0 * i;
    }
    double[] n = new double[nm.length];
    double[] k = new double[nm.length];
    Material material = MaterialLibrary.builtIn().find("lead-halide-perovskite").orElseThrow();
    material.on(nm).fill(1.68, n, k);
    for (int i = 0; i < nm.length; i++) {
      k[i] += moreK.applyAsDouble(nm[i]);
      n[i] += moreN.applyAsDouble(nm[i]);
    }
    return OpticalTable.of(nm, n, k);
  }

  private static List<String> codes(OpticalTable table) {
    return Examination.content("film", table, LIGHT, 300, 1200).stream()
        .map(Finding::code)
        .toList();
  }

  private static List<String> formCodes(String text) {
    return Examination.form("film", OpticalTableReader.read(text, TableHints.NONE), LIGHT).stream()
        .map(Finding::code)
        .toList();
  }

  @Test
  void findsNothingInACleanTable() {
    assertThat(codes(absorber(nm -> 0, nm -> 0))).isEmpty();
  }

  // Law: outside absorption n falls with the wavelength (Kramers-Kronig, all oscillators of
  // positive
  // strength); a line that rises by 0.18 over 300 to 1200 nm cannot be.
  @Test
  void findsAnIndexThatRisesWhereNothingAbsorbs() {
    double[] nm = new double[91];
    double[] rising = new double[nm.length];
    double[] falling = new double[nm.length];
    double[] clear = new double[nm.length];
    for (int i = 0; i < nm.length; i++) {
      nm[i] = 300 + 10 * i;
      rising[i] = 1.5 + 2e-4 * nm[i];
      falling[i] = 1.5 + 6000 / (nm[i] * nm[i]);
    }
    assertThat(codes(OpticalTable.of(nm, rising, clear))).containsExactly("table-kramers-kronig");
    assertThat(codes(OpticalTable.of(nm, falling, clear))).isEmpty();
  }

  // 4.1328 and 1.0332 eV, four digits, are 300.0003 and 1200.002 nm: hc/q = 1239.841984 eV nm.
  @Test
  void takesARoundedPhotonEnergyForTheEndOfTheGrid() {
    double[] nm = {1239.841984 / 4.1328, 500, 700, 1239.841984 / 1.0332};
    OpticalTable table = OpticalTable.of(nm, new double[] {2, 2, 2, 2}, new double[4]);
    assertThat(table.covers(300, 1200)).isTrue();
    assertThat(table.covers(299.8, 1200)).isFalse();
    assertThat(table.covers(300, 1200.3)).isFalse();
    assertThat(codes(table)).isEmpty();
  }

  @Test
  void saysOnceWhatManyLinesInARowHaveWrong() {
    String text = "wavelength_nm,n,k\n300,2,-1\n310,2,-1\n320,2,-1\n330,2,0\n340,2,-1\n";
    List<Finding> findings =
        Examination.form("film", OpticalTableReader.read(text, TableHints.NONE), LIGHT);
    assertThat(findings).hasSize(2);
    assertThat(findings.get(0).message())
        .startsWith("line 2")
        .contains("2 more up to 320 nm, line 4");
    assertThat(findings.get(1).message()).startsWith("line 6").doesNotContain("more");
  }

  // By hand: k = 0.02 in 500 nm absorbs 1 − exp(−4π·0.02·500/λ), near 0.15 at 800 nm; the light
  // from 0.10 eV below the gap (785 nm) to the end of the grid carries about 20 mA cm⁻².
  @Test
  void findsAFloorBelowTheGapAndWhatItIsWorth() {
    OpticalTable table = absorber(nm -> 0.02, nm -> 0);
    Finding floor =
        Examination.content("film", table, LIGHT, 300, 1200).stream()
            .filter(finding -> finding.code().equals("table-floor-below-gap"))
            .findFirst()
            .orElseThrow();
    String worth = floor.message().replaceAll(".* books ([0-9.]+) mA.*", "$1");
    double expected = 0;
    for (int nm = 785; nm < 1200; nm++) {
      expected +=
          LIGHT.photonCurrentMaPerCm2(nm, nm + 1)
              * (1 - Math.exp(-4 * Math.PI * 0.02 * 500 / (nm + 0.5)));
    }
    assertThat(Double.parseDouble(worth)).isCloseTo(expected, within(0.02 * expected));
    assertThat(floor.message()).contains("stays at 0.020 and more up to 1200 nm");
  }

  // An edge that fades out, however slowly, is no floor: k falls tenfold every 60 nm.
  @Test
  void findsNoFloorInATailThatVanishes() {
    assertThat(codes(absorber(nm -> nm > 700 ? 0.1 * Math.pow(10, (700 - nm) / 60) : 0, nm -> 0)))
        .doesNotContain("table-floor-below-gap");
  }

  @Test
  void findsNAndKThatDoNotBelongTogether() {
    assertThat(codes(absorber(nm -> 0, nm -> 0.3 * Math.sin(nm / 40))))
        .contains("table-kramers-kronig");
  }

  @Test
  void findsAJump() {
    assertThat(codes(absorber(nm -> 0, nm -> nm > 900 ? 0.25 : 0))).contains("table-jump");
  }

  @Test
  void findsPointsTooFarApart() {
    OpticalTable coarse =
        OpticalTable.of(
            new double[] {300, 400, 500, 600, 700, 800, 1200},
            new double[] {2, 2.1, 2.6, 2.2, 2.1, 2.05, 2},
            new double[7]);
    assertThat(codes(coarse)).contains("table-coarse");
  }

  @Test
  void findsARangeThatIsTooShortAndALowIndex() {
    OpticalTable shortTable =
        OpticalTable.of(new double[] {400, 800}, new double[] {0.5, 0.6}, new double[] {0.1, 0.1});
    assertThat(codes(shortTable)).contains("table-range", "table-low-index");
  }

  @Test
  void findsImpossibleDoubledAndUnsortedPoints() {
    assertThat(
            formCodes(
                "wavelength_nm,n,k\n300,2,0\n300,2,-1\n310,2,0\n280,2,nan\n330,2,0\n400,0,0\n"))
        .containsExactly(
            "table-impossible-value",
            "table-doubled-wavelength",
            "table-impossible-value",
            "table-unsorted",
            "table-impossible-value");
    assertThat(formCodes("wavelength_nm,n,k\n300,2,0\n400,2,0\n")).isEmpty();
  }

  // What is taken off is the floor that was added and what the edge itself still absorbs 0.10 eV
  // below the gap; an Urbach tail of 15 meV remains.
  @Test
  void cleaningTakesOffTheFloorAndKeepsTheGap() {
    OpticalTable dirty = absorber(nm -> 0.02, nm -> 0);
    UrbachTail.Cleaned cleaned = UrbachTail.clean(dirty, UrbachTail.DEFAULT_EV).orElseThrow();
    double own =
        absorber(nm -> 0, nm -> 0).kAt(1239.8419843 / (Bandgap.of(dirty).orElseThrow() - 0.1));
    assertThat(cleaned.floor()).isCloseTo(0.02 + own, within(1e-6));
    assertThat(Bandgap.of(cleaned.table()).orElseThrow()).isCloseTo(1.68, within(3e-3));
    assertThat(cleaned.table().kAt(950)).isLessThan(1e-6);
    assertThat(cleaned.table().kAt(600)).isCloseTo(dirty.kAt(600), within(1e-12));
    assertThat(codes(cleaned.table())).isEmpty();
  }

  // Definition: a step smeared over a few meV has its gap at the step.
  @Test
  void theGapOfASmearedStepIsTheStep() {
    double gap =
        Bandgap.of(ev -> 3e4 / (1 + Math.exp(-(ev - 1.4321) / 0.008)), 1.0, 2.5).orElseThrow();
    assertThat(gap).isCloseTo(1.4321, within(2e-4));
    assertThat(Bandgap.of(ev -> 1e3 * ev, 1.0, 2.5)).isEmpty();
  }
}
