package evensun.material.table;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import evensun.light.Constants;
import evensun.material.Material;
import evensun.material.MaterialLibrary;
import evensun.material.dispersion.Dispersion;
import evensun.material.dispersion.Lorentz;
import evensun.material.dispersion.TaucLorentz;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class KramersKronigTest {

  private static OpticalTable table(Dispersion dispersion, double shiftOfN) {
    int size = 400;
    double[] nm = new double[size];
    double[] n = new double[size];
    double[] k = new double[size];
    double[] index = new double[2];
    for (int i = 0; i < size; i++) {
      nm[i] = 280 + 2.5 * i;
      dispersion.index(Constants.HC_EV_NM / nm[i], index);
      k[i] = index[1];
      dispersion.index(Constants.HC_EV_NM / nm[i] - shiftOfN, index);
      n[i] = index[0];
    }
    return OpticalTable.of(nm, n, k);
  }

  private static final Dispersion AMORPHOUS =
      new Dispersion(0.5, List.of(new TaucLorentz(3.55, 215, 2.3, 1.68)));
  private static final Dispersion BAND =
      new Dispersion(2.2, List.of(new Lorentz(0.3, 2.4, 0.2), new Lorentz(1, 6, 0.5)));

  // Closed form: both models obey the relation exactly, on an axis that ends inside them.
  @Test
  void findsNothingWrongWithModelsThatObeyTheRelation() {
    assertThat(KramersKronig.of(table(AMORPHOUS, 0)).orElseThrow().rms()).isLessThan(0.01);
    assertThat(KramersKronig.of(table(BAND, 0)).orElseThrow().rms()).isLessThan(0.01);
  }

  // n moved against k by 0.2 eV: the band at 2.4 eV (517 nm) contradicts itself there.
  @Test
  void findsNThatWasMovedAgainstK() {
    KramersKronig.Residual residual = KramersKronig.of(table(BAND, 0.2)).orElseThrow();
    assertThat(residual.rms()).isGreaterThan(0.05);
    assertThat(residual.atNm()).isBetween(430.0, 620.0);
  }

  // The stated tolerance of the tunable absorbers, by this numerical transform of their own k.
  @ParameterizedTest
  @CsvSource({
    "lead-halide-perovskite, 1.30, 0.02",
    "lead-halide-perovskite, 1.62, 0.02",
    "lead-halide-perovskite, 1.80, 0.02",
    "lead-halide-perovskite, 2.20, 0.02",
    "lead-halide-perovskite.caesium, 1.72, 0.02",
    "lead-halide-perovskite.caesium, 2.00, 0.02",
    "gallium-indium-phosphide, 1.80, 0.04",
    "gallium-indium-phosphide, 1.95, 0.04",
    "aluminium-gallium-arsenide, 1.60, 0.06",
    "aluminium-gallium-arsenide, 1.90, 0.06"
  })
  void tunableAbsorbersKeepNAndKTogether(String name, double gapEv, double tolerance) {
    double[] nm = new double[1100];
    for (int i = 0; i < nm.length; i++) {
      nm[i] = 285 + i;
    }
    double[] n = new double[nm.length];
    double[] k = new double[nm.length];
    Material material = MaterialLibrary.builtIn().find(name).orElseThrow();
    material.on(nm).fill(gapEv, n, k);
    assertThat(KramersKronig.of(OpticalTable.of(nm, n, k)).orElseThrow().rms())
        .isLessThan(tolerance);
  }

  // Closed form: the transform of a straight-sided hill, against itself far away: (2/π) ∫ x ε₂ dx
  // over −E² at high energy, for a triangle from 1 to 3 eV of height 1 (area 1, mean 2).
  @Test
  void fallsOffAsTheSumRuleHasIt() {
    double[] node = {1, 2, 3};
    double[] loss = {0, 1, 0};
    double ev = 200;
    double expected = 1 - 2 / Math.PI * 2 / (ev * ev);
    assertThat(KramersKronig.transform(node, loss, ev)).isCloseTo(expected, within(1e-7));
  }
}
