package evensun.run;

import evensun.evaluation.StackObjective;
import evensun.result.RunResult;
import evensun.scenario.InputException;
import evensun.scenario.Place;
import evensun.scenario.SearchSpec;
import evensun.search.ParetoOutcome;
import evensun.search.ParetoSearch;
import evensun.search.Search;
import evensun.search.SearchListener;
import evensun.search.SearchOutcome;
import evensun.search.SearchSettings;
import evensun.search.SearchState;
import evensun.search.StopReason;
import evensun.search.problem.Candidate;
import evensun.search.problem.KeptAims;
import evensun.search.problem.Objective;
import evensun.search.problem.Variable;
import evensun.search.proof.Exhaustive;
import evensun.search.proof.Freedom;
import evensun.search.proof.Proof;
import evensun.spi.EvaluationFailed;
import evensun.stack.ResolvedStack;
import java.util.DoubleSummaryStatistics;
import java.util.List;
import java.util.OptionalInt;
import java.util.Set;
import java.util.concurrent.CancellationException;
import java.util.function.BooleanSupplier;
import java.util.function.UnaryOperator;
import java.util.stream.Collectors;
import org.jspecify.annotations.Nullable;

/** The main job: search the best design of a scenario and record everything a review needs. */
public final class DesignJob {

  private static final String POINT = "--point";

  /** Designs of a front that differ by less than this part of its span are the same. */
  private static final double FRONT_GRAIN = 5e-3;

  private final Preparation preparation;
  private final SearchSpec spec;
  private final Aims aims;
  private final Varied varied;
  private final StackObjective objective;

  /**
   * What may be asked for beside the search itself.
   *
   * @param exhaustive whether to check the result on a grid whatever time that takes
   * @param point which design of a front the result is about, from 1; its knee when empty
   */
  public record Order(boolean exhaustive, OptionalInt point) {}

  /**
   * A design job.
   *
   * @param preparation the scenario made ready
   * @throws InputException when the scenario holds no search or one that does not fit
   */
  public DesignJob(Preparation preparation) {
    this.preparation = preparation;
    ResolvedStack stack = preparation.stack();
    this.spec =
        stack
            .scenario()
            .search()
            .orElseThrow(
                () ->
                    new InputException(
                        Place.of(stack.scenario().source().name()),
                        "the scenario has no search: section; add one with vary:, or use evensun assess for the stack as drawn"));
    this.aims = Aims.of(spec, preparation.model());
    this.varied = Varied.of(spec, stack);
    this.objective =
        new StackObjective(
            preparation.model(),
            varied.parameters(),
            varied.variables(),
            aims.all(),
            aims.limits());
  }

  /** Unit of the first aim. */
  public String aimUnit() {
    return aims.first().unit();
  }

  /** What is searched. */
  public StackObjective objective() {
    return objective;
  }

  /** Settings of the search as the scenario asks, on so many threads. */
  public SearchSettings settings(int threads) {
    SearchSettings settings =
        SearchSettings.of(spec.seed(), varied.variables().size()).withThreads(threads);
    if (spec.evaluations().isPresent()) {
      settings = settings.withEvaluations(spec.evaluations().getAsInt());
    }
    return spec.timeSeconds().isPresent()
        ? settings.withTimeSeconds(spec.timeSeconds().getAsDouble())
        : settings;
  }

  /**
   * Runs the job.
   *
   * @param settings how to search
   * @param listener hears about progress and states
   * @param resumed where an earlier run stood, if it is to go on
   * @param cancelled whether the user asked to stop
   * @param order what else is asked for
   * @param repeatCommand command that repeats the run
   * @throws InputException when the order does not fit the search
   * @throws EvaluationFailed when not a single design could be evaluated
   * @throws CancellationException when it was stopped before the first one
   */
  public RunResult run(
      SearchSettings settings,
      SearchListener listener,
      @Nullable SearchState resumed,
      BooleanSupplier cancelled,
      Order order,
      String repeatCommand) {
    check(order);
    ProvenanceBuilder provenance = new ProvenanceBuilder(preparation);
    if (spec.choices().isEmpty()) {
      Found found = found(objective, settings, listener, resumed, cancelled, order);
      Candidate best = found.best();
      Look look = look(objective, found, settings.threads(), order, cancelled);
      return new DesignResult(preparation, aims, varied, settings)
          .of(context(designs()), found, best, look, provenance, repeatCommand);
    }
    try (Alternatives all = Alternatives.of(preparation, spec.choices(), varied.variables())) {
      Found found = found(all, settings, listener, resumed, cancelled, order);
      Candidate best = found.best();
      Look look = look(all, found, settings.threads(), order, cancelled);
      Alternatives.Option option = all.option(best);
      return new DesignResult(option.preparation(), option.aims(), option.varied(), settings)
          .of(context(all.designs()), found, all.own(best), look, provenance, repeatCommand);
    }
  }

  private DesignResult.Context context(Designs designs) {
    return new DesignResult.Context(preparation, aims, varied, designs);
  }

  private Designs designs() {
    Set<String> all = varied.variables().stream().map(Variable::key).collect(Collectors.toSet());
    return new Designs(varied.variables(), candidate -> all);
  }

