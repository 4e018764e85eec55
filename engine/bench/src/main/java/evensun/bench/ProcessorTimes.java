package evensun.bench;

import java.lang.management.ManagementFactory;
import java.lang.management.ThreadMXBean;
import java.util.LinkedHashMap;
import java.util.Locale;
import java.util.Map;
import java.util.function.Supplier;

/**
 * Least processor time of an evaluation, in one virtual machine: for machines that others keep
 * busy, where time on the clock tells nothing. Two threads at once show whether they hinder each
 * other: each then needs more processor time than one alone.
 */
final class ProcessorTimes {

  private static final ThreadMXBean THREADS = ManagementFactory.getThreadMXBean();
  private static final long WARM_NS = 40_000_000_000L;
  private static final int LAYERS = ThinFilmBenchmark.LAYERS;
  private static final int WAVELENGTHS = ThinFilmBenchmark.WAVELENGTHS;
  private static final int[][] SIZES = {
    {2, 181}, {5, 181}, {30, 181}, {100, 181}, {12, 20}, {12, 60}, {12, 600}, {12, 2000}
  };

  /** Keeps the JIT compiler from dropping what nobody reads. */
  private static volatile double sink;

  private ProcessorTimes() {}

  static void print() throws InterruptedException {
    Map<String, Supplier<double[]>> all = all();
    long end = System.nanoTime() + WARM_NS;
    while (System.nanoTime() < end) {
      all.values().forEach(evaluation -> microseconds(evaluation, 20));
    }
    Map<String, Double> least = new LinkedHashMap<>();
    for (int round = 0; round < 36; round++) {
      all.forEach((name, e) -> least.merge(name, microseconds(e, 200), Math::min));
    }
    double unit = least.get("evaluation");
    System.out.printf(Locale.ROOT, "%-28s %12s %8s%n", "", "processor µs", "ratio");
    least.forEach(
        (name, us) -> System.out.printf(Locale.ROOT, "%-28s %12.2f %8.2f%n", name, us, us / unit));
    double[] two = new double[2];
    Thread[] threads = {new Thread(() -> two[0] = alone()), new Thread(() -> two[1] = alone())};
    double one = alone();
    for (Thread thread : threads) {
      thread.start();
    }
    for (Thread thread : threads) {
      thread.join();
    }
    System.out.printf(
        Locale.ROOT, "one thread %.2f, two at once %.2f and %.2f µs%n", one, two[0], two[1]);
  }

  private static Map<String, Supplier<double[]>> all() {
    Yardstick flat = new Yardstick(LAYERS, WAVELENGTHS, -1, 0);
    Yardstick incoherent = new Yardstick(LAYERS, WAVELENGTHS, 6, 0);
    Map<String, Supplier<double[]>> all = new LinkedHashMap<>();
    all.put("evaluation", flat::evaluate);
    all.put("sums only", new Yardstick(LAYERS, WAVELENGTHS, -1, 0).sumsOnly()::evaluate);
    all.put("gradient", flat::differentiate);
    all.put("a material changes", flat::evaluateNewMaterial);
    all.put("one incoherent layer", incoherent::evaluate);
    all.put("its gradient", incoherent::differentiate);
    all.put("60°, unpolarised", new Yardstick(LAYERS, WAVELENGTHS, -1, 60)::evaluate);
    for (int[] size : SIZES) {
      all.put(
          size[0] + " layers, " + size[1] + " wavelengths",
          new Yardstick(size[0], size[1], -1, 0)::evaluate);
    }
    return all;
  }

  private static double alone() {
    Yardstick own = new Yardstick(LAYERS, WAVELENGTHS, -1, 0);
    double least = Double.POSITIVE_INFINITY;
    for (int round = 0; round < 24; round++) {
      least = Math.min(least, microseconds(own::evaluate, 2000));
    }
    return least;
  }

  private static double microseconds(Supplier<double[]> evaluation, int times) {
    double sum = 0;
    long before = THREADS.getCurrentThreadCpuTime();
    for (int i = 0; i < times; i++) {
      sum += evaluation.get()[0];
    }
    double us = (THREADS.getCurrentThreadCpuTime() - before) / 1e3 / times;
    sink = sum;
    return us;
  }
}
