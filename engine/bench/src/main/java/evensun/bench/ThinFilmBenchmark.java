package evensun.bench;

import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Threads;

/** Evaluations of the yardstick: 12 layers, 181 wavelengths. */
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MICROSECONDS)
@State(Scope.Thread)
public class ThinFilmBenchmark {

  static final int LAYERS = 12;
  static final int WAVELENGTHS = 181;

  private final Yardstick normal = new Yardstick(LAYERS, WAVELENGTHS, -1, 0);
  private final Yardstick sums = new Yardstick(LAYERS, WAVELENGTHS, -1, 0).sumsOnly();
  private final Yardstick incoherent = new Yardstick(LAYERS, WAVELENGTHS, 6, 0);
  private final Yardstick oblique = new Yardstick(LAYERS, WAVELENGTHS, -1, 60);

  /** Value: all spectra and two sums, along the normal. */
  @Benchmark
  public double[] evaluation() {
    return normal.evaluate();
  }

  /** The same in two threads at once; ideal is the time of one. */
  @Benchmark
  @Threads(2)
  public double[] evaluationInTwoThreads() {
    return normal.evaluate();
  }

  /** Two sums alone, as a search asks. */
  @Benchmark
  public double[] sumsOnly() {
    return sums.evaluate();
  }

  /** Value and gradient of both sums by all thicknesses. */
  @Benchmark
  public double[] gradient() {
    return normal.differentiate();
  }

  /** Value with one material changed each time, as a gap that varies does. */
  @Benchmark
  public double[] materialChanges() {
    return normal.evaluateNewMaterial();
  }

  /** Value with one incoherent layer in the middle. */
  @Benchmark
  public double[] oneIncoherentLayer() {
    return incoherent.evaluate();
  }

  /** Gradient with one incoherent layer in the middle. */
  @Benchmark
  public double[] oneIncoherentLayerGradient() {
    return incoherent.differentiate();
  }

  /** Value at 60°, unpolarised. */
  @Benchmark
  public double[] obliqueUnpolarised() {
    return oblique.evaluate();
  }
}
