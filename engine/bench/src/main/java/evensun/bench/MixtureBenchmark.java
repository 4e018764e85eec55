package evensun.bench;

import evensun.effectivemedium.kernel.SetBruggeman;
import evensun.material.Material;
import evensun.material.MaterialLibrary;
import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.State;

/** What a search pays for moving the fractions of a mixture, at 181 wavelengths. */
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MICROSECONDS)
@State(Scope.Thread)
public class MixtureBenchmark {

  private static final String[] PARTS = {"lead-halide-perovskite", "titanium-dioxide", "air"};

  private final SetBruggeman rule = new SetBruggeman();
  private final double[][] partRe = new double[PARTS.length][ThinFilmBenchmark.WAVELENGTHS];
  private final double[][] partIm = new double[PARTS.length][ThinFilmBenchmark.WAVELENGTHS];
  private final double[] fraction = new double[PARTS.length];
  private final double[] re = new double[ThinFilmBenchmark.WAVELENGTHS];
  private final double[] im = new double[ThinFilmBenchmark.WAVELENGTHS];
  private int turn;

  /** A scaffold of titanium dioxide filled with perovskite, with pores left. */
  public MixtureBenchmark() {
    for (int p = 0; p < PARTS.length; p++) {
      Material part = MaterialLibrary.builtIn().find(PARTS[p]).orElseThrow();
      part.on(StartBenchmark.gridNm()).fill(1.62, partRe[p], partIm[p]);
      for (int w = 0; w < re.length; w++) {
        double n = partRe[p][w];
        double k = partIm[p][w];
        partRe[p][w] = n * n - k * k;
        partIm[p][w] = 2 * n * k;
      }
    }
  }

  /** Three components by Bruggeman's rule for spheres, other fractions each time. */
  @Benchmark
  public double[] threeComponents() {
    turn = (turn + 1) % 89;
    fraction[0] = 0.3 + 0.3 * turn / 89;
    fraction[1] = 0.3;
    fraction[2] = 0.7 - fraction[0];
    rule.mix(partRe, partIm, fraction, 2, re, im);
    return im;
  }
}
