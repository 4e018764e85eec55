package evensun.search;

import evensun.search.SearchState.Phase;
import evensun.search.problem.Candidate;
import evensun.search.problem.Individual;
import evensun.search.problem.Judges;
import evensun.search.problem.Objective;
import evensun.search.problem.Optima;
import evensun.search.problem.SearchInterruptedException;
import evensun.search.problem.Space;
import java.util.ArrayList;
import java.util.List;
import java.util.function.BooleanSupplier;
import org.jspecify.annotations.Nullable;

/**
 * Finds the best values: rounds of a genetic algorithm from fresh starts, each followed by a local
 * refinement of its distinct good designs, then rounds that combine what was found until they gain
 * nothing more. The result depends on the objective and the settings alone, not on the number of
 * threads nor on where a search was interrupted and resumed.
 */
public final class Search {

  private final Objective objective;
  private final SearchSettings settings;
  private final SearchListener listener;
  private final BooleanSupplier cancelled;
  private final Space space;

  /**
   * A search.
   *
   * @param cancelled asked before every evaluation, from any thread; once true, the search ends
   *     with what it has
   */
  public Search(
      Objective objective,
      SearchSettings settings,
      SearchListener listener,
      BooleanSupplier cancelled) {
    this.objective = objective;
    this.settings = settings;
    this.listener = listener;
    this.cancelled = cancelled;
    space = new Space(objective.variables());
  }

  /** Searches from the start. */
  public SearchOutcome run() {
    return resume(SearchState.start(fingerprint()));
  }

  private String fingerprint() {
    return settings.fingerprint() + "; aims " + objective.aims() + "; " + space.fingerprint();
  }

  /**
   * Continues a search; it ends bit for bit where the uninterrupted one ends.
   *
   * @throws ForeignStateException when the state belongs to another search
   */
  public SearchOutcome resume(SearchState saved) {
    saved.checkBelongsTo(fingerprint());
    try (Judges judges = new Judges(objective, settings.threads(), cancelled)) {
      return loop(saved, new Steps(objective, space, settings, judges));
    }
  }

  private SearchOutcome loop(SearchState saved, Steps steps) {
    Stopwatch stopwatch = new Stopwatch(settings, saved);
    SearchState state = saved;
    while (state.phase() != Phase.DONE) {
      SearchState next = attempt(steps, stopwatch.timeIsUp() ? steps.outOfTime(state) : state);
      if (next == null) {
        return outcome(state, StopReason.INTERRUPTED);
      }
      state = next;
      listener.state(state);
      listener.progress(stopwatch.progress(state));
    }
    return outcome(state, state.stop());
  }

  private static @Nullable SearchState attempt(Steps steps, SearchState state) {
    try {
      return steps.advance(state);
    } catch (SearchInterruptedException interrupted) {
      return null;
    }
  }

  private SearchOutcome outcome(SearchState state, StopReason stop) {
    List<Individual> all = new ArrayList<>(state.optima());
    all.addAll(state.population());
    List<Candidate> optima =
        Optima.distinct(space, all, floor(all), Optima.SAME, Optima.MOST).stream()
            .map(this::candidate)
            .toList();
    Candidate best = optima.isEmpty() ? null : optima.get(0);
    return SearchOutcome.of(state, stop, best, optima);
  }

  private double floor(List<Individual> all) {
    return objective.tieResolution() > 0
        ? SearchState.bestAim(all) - objective.tieResolution()
        : Double.NEGATIVE_INFINITY;
  }

  private Candidate candidate(Individual individual) {
    return Candidate.of(space.values(individual.geneArray()), individual.verdict());
  }
}
