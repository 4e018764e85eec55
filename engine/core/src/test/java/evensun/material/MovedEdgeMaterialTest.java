package evensun.material;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import evensun.material.table.Bandgap;
import evensun.material.table.OpticalTable;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class MovedEdgeMaterialTest {

  private static final double[] FINE_NM =
      IntStream.rangeClosed(0, 3 * 920).mapToDouble(i -> 280 + i / 3.0).toArray();

  private final Material perovskite =
      MaterialLibrary.builtIn().find("lead-halide-perovskite").orElseThrow();

  private OpticalTable at(double gapEv) {
    double[] n = new double[FINE_NM.length];
    double[] k = new double[FINE_NM.length];
    perovskite.on(FINE_NM).fill(gapEv, n, k);
    return OpticalTable.of(FINE_NM, n, k);
  }

  // Definition of the gap: steepest rise of the absorption coefficient.
  @ParameterizedTest
  @ValueSource(doubles = {1.2, 1.333, 1.5, 1.55, 1.62, 1.68, 1.755, 1.9, 2.1, 2.3})
  void meetsTheWantedGapToOneMillielectronvolt(double gapEv) {
    assertThat(Bandgap.of(at(gapEv)).orElseThrow()).isCloseTo(gapEv, within(1e-3));
  }

  @Test
  void reproducesTheMeasuredTableAtItsGap() {
    TableMaterial iodide =
        (TableMaterial) MaterialLibrary.builtIn().find("methylammonium-lead-iodide").orElseThrow();
    OpticalTable moved = at(iodide.bandgapEv().orElseThrow());
    for (double nm = 300; nm <= 1200; nm += 7) {
      assertThat(moved.nAt(nm))
          .as("n at %s nm", nm)
          .isCloseTo(iodide.table().nAt(nm), within(0.01));
      assertThat(moved.kAt(nm))
          .as("k at %s nm", nm)
          .isCloseTo(iodide.table().kAt(nm), within(0.01));
    }
  }
}
