package evensun.search;

import evensun.search.SearchState.Phase;
import evensun.search.population.Genetic;
import evensun.search.problem.Candidate;
import evensun.search.problem.Individual;
import evensun.search.problem.Judges;
import evensun.search.problem.Numbers;
import evensun.search.problem.Objective;
import evensun.search.problem.Optima;
import evensun.search.problem.SearchInterruptedException;
import evensun.search.problem.Space;
import evensun.search.problem.Tally;
import evensun.search.problem.Verdict;
import evensun.search.refine.FrontRefiner;
import evensun.search.refine.Refiner;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.function.BooleanSupplier;
import org.jspecify.annotations.Nullable;

/**
 * Finds the designs none of which is better in every aim, for two or three aims: generations of a
 * genetic algorithm (NSGA-II) until the front stands still, then a local refinement of every design
 * of the front. What turns out to stand on a lower hill drops out; designs between the remaining
 * neighbours fill the gaps and are refined in turn. The result depends on the objective and the
 * settings alone, not on the number of threads nor on where the search was interrupted and resumed.
 */
public final class ParetoSearch {

  private static final double NO_FLOOR = Double.NEGATIVE_INFINITY;

  /** Designs best in the first aim that are refined without regard to the others. */
  private static final int BEST_ALONE = 12;

  /** [aims] part of the evaluations at which the genetic part ends. */
  private static final double[] GENETIC_SHARE = {0, 0, 0.85, 0.5};

  /** [refinement] part of the evaluations left that it may take. */
  private static final double[] REFINED_SHARE = {0.5, 0.5, 1};

  /**
   * Designs of a front that are nearer to another than this, in parts of its range, are left out.
   */
  private static final double NEXT_TO_NOTHING = 2e-3;

  private static final int LAST = REFINED_SHARE.length - 1;

  private final Objective objective;
  private final SearchSettings settings;
  private final SearchListener listener;
  private final BooleanSupplier cancelled;
  private final Space space;
  private final Rounds rounds;

  /**
   * A search.
   *
   * @param objective with at least two aims
   * @param settings rounds play no part here
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
    rounds = new Rounds(settings);
  }

  /** Searches from the start. */
  public ParetoOutcome run() {
    return resume(SearchState.start(fingerprint()));
  }

  /**
   * Continues a search; it ends bit for bit where the uninterrupted one ends.
   *
   * @throws ForeignStateException when the state belongs to another search
   */
  public ParetoOutcome resume(SearchState saved) {
    saved.checkBelongsTo(fingerprint());
    try (Judges judges = new Judges(objective, settings.threads(), cancelled)) {
      Stopwatch stopwatch = new Stopwatch(settings, saved);
      SearchState state = saved;
      while (state.phase() != Phase.DONE) {
        SearchState next = attempt(judges, stopwatch.timeIsUp() ? outOfTime(state) : state);
        if (next == null) {
          return outcome(state, StopReason.INTERRUPTED);
        }
        state = next;
        listener.state(state);
        listener.progress(stopwatch.progress(state));
      }
      return outcome(state, state.stop());
    }
  }

  private String fingerprint() {
    return "front; " + settings.fingerprint() + "; " + objective.aims() + space.fingerprint();
  }

  private static SearchState outOfTime(SearchState state) {
    boolean running = state.phase() == Phase.GENETIC && !state.population().isEmpty();
    return running ? state.with(Phase.REFINE, StopReason.TIME) : state;
  }

  private @Nullable SearchState attempt(Judges judges, SearchState state) {
    try {
      return state.phase() == Phase.REFINE ? refined(judges, state) : generation(judges, state);
    } catch (SearchInterruptedException interrupted) {
      return null;
    }
  }

  private SearchState generation(Judges judges, SearchState state) {
    Tally tally = new Tally(state.evaluations(), state.failures());
    int generation = state.generation() + 1;
    Genetic genetic =
        Genetic.forSeveralAims(space, settings.seed(), settings.effort().populationSize(), judges);
    List<Individual> population =
        state.population().isEmpty()
            ? genetic.first(given(), generation, tally)
            : genetic.next(state.population(), generation, NO_FLOOR, tally);
    double gain = Front.gain(front(state.population()), front(population));
    return judged(next(state, generation, population, gain, tally));
  }

  private List<double[]> given() {
    return space.contains(space.drawn()) ? List.of(space.genes(space.drawn())) : List.of();
  }

