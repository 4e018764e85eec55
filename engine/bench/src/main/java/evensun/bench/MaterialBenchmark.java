package evensun.bench;

import evensun.material.Material;
import evensun.material.MaterialLibrary;
import evensun.material.Tuning;
import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Param;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;

/** What a search pays for moving the bandgap of one material, at 181 wavelengths. */
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MICROSECONDS)
@State(Scope.Thread)
public class MaterialBenchmark {

  /** A tunable material of the library. */
  @Param({
    "lead-halide-perovskite",
    "gallium-indium-phosphide",
    "aluminium-gallium-arsenide",
    "ideal-absorber"
  })
  public String material;

  private final double[] n = new double[ThinFilmBenchmark.WAVELENGTHS];
  private final double[] k = new double[ThinFilmBenchmark.WAVELENGTHS];
  private Material.Filler filler;
  private Tuning tuning;
  private int turn;

  /** Reads the material. */
  @Setup
  public void prepare() {
    Material found = MaterialLibrary.builtIn().find(material).orElseThrow();
    filler = found.on(StartBenchmark.gridNm());
    tuning = found.tuning().orElseThrow();
  }

  /** Another gap each time. */
  @Benchmark
  public double[] bandgap() {
    turn = (turn + 1) % 97;
    filler.fill(tuning.lowEv() + (tuning.highEv() - tuning.lowEv()) * turn / 97, n, k);
    return k;
  }
}
