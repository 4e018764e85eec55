package evensun.material;

import static org.assertj.core.api.Assertions.assertThat;

import com.sun.management.ThreadMXBean;
import java.lang.management.ManagementFactory;
import java.util.stream.IntStream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class MaterialAllocationTest {

  private static final double[] GRID_NM =
      IntStream.rangeClosed(0, 180).mapToDouble(i -> 300 + 5.0 * i).toArray();

  // A law of the contract between search and materials; witness: the JVM's own count of bytes.
  @ParameterizedTest
  @ValueSource(
      strings = {
        "lead-halide-perovskite",
        "gallium-indium-phosphide",
        "aluminium-gallium-arsenide",
        "ideal-absorber"
      })
  void changingABandgapAllocatesNothing(String name) {
    Material material = MaterialLibrary.builtIn().find(name).orElseThrow();
    Material.Filler filler = material.on(GRID_NM);
    Tuning tuning = material.tuning().orElseThrow();
    double[] n = new double[GRID_NM.length];
    double[] k = new double[GRID_NM.length];
    double sum = 0;
    for (int i = 0; i < 20_000; i++) {
      filler.fill(gap(tuning, i), n, k);
      sum += n[i % n.length];
    }
    ThreadMXBean threads = (ThreadMXBean) ManagementFactory.getThreadMXBean();
    long fewest = Long.MAX_VALUE;
    for (int round = 0; round < 20; round++) {
      long before = threads.getCurrentThreadAllocatedBytes();
      for (int i = 0; i < 200; i++) {
        filler.fill(gap(tuning, i), n, k);
        sum += n[i % n.length];
      }
      fewest = Math.min(fewest, threads.getCurrentThreadAllocatedBytes() - before);
    }
    assertThat(sum).isFinite();
    // What a fill allocates shows in every round; what the JVM allocates now and then does not.
    assertThat(fewest).isZero();
  }

  private static double gap(Tuning tuning, int i) {
    return tuning.lowEv() + (tuning.highEv() - tuning.lowEv()) * (i % 97) / 97;
  }
}
