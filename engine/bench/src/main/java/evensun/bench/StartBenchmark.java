package evensun.bench;

import evensun.material.Material;
import evensun.material.MaterialLibrary;
import java.util.List;
import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.State;

/** What a cold start pays, once in a fresh virtual machine each time. */
@BenchmarkMode(Mode.SingleShotTime)
@OutputTimeUnit(TimeUnit.MICROSECONDS)
@State(Scope.Thread)
public class StartBenchmark {

  private static final List<String> MATERIALS =
      List.of(
          "magnesium-fluoride",
          "indium-tin-oxide",
          "tin-oxide",
          "fullerene",
          "lead-halide-perovskite",
          "nickel-oxide",
          "indium-zinc-oxide",
          "hydrogenated-amorphous-silicon.n",
          "hydrogenated-amorphous-silicon.intrinsic",
          "crystalline-silicon",
          "hydrogenated-amorphous-silicon.p",
          "silver");

  private final double[] gridNm = gridNm();
  private final double[] n = new double[gridNm.length];
  private final double[] k = new double[gridNm.length];

  static double[] gridNm() {
    double[] nm = new double[ThinFilmBenchmark.WAVELENGTHS];
    for (int w = 0; w < nm.length; w++) {
      nm[w] = 300 + 5 * w;
    }
    return nm;
  }

  /** Twelve materials of a heterojunction tandem read and laid on 181 wavelengths. */
  @Benchmark
  public double twelveMaterials() {
    double sum = 0;
    for (String name : MATERIALS) {
      Material material = MaterialLibrary.builtIn().find(name).orElseThrow();
      material.on(gridNm).fill(material.bandgapEv().orElse(0), n, k);
      sum += n[0] + k[0];
    }
    return sum;
  }
}
