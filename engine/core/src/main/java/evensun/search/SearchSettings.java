package evensun.search;

import java.util.OptionalDouble;
import java.util.OptionalInt;

/**
 * How to search. Everything but {@code threads} and the time of the budget decides the result.
 *
 * @param seed seed of all randomness
 * @param threads number of threads, at least 1; changes the time only
 * @param budget when to end at the latest
 * @param effort how thoroughly to look
 */
public record SearchSettings(long seed, int threads, Budget budget, Effort effort) {

  public SearchSettings {
    require(threads >= 1, "threads must be at least 1 but was " + threads);
    require(
        budget.evaluations >= effort.populationSize,
        "evaluations must be at least the population size "
            + effort.populationSize
            + " but was "
            + budget.evaluations);
  }

  /**
   * When to end at the latest.
   *
   * @param evaluations largest number of evaluations, at least the size of the population
   * @param timeSeconds time after which no further step is started, if limited
   * @param generations largest number of generations over all rounds, if limited; repeats a run
   *     that was stopped by its time
   */
  public record Budget(int evaluations, OptionalDouble timeSeconds, OptionalInt generations) {

    private Budget withEvaluations(int count) {
      return new Budget(count, timeSeconds, generations);
    }

    private Budget withTime(OptionalDouble seconds) {
      return new Budget(evaluations, seconds, generations);
    }

    private Budget withGenerations(int count) {
      return new Budget(evaluations, timeSeconds, OptionalInt.of(count));
    }
  }

  /**
   * How thoroughly to look.
   *
   * @param populationSize designs in a generation, at least 8
   * @param rounds independent restarts of the genetic algorithm, at least 1
   * @param stallGenerations a round has converged when so many generations in a row gained nothing
   *     worth while, at least 1
   * @param stallFraction what is not worth while, as a fraction of the distance between the mean of
   *     the first generation and the best design
   * @param refined distinct designs of each round that are refined locally, 0 for none
   * @param failureFraction the search gives up when more than this part of at least 50 evaluations
   *     failed, in (0, 1]
   */
  public record Effort(
      int populationSize,
      int rounds,
      int stallGenerations,
      double stallFraction,
      int refined,
      double failureFraction) {

    public Effort {
      require(populationSize >= 8, "population size must be at least 8 but was " + populationSize);
      require(rounds >= 1, "rounds must be at least 1 but was " + rounds);
      require(stallGenerations >= 1, "stall generations must be at least 1");
      require(stallFraction >= 0, "stall fraction must not be negative");
      require(refined >= 0, "number of refined designs must not be negative");
      require(
          failureFraction > 0 && failureFraction <= 1,
          "failure fraction must be in (0, 1] but was " + failureFraction);
    }

    private Effort withPopulationSize(int size) {
      return new Effort(size, rounds, stallGenerations, stallFraction, refined, failureFraction);
    }

    private Effort withRefined(int count) {
      return new Effort(
          populationSize, rounds, stallGenerations, stallFraction, count, failureFraction);
    }
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
        new Budget(30_000, OptionalDouble.empty(), OptionalInt.empty()),
        new Effort(population, 4, 8, 0.01, 24, 0.5));
  }

  /** The same on so many threads. */
  public SearchSettings withThreads(int count) {
    return new SearchSettings(seed, count, budget, effort);
  }

  /** The same with another budget of evaluations; a smaller population where the budget asks. */
  public SearchSettings withEvaluations(int count) {
    int population = Math.max(8, Math.min(effort.populationSize, count));
    return new SearchSettings(
        seed, threads, budget.withEvaluations(count), effort.withPopulationSize(population));
  }

  /** The same with a budget of time. */
  public SearchSettings withTimeSeconds(double seconds) {
    return with(budget.withTime(OptionalDouble.of(seconds)));
  }

  /** The same without a budget of time. */
  public SearchSettings withoutTime() {
    return with(budget.withTime(OptionalDouble.empty()));
  }

  /** The same, ended after so many generations. */
  public SearchSettings withGenerations(int count) {
    return with(budget.withGenerations(count));
  }

  /** The same with another size of the population. */
  public SearchSettings withPopulationSize(int size) {
    return with(effort.withPopulationSize(size));
  }

  /** The same with so many refined designs in each round. */
  public SearchSettings withRefined(int count) {
    return with(effort.withRefined(count));
  }

  private SearchSettings with(Budget other) {
    return new SearchSettings(seed, threads, other, effort);
  }

  private SearchSettings with(Effort other) {
    return new SearchSettings(seed, threads, budget, other);
  }

  /** What must agree between a search and its continuation, as text. */
  String fingerprint() {
    return "seed "
        + seed
        + ", population "
        + effort.populationSize
        + ", rounds "
        + effort.rounds
        + ", stall "
        + effort.stallGenerations
        + " "
        + effort.stallFraction
        + ", refined "
        + effort.refined;
  }
}
