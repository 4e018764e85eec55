package evensun.search;

import evensun.search.SearchState.Phase;
import evensun.search.population.Genetic;
import evensun.search.problem.Candidate;
import evensun.search.problem.Individual;
import evensun.search.problem.Judges;
import evensun.search.problem.Objective;
import evensun.search.problem.SearchInterruptedException;
import evensun.search.problem.Space;
import evensun.search.problem.Tally;
import java.util.ArrayList;
import java.util.List;
import java.util.function.BooleanSupplier;

/**
 * Finds the designs none of which is better in every aim (NSGA-II), for two or three aims. It runs
 * for its budget of evaluations; the result depends on the objective and the settings alone.
 */
public final class ParetoSearch {

  private final Objective objective;
  private final SearchSettings settings;
  private final SearchListener listener;
  private final BooleanSupplier cancelled;
  private final Space space;

  /**
   * A search.
   *
   * @param objective with at least two aims
   * @param settings rounds, stall and refinement play no part here
   * @param cancelled asked before every evaluation, from any thread
   */
  public ParetoSearch(
      Objective objective,
      SearchSettings settings,
      SearchListener listener,
      BooleanSupplier cancelled) {
    if (objective.aims().size() < 2) {
      throw new IllegalArgumentException("a front needs at least two aims");
    }
    this.objective = objective;
    this.settings = settings;
    this.listener = listener;
    this.cancelled = cancelled;
    space = new Space(objective.variables());
  }

  /**
   * Searches from the start.
   *
   * @param given designs to start from, such as the best in each aim alone
   */
  public ParetoOutcome run(List<Candidate> given) {
    try (Judges judges = new Judges(objective, settings.threads(), cancelled)) {
      Genetic genetic =
          Genetic.forSeveralAims(
              space, settings.seed(), settings.effort().populationSize(), judges);
      List<double[]> genes = new ArrayList<>();
      given.forEach(candidate -> genes.add(space.genes(candidate.toArray())));
      Tally tally = new Tally(0, List.of());
      SearchState start = SearchState.start(fingerprint());
      try {
        return loop(genetic, state(start, genetic.first(genes, 1, tally), tally));
      } catch (SearchInterruptedException interrupted) {
        return outcome(start, StopReason.INTERRUPTED);
      }
    }
  }

  /**
   * Continues a search; it ends bit for bit where the uninterrupted one ends.
   *
   * @throws IllegalArgumentException when the state belongs to another search
   */
  public ParetoOutcome resume(SearchState saved) {
    if (!saved.fingerprint().equals(fingerprint())) {
      throw new IllegalArgumentException("the saved state belongs to another search");
    }
    try (Judges judges = new Judges(objective, settings.threads(), cancelled)) {
      return loop(
          Genetic.forSeveralAims(
              space, settings.seed(), settings.effort().populationSize(), judges),
          saved);
    }
  }

  private String fingerprint() {
    return "front; " + settings.fingerprint() + "; " + objective.aims() + space.fingerprint();
  }

  private ParetoOutcome loop(Genetic genetic, SearchState from) {
    Stopwatch stopwatch = new Stopwatch(settings, from);
    Rounds rounds = new Rounds(settings);
    SearchState state = from;
    while (true) {
      listener.state(state);
      listener.progress(stopwatch.progress(state));
      if (rounds.tooManyFailures(state.evaluations(), state.failureCount())) {
        return outcome(state, StopReason.FAILURES);
      }
      if (state.evaluations() + settings.effort().populationSize() / 2
          > settings.budget().evaluations()) {
        return outcome(state, StopReason.EVALUATIONS);
      }
      if (stopwatch.timeIsUp() || rounds.timeSpent(state.history())) {
        return outcome(state, StopReason.TIME);
      }
      Tally tally = new Tally(state.evaluations(), state.failures());
      try {
        int generation = state.generation() + 1;
        state = state(state, genetic.next(state.population(), generation, FIRST, tally), tally);
      } catch (SearchInterruptedException interrupted) {
        return outcome(state, StopReason.INTERRUPTED);
      }
    }
  }

  private static final double FIRST = Double.NEGATIVE_INFINITY;

  private static SearchState state(SearchState before, List<Individual> population, Tally tally) {
    double best = Math.max(before.bestAim(), SearchState.bestAim(population));
    int generation = before.generation() + 1;
    List<GenerationRecord> history = new ArrayList<>(before.history());
    history.add(new GenerationRecord(generation, 0, tally.evaluations(), best, best, Double.NaN));
    return new SearchState(
        before.fingerprint(),
        Phase.GENETIC,
        0,
        generation,
        tally.evaluations(),
        population,
        List.of(),
        List.of(),
        best,
        history,
        tally.failures(),
        false,
        StopReason.CONVERGED);
  }

  private ParetoOutcome outcome(SearchState state, StopReason stop) {
    List<Candidate> front = Front.of(candidates(state));
    return new ParetoOutcome(
        front,
        Front.knee(front),
        stop,
        state.generation(),
        state.evaluations(),
        state.failureCount(),
        state.failures(),
        state.history(),
        state);
  }

  private List<Candidate> candidates(SearchState state) {
    return state.population().stream()
        .map(i -> Candidate.of(space.values(i.geneArray()), i.verdict()))
        .toList();
  }
}
