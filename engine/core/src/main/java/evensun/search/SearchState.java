package evensun.search;

import evensun.search.problem.FailureRecord;
import evensun.search.problem.Individual;
import java.util.List;

/**
 * All that a search needs to continue bit for bit.
 *
 * @param fingerprint what must agree with the search that continues
 * @param phase {@code GENETIC}, {@code REFINE} or {@code DONE}
 * @param round from 0
 * @param generation generations so far over all rounds
 * @param evaluations evaluations so far
 * @param population the present generation in order
 * @param optima what the refinement found so far, best first
 * @param roundBests [round] best aim of each finished round
 * @param unrefinedBest best aim of the genetic algorithm alone, in its fresh rounds
 * @param history one entry per generation
 * @param failures one entry per kind of failure
 * @param tieBreaking whether the tie-break now decides among designs of nearly the best aim
 * @param stop why it stopped or is about to
 */
public record SearchState(
    String fingerprint,
    Phase phase,
    int round,
    int generation,
    int evaluations,
    List<Individual> population,
    List<Individual> optima,
    List<Double> roundBests,
    double unrefinedBest,
    List<GenerationRecord> history,
    List<FailureRecord> failures,
    boolean tieBreaking,
    StopReason stop) {

  /** Where in a round the search is. */
  public enum Phase {
    GENETIC,
    REFINE,
    DONE
  }

  public SearchState {
    population = List.copyOf(population);
    optima = List.copyOf(optima);
    roundBests = List.copyOf(roundBests);
    history = List.copyOf(history);
    failures = List.copyOf(failures);
  }

  /** The state in which a search starts. */
  static SearchState start(String fingerprint) {
    return new SearchState(
        fingerprint,
        Phase.GENETIC,
        0,
        0,
        0,
        List.of(),
        List.of(),
        List.of(),
        Double.NEGATIVE_INFINITY,
        List.of(),
        List.of(),
        false,
        StopReason.CONVERGED);
  }

  /** The same in another phase, with a reason to stop. */
  SearchState with(Phase next, StopReason reason) {
    return new SearchState(
        fingerprint,
        next,
        round,
        generation,
        evaluations,
        population,
        optima,
        roundBests,
        unrefinedBest,
        history,
        failures,
        tieBreaking,
        reason);
  }

  /** The same in another round. */
  SearchState inRound(int next) {
    return new SearchState(
        fingerprint,
        phase,
        next,
        generation,
        evaluations,
        population,
        optima,
        roundBests,
        unrefinedBest,
        history,
        failures,
        tieBreaking,
        stop);
  }

  /** Best first aim of a design that keeps all limits, minus infinity for none. */
  public double bestAim() {
    return Math.max(bestAim(population), bestAim(optima));
  }

  /** The same among some individuals. */
  static double bestAim(List<Individual> individuals) {
    double best = Double.NEGATIVE_INFINITY;
    for (Individual individual : individuals) {
      if (individual.isFeasible()) {
        best = Math.max(best, individual.verdict().aims().get(0));
      }
    }
    return best;
  }

  /** Mean first aim of the designs that could be evaluated, NaN for none. */
  static double meanAim(List<Individual> individuals) {
    return individuals.stream()
        .filter(individual -> !individual.verdict().isFailure())
        .mapToDouble(individual -> individual.verdict().aims().get(0))
        .average()
        .orElse(Double.NaN);
  }

  /** Refuses to go on with the state of another search. */
  void checkBelongsTo(String search) {
    if (!fingerprint.equals(search)) {
      throw new ForeignStateException(
          "the saved state belongs to another search: it was made with "
              + fingerprint
              + "; this one has "
              + search);
    }
  }

  /** Number of designs that could not be evaluated. */
  public int failureCount() {
    return failures.stream().mapToInt(FailureRecord::count).sum();
  }
}
