package evensun.material;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import evensun.light.Spectra;
import evensun.light.Spectrum;
import evensun.material.table.Bandgap;
import evensun.material.table.OpticalTable;
import evensun.spi.Finding;
import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.util.Arrays;
import java.util.DoubleSummaryStatistics;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;
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
    "lead-halide-perovskite, methylammonium-lead-bromide",
    "lead-halide-perovskite.caesium, methylammonium-lead-iodide",
    "lead-halide-perovskite.caesium, methylammonium-lead-bromide",
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

  private static Stream<double[]> measuredCompositions() throws IOException {
    try (InputStream in =
        TunableMaterialTest.class.getResourceAsStream("aluminium-gallium-arsenide.csv")) {
      return new String(in.readAllBytes(), StandardCharsets.UTF_8)
              .lines()
              .filter(line -> Character.isDigit(line.charAt(0)))
              .map(
                  line -> Arrays.stream(line.split(",")).mapToDouble(Double::parseDouble).toArray())
              .toList()
              .stream();
    }
  }

  // D. E. Aspnes et al., J. Appl. Phys. 60, 754 (1986), all nine compositions; see the file.
  @ParameterizedTest
  @MethodSource("measuredCompositions")
  void reproducesEveryMeasuredComposition(double[] measured) {
    double fraction = measured[0];
    double gapEv = 1.424 + 1.155 * fraction + 0.37 * fraction * fraction;
    double[] n = new double[1];
    double[] k = new double[1];
    double[] nm = {measured[1]};
    material("aluminium-gallium-arsenide").on(nm).fill(gapEv, n, k);
    assertThat(n[0]).as("n at x = %s, %s nm", fraction, nm[0]).isCloseTo(measured[2], within(0.03));
    assertThat(k[0]).as("k at x = %s, %s nm", fraction, nm[0]).isCloseTo(measured[3], within(0.03));
  }

  @Test
  void isHeldAgainstNineCompositions() throws IOException {
    assertThat(measuredCompositions().mapToDouble(row -> row[0]).distinct()).hasSize(9);
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

  // By hand: bins of 10 nm, gap at 803 nm, bin 795 to 805 nm; with as many photons per nm on both
  // sides 0.8 of them lie above the gap, and one pass of 500 nm absorbs 0.8 (1 − exp(−5)) of all.
  @Test
  void weighsTheBinThatHoldsTheStepByItsPhotonsAboveTheGap() {
    double[] nm = {780, 790, 800, 810};
    double[] perNm = {1.0 / 700, 1.0 / 900};
    Spectrum even = Spectrum.of("even", "invented", new double[] {700, 900}, perNm);
    double[] n = new double[4];
    double[] k = new double[4];
    material("ideal-absorber").on(nm, even).fill(1239.8419843 / 803, 500, n, k);
    double absorbed = 1 - Math.exp(-4 * Math.PI * k[2] * 500 / 800);
    assertThat(absorbed).isCloseTo(0.8 * (1 - Math.exp(-5)), within(1e-3));
    assertThat(k[1]).isCloseTo(1e5 * 790e-7 / (4 * Math.PI), within(1e-9));
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

  // Independent calculation from n and k alone: what 500 nm take in one pass of AM1.5G, every 10
  // meV
  // of each range, against the least and most that the finding promises.
  @Test
  void saysWhatItsWeakAnchorIsWorth() {
    Pattern promised = Pattern.compile("take ([0-9.]+) to ([0-9.]+) mA");
    Material caesium = material("lead-halide-perovskite.caesium");
    Map<String, DoubleSummaryStatistics> worth = new HashMap<>();
    for (int milliEv = 1660; milliEv < 2150; milliEv += 2) {
      double gapEv = milliEv / 1000.0;
      List<Finding> findings = caesium.findingsAt(gapEv);
      assertThat(findings).extracting(Finding::code).containsExactly("anchor-weak");
      worth
          .computeIfAbsent(findings.get(0).message(), message -> new DoubleSummaryStatistics())
          .accept(
              onePass("lead-halide-perovskite", gapEv) - onePass(caesium.record().name(), gapEv));
    }
    assertThat(worth).hasSize(3);
    worth.forEach(
        (message, difference) -> {
          Matcher range = promised.matcher(message);
          assertThat(range.find()).isTrue();
          assertThat(difference.getMin())
              .isCloseTo(Double.parseDouble(range.group(1)), within(0.15));
          assertThat(difference.getMax())
              .isCloseTo(Double.parseDouble(range.group(2)), within(0.15));
        });
    assertThat(caesium.findingsAt(1.62)).isEmpty();
    assertThat(caesium.findingsAt(2.3)).isEmpty();
  }

  /** What 500 nm absorb without reflection, mA cm⁻². */
  private static double onePass(String name, double gapEv) {
    Spectrum light = Spectra.named("AM1.5G");
    OpticalTable table = at(name, gapEv);
    double sum = 0;
    for (int nm = 300; nm < 900; nm++) {
      double absorbed = 1 - Math.exp(-table.alphaPerCmAt(nm + 0.5) * 500e-7);
      sum += absorbed * light.photonCurrentMaPerCm2(nm, nm + 1);
    }
    return sum;
  }
}
