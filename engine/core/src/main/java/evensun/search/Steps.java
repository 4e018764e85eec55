package evensun.search;

import evensun.search.SearchState.Phase;
import evensun.search.population.Genetic;
import evensun.search.problem.Individual;
import evensun.search.problem.Judges;
import evensun.search.problem.Objective;
import evensun.search.problem.Optima;
import evensun.search.problem.Space;
import evensun.search.problem.Tally;
import evensun.search.refine.Refiner;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;

/**
 * The steps of a search, each from one state to the next: a generation, or the refinement that ends
 * a round. A step that is interrupted leaves no trace.
 */
final class Steps {

  /** Starts of a refinement differ by this much in some gene. */
  private static final double DISTINCT_STARTS = 0.05;

  private final Objective objective;
  private final Space space;
  private final SearchSettings settings;
  private final Rounds rounds;
  private final Genetic genetic;
  private final Refiner refiner;

  Steps(Objective objective, Space space, SearchSettings settings, Judges judges) {
    this.objective = objective;
    this.space = space;
    this.settings = settings;
    rounds = new Rounds(settings);
    genetic = Genetic.forOneAim(space, settings.seed(), settings.effort().populationSize(), judges);
    refiner = new Refiner(space, judges, objective.limits().size(), settings.seed());
  }

  SearchState advance(SearchState state) {
    return switch (state.phase()) {
      case GENETIC -> generation(state);
      case REFINE -> refinement(state);
      case DONE -> state;
    };
  }

  /** The state that ends the genetic part now and refines what there is. */
  SearchState outOfTime(SearchState state) {
    boolean running = state.phase() == Phase.GENETIC && !state.population().isEmpty();
    return running ? state.with(Phase.REFINE, StopReason.TIME) : state;
  }

  private SearchState generation(SearchState state) {
    Tally tally = new Tally(state.evaluations(), state.failures());
    int generation = state.generation() + 1;
    List<Individual> population =
        state.population().isEmpty()
            ? genetic.first(given(state), generation, tally)
            : genetic.next(state.population(), generation, floor(state), tally);
    List<GenerationRecord> history = new ArrayList<>(state.history());
    history.add(record(state, generation, population, tally));
    SearchState next =
        new SearchState(
            state.fingerprint(),
            Phase.GENETIC,
            state.round(),
            generation,
            tally.evaluations(),
            population,
            state.optima(),
            state.roundBests(),
            unrefinedBest(state, population),
            history,
            tally.failures(),
            state.tieBreaking(),
            state.stop());
    return judged(next);
  }

  /** Combining rounds start from refined designs, so only fresh rounds show the algorithm alone. */
  private double unrefinedBest(SearchState state, List<Individual> population) {
    return rounds.isFresh(state.round())
        ? Math.max(state.unrefinedBest(), SearchState.bestAim(population))
        : state.unrefinedBest();
  }

  private SearchState judged(SearchState next) {
    if (rounds.tooManyFailures(next.evaluations(), next.failureCount())) {
      return next.with(Phase.DONE, StopReason.FAILURES);
    }
    if (rounds.timeSpent(next.history())) {
      return next.with(Phase.REFINE, StopReason.TIME);
    }
    boolean ended = rounds.roundEnded(next.round(), next.history());
    return ended ? next.with(Phase.REFINE, next.stop()) : next;
  }

  private GenerationRecord record(
      SearchState state, int generation, List<Individual> population, Tally tally) {
    double inPopulation = SearchState.bestAim(population);
    double roundBest = inPopulation;
    for (GenerationRecord earlier : state.history()) {
      if (earlier.round() == state.round()) {
        roundBest = Math.max(roundBest, earlier.roundBest());
      }
    }
    double best = Math.max(state.bestAim(), inPopulation);
    return new GenerationRecord(
        generation,
        state.round(),
        tally.evaluations(),
        best,
        roundBest,
        SearchState.meanAim(population),
        0);
  }

  /** The first round knows the design as drawn, the combining ones everything found so far. */
  private List<double[]> given(SearchState state) {
    List<double[]> given = new ArrayList<>();
    if (state.round() == 0 && space.contains(space.drawn())) {
      given.add(space.genes(space.drawn()));
    }
    if (!rounds.isFresh(state.round())) {
      state.optima().stream()
          .limit(settings.effort().populationSize() / 2)
          .forEach(optimum -> given.add(optimum.geneArray()));
    }
    return given;
  }

  private double floor(SearchState state) {
    return state.tieBreaking()
        ? SearchState.bestAim(state.optima()) - objective.tieResolution()
        : Double.NEGATIVE_INFINITY;
  }

  private SearchState refinement(SearchState state) {
    Tally tally = new Tally(state.evaluations(), state.failures());
    double floor = floor(state);
    int most = Math.max(1, settings.effort().refined());
    List<Individual> starts =
        Optima.distinct(space, unrefined(state), floor, DISTINCT_STARTS, most);
    List<Individual> refined =
        settings.effort().refined() == 0
            ? starts
            : refiner.refine(starts, floor, budget(state), tally);
    List<Individual> all = new ArrayList<>(state.optima());
    all.addAll(refined);
    List<Double> roundBests = new ArrayList<>(state.roundBests());
    roundBests.add(SearchState.bestAim(refined));
    return nextRound(
        state, Optima.distinct(space, all, floor, Optima.SAME, Optima.MOST), roundBests, tally);
  }

  /** What the refinement has returned once, it would return again. */
  private static List<Individual> unrefined(SearchState state) {
    Set<List<Double>> known = new HashSet<>();
    state.optima().forEach(optimum -> known.add(optimum.genes()));
    return state.population().stream().filter(p -> !known.contains(p.genes())).toList();
  }

  /** Never more than the genetic part took, so that an end by time is not long overdue. */
  private int budget(SearchState state) {
    return Math.min(settings.budget().evaluations() - state.evaluations(), state.evaluations());
  }

  private SearchState nextRound(
      SearchState state, List<Individual> optima, List<Double> roundBests, Tally tally) {
    boolean over = state.stop() != StopReason.CONVERGED;
    boolean converged = rounds.converged(roundBests, state.history());
    boolean spent = !converged && rounds.budgetSpent(tally.evaluations());
    boolean ties = objective.tieResolution() > 0 && !state.tieBreaking();
    boolean done = over || spent || state.tieBreaking() || converged && !ties;
    return new SearchState(
        state.fingerprint(),
        done ? Phase.DONE : Phase.GENETIC,
        state.round() + 1,
        state.generation(),
        tally.evaluations(),
        List.of(),
        optima,
        roundBests,
        state.unrefinedBest(),
        state.history(),
        tally.failures(),
        state.tieBreaking() || converged && !over && !spent && ties,
        spent && !over ? StopReason.EVALUATIONS : state.stop());
  }
}