  private Found found(
      Objective wanted,
      SearchSettings settings,
      SearchListener listener,
      @Nullable SearchState resumed,
      BooleanSupplier cancelled,
      Order order) {
    Found found =
        isFront()
            ? front(new ParetoSearch(wanted, settings, listener, cancelled), resumed, order)
            : single(new Search(wanted, settings, listener, cancelled), resumed);
    if (found.best() == null) {
      throw nothing(found.outcome(), cancelled);
    }
    return found;
  }

  private boolean isFront() {
    return aims.all().size() > 1;
  }

  private void check(Order order) {
    int count = varied.variables().size() + spec.choices().size();
    if (order.exhaustive() && count > Exhaustive.MOST_VARIABLES) {
      throw new InputException(
          Place.option("--exhaustive"),
          "a grid takes at most %d varied quantities, but %d vary; fix some of them in search.vary"
              .formatted(Exhaustive.MOST_VARIABLES, count));
    }
    if (order.point().isPresent() && !isFront()) {
      throw new InputException(
          Place.option(POINT),
          "chooses a design of a front, but the search has one aim; list two or three under search.aim");
    }
  }

  private static Found single(Search search, @Nullable SearchState resumed) {
    SearchOutcome outcome = resumed == null ? search.run() : search.resume(resumed);
    return new Found(outcome, outcome.best(), List.of(), -1, -1);
  }

  private static Found front(ParetoSearch search, @Nullable SearchState resumed, Order order) {
    ParetoOutcome outcome = resumed == null ? search.run() : search.resume(resumed);
    List<Candidate> front = outcome.front();
    if (order.point().isEmpty()) {
      return new Found(
          outcome.search(), outcome.search().best(), front, outcome.knee(), outcome.knee());
    }
    int point = order.point().getAsInt();
    if (point < 1 || point > front.size()) {
      throw new InputException(
          Place.option(POINT),
          "must be in [1, %d], the designs of the front, but was %d"
              .formatted(front.size(), point));
    }
    return new Found(outcome.search(), front.get(point - 1), front, outcome.knee(), point - 1);
  }

  private static RuntimeException nothing(SearchOutcome outcome, BooleanSupplier cancelled) {
    if (cancelled.getAsBoolean()) {
      return new CancellationException("stopped before a design had been evaluated");
    }
    return new EvaluationFailed(
        outcome.failures().isEmpty()
            ? "no design was evaluated"
            : "no design could be evaluated: "
                + outcome.failures().get(0).first().verdict().failure());
  }

  /**
   * What a search found.
   *
   * @param outcome how the search went
   * @param best the design that the result is about; null when none could be evaluated
   * @param front for several aims the designs none of which is better in all, else empty
   * @param knee index of the best compromise on the front, or -1
   * @param shown index of the design on the front, or -1
   */
  record Found(
      SearchOutcome outcome, @Nullable Candidate best, List<Candidate> front, int knee, int shown) {

    /** Other good designs. */
    List<Candidate> others() {
      return front.isEmpty() ? outcome.optima() : front;
    }

    /** How far the front reaches in its first aim, 0 without one. */
    double span() {
      DoubleSummaryStatistics first =
          front.stream().mapToDouble(Candidate::aim).summaryStatistics();
      return front.isEmpty() ? 0 : first.getMax() - first.getMin();
    }
  }

  /**
   * What a look around the found design says.
   *
   * @param freedoms how far each value can move; empty when nobody looked
   * @param alternatives [variable][alternative] the best aim with each alternative of a choice, in
   *     the sense of the search; NaN where none was found
   * @param checks a grid, and the cost of steps
   */
  record Look(List<Freedom> freedoms, List<List<Double>> alternatives, Checks checks) {}

  /**
   * A look around, on a front with the other aims kept. Not for an interrupted search: whoever
   * stops it wants to leave.
   */
  private Look look(
      Objective wanted, Found found, int threads, Order order, BooleanSupplier cancelled) {
    Candidate best = found.best();
    if (found.outcome().stop() == StopReason.INTERRUPTED) {
      return new Look(List.of(), List.of(), Checks.NONE);
    }
    KeptAims kept = new KeptAims(wanted, best.verdict());
    Objective around = isFront() ? kept : wanted;
    UnaryOperator<Candidate> seen =
        c -> isFront() ? new Candidate(c.values(), kept.kept(c.verdict())) : c;
    Candidate centre = seen.apply(best);
    int evaluations = found.outcome().evaluations();
    Proof proof = new Proof(around, threads, evaluations, cancelled);
    List<Freedom> freedoms =
        best.isFeasible() ? proof.freedoms(centre, SearchRecords.EQUALLY_GOOD) : List.of();
    List<List<Double>> alternatives =
        best.isFeasible()
            ? proof.alternatives(centre, found.others().stream().map(seen).toList())
            : List.of();
    double negligible = FRONT_GRAIN * found.span();
    Checks checks =
        Checks.of(around, centre, order.exhaustive(), negligible, evaluations, threads, cancelled);
    return new Look(freedoms, alternatives, checks);
  }
}