  private SearchState judged(SearchState state) {
    if (rounds.tooManyFailures(state.evaluations(), state.failureCount())) {
      return state.with(Phase.DONE, StopReason.FAILURES);
    }
    if (rounds.timeSpent(state.history())) {
      return state.with(Phase.REFINE, StopReason.TIME);
    }
    if (rounds.frontStands(state.history())) {
      return state.with(Phase.REFINE, StopReason.CONVERGED);
    }
    double next = state.evaluations() + settings.effort().populationSize();
    return next > GENETIC_SHARE[objective.aims().size()] * settings.budget().evaluations()
        ? state.with(Phase.REFINE, StopReason.EVALUATIONS)
        : state;
  }

  /**
   * Every design of the front by itself: first those of the genetic algorithm, with the best in the
   * first aim alone; then those that fill the gaps as well; at last each from where its neighbour
   * stands, in case that is a higher hill.
   */
  private SearchState refined(Judges judges, SearchState state) {
    Tally tally = new Tally(state.evaluations(), state.failures());
    int budget = settings.effort().refined() == 0 ? 0 : budget(state);
    List<Individual> all = new ArrayList<>(state.population());
    if (state.round() == 0) {
      List<Individual> front = Front.of(all);
      all.addAll(
          new Refiner(space, judges, objective.limits().size(), settings.seed())
              .refine(
                  front.subList(0, Math.min(front.size(), BEST_ALONE)),
                  NO_FLOOR,
                  budget / 4,
                  tally));
    } else {
      all.addAll(between(judges, Front.of(all), budget / 4, tally));
    }
    List<Individual> front = Front.of(all);
    List<Individual> starts = new ArrayList<>(front);
    if (state.round() == LAST) {
      Collections.rotate(starts, -1);
    }
    int left = budget - (tally.evaluations() - state.evaluations());
    all.addAll(
        new FrontRefiner(objective, space, judges, settings.seed())
            .refine(starts, front, left, tally));
    List<Individual> refined = Front.thinned(Front.of(all), NEXT_TO_NOTHING);
    SearchState next = next(state, state.generation(), refined, 0, tally);
    return state.round() == LAST || state.stop() == StopReason.TIME
        ? next.with(Phase.DONE, state.stop())
        : next.inRound(state.round() + 1);
  }

  /** Designs between neighbours of a front, as many as a generation lacks for each further aim. */
  private List<Individual> between(Judges judges, List<Individual> front, int budget, Tally tally) {
    int furtherAims = objective.aims().size() - 1;
    int most = furtherAims * settings.effort().populationSize() - front.size();
    List<double[]> genes =
        new FrontGaps(space, front)
            .filled(Math.min(most, budget)).stream().map(space::snap).toList();
    List<double[]> values = genes.stream().map(space::values).toList();
    List<Verdict> verdicts = judges.judge(values);
    List<Individual> filling = new ArrayList<>();
    for (int i = 0; i < genes.size(); i++) {
      Individual design = new Individual(0, Numbers.list(genes.get(i)), verdicts.get(i));
      tally.count(candidate(design));
      if (design.isFeasible()) {
        filling.add(design);
      }
    }
    return filling;
  }

  private int budget(SearchState state) {
    int left = settings.budget().evaluations() - state.evaluations();
    return (int) Math.max(0, REFINED_SHARE[state.round()] * left);
  }

  private SearchState next(
      SearchState before, int generation, List<Individual> population, double gain, Tally tally) {
    List<GenerationRecord> history = new ArrayList<>(before.history());
    if (generation > before.generation()) {
      double best = Math.max(before.bestAim(), SearchState.bestAim(population));
      history.add(
          new GenerationRecord(
              generation,
              0,
              tally.evaluations(),
              best,
              best,
              SearchState.meanAim(population),
              gain));
    }
    double unrefined =
        before.phase() == Phase.REFINE
            ? before.unrefinedBest()
            : Math.max(before.unrefinedBest(), SearchState.bestAim(population));
    return new SearchState(
        before.fingerprint(),
        before.phase(),
        before.round(),
        generation,
        tally.evaluations(),
        population,
        List.of(),
        List.of(),
        unrefined,
        history,
        tally.failures(),
        false,
        before.stop());
  }

  private ParetoOutcome outcome(SearchState state, StopReason stop) {
    List<Candidate> front = front(state.population());
    int knee = Front.knee(front);
    Candidate best =
        knee >= 0
            ? front.get(knee)
            : Optima.distinct(space, state.population(), NO_FLOOR, 0, 1).stream()
                .map(this::candidate)
                .findFirst()
                .orElse(null);
    return new ParetoOutcome(front, knee, SearchOutcome.of(state, stop, best, List.of()));
  }

  private List<Candidate> front(List<Individual> population) {
    return Front.of(population).stream().map(this::candidate).toList();
  }

  private Candidate candidate(Individual individual) {
    return Candidate.of(space.values(individual.geneArray()), individual.verdict());
  }
}
