package evensun.bench.search;

import evensun.search.problem.Objective;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.function.ToDoubleFunction;

/**
 * The search from many seeds beside the other methods, which may evaluate as often as it did.
 *
 * @param name of the problem
 * @param tolerance a seed succeeds that ends so near the best value that any method found
 * @param trials [seed] the search
 * @param cloud [seed] best values of CMA-ES with restarts
 * @param random [seed] best values of random search
 * @param best the best value of all, and of CMA-ES with ten times the evaluations
 */
record Comparison(
    String name,
    double tolerance,
    List<Trial> trials,
    List<Double> cloud,
    List<Double> random,
    double best) {

  private static final int LONG_RUNS = 3;
  private static final int LONGER = 10;

  static final String HEAD =
      "| problem | tolerance | search | CMA-ES with restarts | random | evaluations (most) | worst of search, CMA-ES | processor s, median (most) |\n"
          + "|---|---|---|---|---|---|---|---|";

  /** Runs everything. */
  static Comparison of(String name, Objective problem, double tolerance, int seeds) {
    List<Trial> trials = new ArrayList<>();
    List<Double> cloud = new ArrayList<>();
    List<Double> random = new ArrayList<>();
    double best = Double.NEGATIVE_INFINITY;
    for (int seed = 1; seed <= seeds; seed++) {
      Trial trial = Trial.run(problem, seed);
      trials.add(trial);
      cloud.add(Rival.cloud(problem, seed, trial.evaluations()));
      random.add(Rival.random(problem, seed, trial.evaluations()));
      best = Math.max(best, Math.max(trial.best(), Math.max(last(cloud), last(random))));
      if (seed <= LONG_RUNS) {
        best = Math.max(best, Rival.cloud(problem, -seed, LONGER * trial.evaluations()));
      }
    }
    return new Comparison(name, tolerance, trials, cloud, random, best);
  }

  private static double last(List<Double> values) {
    return values.get(values.size() - 1);
  }

  /** A row of the table, with the best value in a comment behind it. */
  String row() {
    double[] found = sorted(Trial::best);
    double[] evaluations = sorted(Trial::evaluations);
    double[] seconds = sorted(Trial::cpuSeconds);
    return String.format(
        Locale.ROOT,
        "| %s | %s | %s | %s | %s | %.0f (%.0f) | %.4f, %.4f | %.2f (%.2f) |",
        name,
        tolerance,
        within(Arrays.stream(found).boxed().toList()),
        within(cloud),
        within(random),
        Arrays.stream(evaluations).average().orElse(0),
        evaluations[evaluations.length - 1],
        best - found[0],
        best - cloud.stream().mapToDouble(v -> v).min().orElseThrow(),
        seconds[seconds.length / 2],
        seconds[seconds.length - 1]);
  }

  private double[] sorted(ToDoubleFunction<Trial> what) {
    return trials.stream().mapToDouble(what).sorted().toArray();
  }

  private String within(List<Double> values) {
    long count = values.stream().filter(v -> v >= best - tolerance).count();
    return count + "/" + values.size();
  }
}
