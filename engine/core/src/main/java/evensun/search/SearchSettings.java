package evensun.search;

import java.util.OptionalDouble;
import java.util.OptionalInt;

/**
 * How to search. Everything but {@code threads} and {@code timeSeconds} decides the result.
 *
 * @param seed seed of all randomness
 * @param threads number of threads, at least 1; changes the time only
 * @param populationSize designs in a generation, at least 8
 * @param evaluations largest number of evaluations, at least {@code populationSize}
 * @param timeSeconds time after which no further step is started, if limited
 * @param generations largest number of generations over all rounds, if limited; repeats a run that
 *     was stopped by its time
 * @param rounds independent restarts of the genetic algorithm, at least 1
 * @param stallGenerations a round has converged when so many generations in a row gained nothing
 *     worth while, at least 1
 * @param stallFraction what is not worth while, as a fraction of the distance between the mean of
 *     the first generation and the best design
 * @param refined distinct designs of each round that are refined locally, 0 for none
 * @param failureFraction the search gives up when more than this part of at least 50 evaluations
 *     failed, in (0, 1]
 */
public record SearchSettings(
    long seed,
    int threads,
    int populationSize,
    int evaluations,
    OptionalDouble timeSeconds,
    OptionalInt generations,
    int rounds,
    int stallGenerations,
    double stallFraction,
    int refined,
    double failureFraction) {

  public SearchSettings {
    require(threads >= 1, "threads must be at least 1 but was " + threads);
    require(populationSize >= 8, "population size must be at least 8 but was " + populationSize);
    require(
        evaluations >= populationSize,
        "evaluations must be at least the population size "
            + populationSize
            + " but was "
            + evaluations);
    require(rounds >= 1, "rounds must be at least 1 but was " + rounds);
    require(stallGenerations >= 1, "stall generations must be at least 1");
    require(stallFraction >= 0, "stall fraction must not be negative");
    require(refined >= 0, "number of refined designs must not be negative");
    require(
        failureFraction > 0 && failureFraction <= 1,
        "failure fraction must be in (0, 1] but was " + failureFraction);
  }

  private static void require(boolean condition, String message) {
    if (!condition) {
      throw new IllegalArgumentException(message);
    }
  }

  /** The usual settings for so many variables, on one thread. */
  public static SearchSettings of(long seed, int variableCount) {
    int population = Math.min(160, 40 + 6 * variableCount);
    return new SearchSettings(
        seed,
        1,
        population,
        30_000,
        OptionalDouble.empty(),
        OptionalInt.empty(),
        4,
        8,
        0.01,
        24,
        0.5);
  }

  /** The same on so many threads. */
  public SearchSettings withThreads(int count) {
    return new SearchSettings(
        seed,
        count,
        populationSize,
        evaluations,
        timeSeconds,
        generations,
        rounds,
        stallGenerations,
        stallFraction,
        refined,
        failureFraction);
  }

  /** The same with another budget of evaluations; a smaller population where the budget asks. */
  public SearchSettings withEvaluations(int budget) {
    int population = Math.max(8, Math.min(populationSize, budget));
    return new SearchSettings(
        seed,
        threads,
        population,
        budget,
        timeSeconds,
        generations,
        rounds,
        stallGenerations,
        stallFraction,
        refined,
        failureFraction);
  }

  /** The same with a budget of time. */
  public SearchSettings withTimeSeconds(double seconds) {
    return new SearchSettings(
        seed,
        threads,
        populationSize,
        evaluations,
        OptionalDouble.of(seconds),
        generations,
        rounds,
        stallGenerations,
        stallFraction,
        refined,
        failureFraction);
  }

  /** The same without a budget of time. */
  public SearchSettings withoutTime() {
    return new SearchSettings(
        seed,
        threads,
        populationSize,
        evaluations,
        OptionalDouble.empty(),
        generations,
        rounds,
        stallGenerations,
        stallFraction,
        refined,
        failureFraction);
  }

  /** The same, ended after so many generations. */
  public SearchSettings withGenerations(int count) {
    return new SearchSettings(
        seed,
        threads,
        populationSize,
        evaluations,
        timeSeconds,
        OptionalInt.of(count),
        rounds,
        stallGenerations,
        stallFraction,
        refined,
        failureFraction);
  }

  /** The same with another size of the population. */
  public SearchSettings withPopulationSize(int size) {
    return new SearchSettings(
        seed,
        threads,
        size,
        evaluations,
        timeSeconds,
        generations,
        rounds,
        stallGenerations,
        stallFraction,
        refined,
        failureFraction);
  }

  /** The same with so many refined designs in each round. */
  public SearchSettings withRefined(int count) {
    return new SearchSettings(
        seed,
        threads,
        populationSize,
        evaluations,
        timeSeconds,
        generations,
        rounds,
        stallGenerations,
        stallFraction,
        count,
        failureFraction);
  }

  /** What must agree between a search and its continuation, as text. */
  String fingerprint() {
    return "seed "
        + seed
        + ", population "
        + populationSize
        + ", rounds "
        + rounds
        + ", stall "
        + stallGenerations
        + " "
        + stallFraction
        + ", refined "
        + refined;
  }
}
