package evensun.bench;

import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Param;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;

/** How the cost of an evaluation grows with layers and wavelengths. */
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MICROSECONDS)
@State(Scope.Thread)
public class GrowthBenchmark {

  /** Layers by wavelengths. */
  @Param({"2x181", "5x181", "12x181", "30x181", "100x181", "12x20", "12x60", "12x600", "12x2000"})
  public String size;

  private Yardstick yardstick;

  /** Makes the stack of the size wanted. */
  @Setup
  public void prepare() {
    int by = size.indexOf('x');
    int layers = Integer.parseInt(size.substring(0, by));
    int wavelengths = Integer.parseInt(size.substring(by + 1));
    yardstick = new Yardstick(layers, wavelengths, -1, 0);
  }

  /** Value: all spectra and two sums. */
  @Benchmark
  public double[] evaluation() {
    return yardstick.evaluate();
  }
}
