package evensun.testkit;

import com.sun.management.ThreadMXBean;
import evensun.spi.Design;
import evensun.spi.Evaluator;
import evensun.spi.PreparedSolver;
import evensun.spi.Response;
import evensun.spi.Samples;
import java.lang.management.ManagementFactory;
import java.util.List;
import java.util.Locale;

/** Measures speed and allocation; informs, judges nothing. */
final class Pace implements Law {

  private static final long WARM_UP_NANOS = 300_000_000;
  private static final long MEASURED_NANOS = 500_000_000;
  private static final int WAVELENGTHS = 181;

  @Override
  public String name() {
    return "pace";
  }

  @Override
  public String promise() {
    return "evaluations are quick and allocate nothing";
  }

  @Override
  public LawReport check(Subject subject) {
    StackCase stack = yardstick();
    try (PreparedSolver prepared = subject.prepare(stack);
        Evaluator evaluator = prepared.newEvaluator()) {
      Response response = subject.spectra(prepared, stack);
      List<Design> designs = RepeatLaws.variants(stack);
      run(evaluator, designs, response, WARM_UP_NANOS);
      long bytes = allocated();
      long count = run(evaluator, designs, response, MEASURED_NANOS);
      double each = (allocated() - bytes) / (double) count;
      return LawReport.information(
          this,
          String.format(
              Locale.ROOT,
              "%.1f µs and %.0f bytes for an evaluation of %d layers at %d wavelengths",
              MEASURED_NANOS / 1e3 / count,
              each,
              stack.layerCount(),
              stack.wavelengthCount()));
    } catch (RuntimeException e) {
      return LawReport.failed(this, 1, "threw " + e, stack);
    }
  }

  /** Number of evaluations in at least so many nanoseconds. */
  private static long run(
      Evaluator evaluator, List<Design> designs, Response response, long nanos) {
    long start = System.nanoTime();
    long count = 0;
    while (System.nanoTime() - start < nanos) {
      for (Design design : designs) {
        evaluator.evaluate(design, response);
        count++;
      }
    }
    return count;
  }

  private static long allocated() {
    return ManagementFactory.getThreadMXBean() instanceof ThreadMXBean bean
        ? bean.getThreadAllocatedBytes(Thread.currentThread().getId())
        : 0;
  }

  private static StackCase yardstick() {
    double[] wavelengthNm = new double[WAVELENGTHS];
    for (int w = 0; w < WAVELENGTHS; w++) {
      wavelengthNm[w] = 300 + 5 * w;
    }
    StackCase plain = Cases.plain().get(Cases.plain().size() - 1);
    return plain.withWavelengthNm(Samples.of(wavelengthNm));
  }
}
