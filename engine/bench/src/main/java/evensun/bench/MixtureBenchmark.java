package evensun.bench;

import evensun.effectivemedium.kernel.Permittivity;
import evensun.effectivemedium.kernel.PowerMeans;
import evensun.effectivemedium.kernel.SetBruggeman;
import evensun.material.Material;
import evensun.material.MaterialLibrary;
import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Param;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;

/** What a search pays for moving the fractions of a mixture, at 181 wavelengths. */
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MICROSECONDS)
@State(Scope.Thread)
public class MixtureBenchmark {

  private static final int COUNT = 3;

  /** What fills a scaffold of titanium dioxide with pores left: an absorber, or a metal. */
  @Param({"lead-halide-perovskite", "silver"})
  public String material = "lead-halide-perovskite";

  private final double[] fraction = new double[COUNT];
  private final double[] re = new double[ThinFilmBenchmark.WAVELENGTHS];
  private final double[] im = new double[ThinFilmBenchmark.WAVELENGTHS];
  private final double[][] n = new double[COUNT][re.length];
  private final double[][] k = new double[COUNT][re.length];
  private final double[][] partRe = new double[COUNT][re.length];
  private final double[][] partIm = new double[COUNT][re.length];
  private final SetBruggeman rule = new SetBruggeman(COUNT, re.length);
  private int turn;

  /** Reads the materials. */
  @Setup
  public void prepare() {
    String[] parts = {material, "titanium-dioxide", "air"};
    for (int p = 0; p < COUNT; p++) {
      Material part = MaterialLibrary.builtIn().find(parts[p]).orElseThrow();
      part.on(StartBenchmark.gridNm()).fill(1.62, n[p], k[p]);
      Permittivity.ofIndex(n[p], k[p], partRe[p], partIm[p]);
    }
  }

  /** Three components by Bruggeman's rule for spheres, other fractions each time. */
  @Benchmark
  public double[] threeComponents() {
    turn = (turn + 1) % 89;
    fraction[0] = 0.3 + 0.3 * turn / 89;
    fraction[1] = 0.3;
    fraction[2] = 0.7 - fraction[0];
    PowerMeans.mean(n, k, fraction, re, im);
    Permittivity.ofIndex(re, im, re, im);
    rule.mix(partRe, partIm, fraction, 2, re, im);
    return im;
  }
}
