package evensun.bench.search;

import evensun.search.Search;
import evensun.search.SearchListener;
import evensun.search.SearchOutcome;
import evensun.search.SearchSettings;
import evensun.search.problem.Candidate;
import evensun.search.problem.Objective;
import java.lang.management.ManagementFactory;

/**
 * One search from one seed, with the usual settings.
 *
 * @param best value of the aim that it ended with, minus infinity for none
 * @param evaluations designs evaluated
 * @param seconds by the clock, of the search alone
 * @param cpuSeconds of processor time; on one thread the time on an idle machine, nearly
 */
record Trial(double best, int evaluations, double seconds, double cpuSeconds) {

  /** Searches on one thread. */
  static Trial run(Objective problem, long seed) {
    long cpu = cpuNanos();
    long start = System.nanoTime();
    SearchSettings settings = SearchSettings.of(seed, problem.variables().size());
    SearchOutcome outcome = new Search(problem, settings, SearchListener.NONE, () -> false).run();
    Candidate best = outcome.best();
    return new Trial(
        best == null ? Double.NEGATIVE_INFINITY : best.aim(),
        outcome.evaluations(),
        1e-9 * (System.nanoTime() - start),
        1e-9 * (cpuNanos() - cpu));
  }

  /** Of this process: what the compiler and the collector do beside the search is its work too. */
  private static long cpuNanos() {
    return ((com.sun.management.OperatingSystemMXBean) ManagementFactory.getOperatingSystemMXBean())
        .getProcessCpuTime();
  }
}
