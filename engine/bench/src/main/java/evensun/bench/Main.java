package evensun.bench;

import evensun.bench.search.SearchTables;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Collection;
import java.util.List;
import java.util.Locale;
import org.openjdk.jmh.profile.GCProfiler;
import org.openjdk.jmh.results.RunResult;
import org.openjdk.jmh.runner.NoBenchmarksException;
import org.openjdk.jmh.runner.Runner;
import org.openjdk.jmh.runner.RunnerException;
import org.openjdk.jmh.runner.options.Options;
import org.openjdk.jmh.runner.options.OptionsBuilder;
import org.openjdk.jmh.runner.options.TimeValue;
import org.openjdk.jmh.runner.options.VerboseMode;

/** Runs the benchmarks and prints one line for each. */
public final class Main {

  private static final String USAGE =
      "usage: java -jar benchmarks.jar [REGEX] [--forks N] [--seconds S], or processor, or search [--seeds N] [--cold N] [PROBLEM...]";

  /** The class of benchmarks that want a fresh virtual machine each time. */
  private static final String COLD = "StartBenchmark";

  private Main() {}

  /** Entry point; see the package for the command. */
  public static void main(String[] args) throws Exception {
    if (args.length > 0 && args[0].equals("search")) {
      SearchTables.main(Arrays.copyOfRange(args, 1, args.length));
    } else if (args.length > 0 && args[0].equals("processor")) {
      ProcessorTimes.print();
    } else {
      measure(args);
    }
  }

  private static void measure(String[] args) throws RunnerException {
    String include = "evensun.bench";
    int forks = 3;
    double seconds = 0.5;
    try {
      for (int i = 0; i < args.length; i++) {
        switch (args[i]) {
          case "--forks" -> forks = Integer.parseInt(args[++i]);
          case "--seconds" -> seconds = Double.parseDouble(args[++i]);
          default -> include = regex(args[i]);
        }
      }
    } catch (IllegalArgumentException | ArrayIndexOutOfBoundsException e) {
      System.err.println(USAGE);
      System.exit(2);
    }
    List<RunResult> results = new ArrayList<>(run(warm(include, forks, seconds)));
    results.addAll(run(cold(include, forks)));
    if (results.isEmpty()) {
      System.err.println("no benchmark is called \"" + include + "\"; " + USAGE);
      System.exit(2);
    }
    print(results);
  }

  private static Collection<RunResult> run(Options options) throws RunnerException {
    try {
      return new Runner(options).run();
    } catch (NoBenchmarksException e) {
      return List.of();
    }
  }

  private static String regex(String arg) {
    if (arg.startsWith("-")) {
      throw new IllegalArgumentException(arg);
    }
    return arg;
  }

  /** Once in a fresh virtual machine each time, four for every fork of the others. */
  private static Options cold(String include, int forks) {
    return new OptionsBuilder()
        .include("^(?=.*" + COLD + ")(?=.*(?:" + include + "))")
        .forks(4 * forks)
        .warmupIterations(0)
        .measurementIterations(1)
        .jvmArgs("-Xmx512m", "-XX:+UseSerialGC", "-XX:TieredStopAtLevel=1")
        .verbosity(VerboseMode.SILENT)
        .build();
  }

  private static Options warm(String include, int forks, double seconds) {
    TimeValue time = TimeValue.milliseconds(Math.round(1000 * seconds));
    return new OptionsBuilder()
        .include(include)
        .exclude(COLD)
        .forks(forks)
        .warmupIterations(6)
        .warmupTime(time)
        .measurementIterations(6)
        .measurementTime(time)
        .addProfiler(GCProfiler.class)
        .jvmArgs("-Xmx512m", "-XX:+UseSerialGC")
        .verbosity(VerboseMode.SILENT)
        .build();
  }

  private static void print(Collection<RunResult> results) {
    System.out.printf(
        Locale.ROOT,
        "Java %s, %s%n%-56s %10s %10s %14s %12s%n",
        System.getProperty("java.version"),
        System.getProperty("os.arch"),
        "benchmark",
        "median µs",
        "least µs",
        "ns/layer/wl",
        "bytes/eval");
    for (RunResult result : results) {
      print(result);
    }
  }

  private static void print(RunResult result) {
    String name = result.getParams().getBenchmark().substring("evensun.bench.".length());
    String size = result.getParams().getParam("size");
    String material = result.getParams().getParam("material");
    double median = result.getPrimaryResult().getStatistics().getPercentile(50);
    System.out.printf(
        Locale.ROOT,
        "%-56s %10.2f %10.2f %14s %12s%n",
        name + (size == null ? "" : " " + size) + (material == null ? "" : " " + material),
        median,
        result.getPrimaryResult().getStatistics().getMin(),
        name.matches("(ThinFilm|Growth).*") ? perElement(median, size) : "",
        Double.isNaN(allocatedBytes(result))
            ? ""
            : String.format(Locale.ROOT, "%.3f", allocatedBytes(result)));
  }

  private static String perElement(double median, String size) {
    String[] parts = (size == null ? "12x181" : size).split("x", -1);
    double elements = Double.parseDouble(parts[0]) * Double.parseDouble(parts[1]);
    return String.format(Locale.ROOT, "%.3f", 1000 * median / elements);
  }

  private static double allocatedBytes(RunResult result) {
    for (var entry : result.getSecondaryResults().entrySet()) {
      if (entry.getKey().endsWith("gc.alloc.rate.norm")) {
        return entry.getValue().getScore();
      }
    }
    return Double.NaN;
  }
}
