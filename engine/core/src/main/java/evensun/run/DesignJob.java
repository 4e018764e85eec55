package evensun.run;

import evensun.evaluation.Aim;
import evensun.evaluation.Bench;
import evensun.evaluation.EfficiencyAim;
import evensun.evaluation.Limit;
import evensun.evaluation.Model;
import evensun.evaluation.Neighbourhood;
import evensun.evaluation.Outcomes;
import evensun.evaluation.StackObjective;
import evensun.result.Measured;
import evensun.result.Outcome;
import evensun.result.RunResult;
import evensun.result.SearchRecord;
import evensun.scenario.InputException;
import evensun.scenario.Place;
import evensun.scenario.SearchSpec;
import evensun.search.Search;
import evensun.search.SearchListener;
import evensun.search.SearchOutcome;
import evensun.search.SearchSettings;
import evensun.search.SearchState;
import evensun.search.StopReason;
import evensun.search.problem.Candidate;
import evensun.search.proof.Exhaustive;
import evensun.search.proof.Freedom;
import evensun.search.proof.Proof;
import evensun.spi.EvaluationFailed;
import evensun.spi.Finding;
import evensun.spi.Severity;
import evensun.stack.ResolvedStack;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.concurrent.CancellationException;
import java.util.function.BooleanSupplier;
import org.jspecify.annotations.Nullable;

/** The main job: search the best design of a scenario and record everything a review needs. */
public final class DesignJob {

  private final Preparation preparation;
  private final SearchSpec spec;
  private final Aim aim;
  private final Varied varied;
  private final List<Limit> limits;
  private final StackObjective objective;

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
    this.aim = Aims.of(spec, preparation.model());
    this.varied = Varied.of(spec, stack);
    this.limits = Limits.of(spec, stack);
    this.objective =
        new StackObjective(
            preparation.model(), varied.parameters(), varied.variables(), aim, limits);
  }

  /** Unit of the aim. */
  public String aimUnit() {
    return aim.unit();
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
   * @param exhaustive whether to check the result on a grid whatever time that takes
   * @param repeatCommand command that repeats the run
   * @throws EvaluationFailed when not a single design could be evaluated
   * @throws CancellationException when it was stopped before the first one
   */
  public RunResult run(
      SearchSettings settings,
      SearchListener listener,
      @Nullable SearchState resumed,
      BooleanSupplier cancelled,
      boolean exhaustive,
      String repeatCommand) {
    checkVariableCount(exhaustive);
    ProvenanceBuilder provenance = new ProvenanceBuilder(preparation);
    Search search = new Search(objective, settings, listener, cancelled);
    SearchOutcome outcome = resumed == null ? search.run() : search.resume(resumed);
    Candidate best = outcome.best();
    if (best == null) {
      if (cancelled.getAsBoolean()) {
        throw new CancellationException("stopped before a design had been evaluated");
      }
      throw new EvaluationFailed(
          outcome.failures().isEmpty()
              ? "no design was evaluated"
              : "no design could be evaluated: "
                  + outcome.failures().get(0).first().verdict().failure());
    }
    Look look = look(outcome, best, settings.threads(), exhaustive, cancelled);
    return result(outcome, best, look, settings, provenance, repeatCommand);
  }

  private void checkVariableCount(boolean exhaustive) {
    int count = varied.variables().size();
    if (exhaustive && count > Exhaustive.MOST_VARIABLES) {
      throw new InputException(
          Place.option("--exhaustive"),
          "a grid takes at most %d varied quantities, but %d vary; fix some of them in search.vary"
              .formatted(Exhaustive.MOST_VARIABLES, count));
    }
  }

  /** What a look around the result says. */
  private record Look(List<Freedom> freedoms, Checks checks) {}

  /** Not for an interrupted search: whoever stops it wants to leave. */
  private Look look(
      SearchOutcome outcome,
      Candidate best,
      int threads,
      boolean exhaustive,
      BooleanSupplier cancelled) {
    if (outcome.stop() == StopReason.INTERRUPTED) {
      return new Look(List.of(), Checks.NONE);
    }
    int evaluations = outcome.evaluations();
    List<Freedom> freedoms =
        best.isFeasible()
            ? new Proof(objective, threads, evaluations, cancelled)
                .freedoms(best, SearchRecords.EQUALLY_GOOD)
            : List.of();
    return new Look(
        freedoms, Checks.of(objective, best, exhaustive, evaluations, threads, cancelled));
  }

  private RunResult result(
      SearchOutcome outcome,
      Candidate best,
      Look look,
      SearchSettings settings,
      ProvenanceBuilder provenance,
      String repeatCommand) {
    Model model = preparation.model();
    Findings findings = new Findings();
    try (Bench bench = model.newBench();
        Neighbourhood around = around(best)) {
      Outcome asDrawn = asDrawn(bench, findings);
      set(bench, best);
      Electrics.Powered powered = Electrics.power(Outcomes.of(bench, varied.parameters()), bench);
      Outcome found = powered.outcome();
      SearchRecords records = new SearchRecords(varied, aim);
      SearchRecord record =
          records.record(
              outcome,
              best,
              asDrawn == null ? null : aimOf(asDrawn),
              look.freedoms(),
              Limits.records(limits, bench.design().thicknessNm, found),
              look.checks());
      findings.about(preparation.stack(), model, bench.design());
      findings.addAll(powered.findings());
      findings.about(found);
      findings.aboutErrors(found, true);
      findings.about(record);
      gapNotDecided(findings);
      limitsBroken(best, findings);
      pairingOfTheAim(found, findings);
      List<Measured> measured =
          asDrawn == null ? null : preparation.measurements().against(asDrawn, findings);
      return new RunResult(
          RunResult.FORMAT,
          "design",
          preparation.stack().scenario().title(),
          found,
          asDrawn,
          record,
          Usage.materials(bench),
          Usage.spectrum(preparation.stack()),
          AssessJob.depth(bench),
          AssessJob.angular(preparation, bench, AssessJob.USUAL_ANGLE_STEP_DEG),
          around.sensitivities(),
          around.curves(),
          new SecondOpinions(preparation, varied, aim, best).opinions(),
          measured,
          FlatTwin.beside(preparation, bench),
          AssessJob.published(preparation),
          findings.records(),
          Cautions.of(preparation.stack()),
          provenance.build(spec.seed(), repeat(repeatCommand, outcome), settingsOf(settings)));
    }
  }

  /** A search that was ended by the clock is repeated by the number of its generations. */
  private static String repeat(String command, SearchOutcome outcome) {
    return outcome.stop() == StopReason.TIME
        ? command + " --generations " + outcome.generations()
        : command;
  }

  private Neighbourhood around(Candidate best) {
    return new Neighbourhood(
        preparation.model(),
        varied.parameters(),
        varied.variables(),
        best.toArray(),
        aim,
        Aims.efficiency(preparation.model()).orElse(null));
  }

  private void set(Bench bench, Candidate best) {
    for (int v = 0; v < varied.parameters().size(); v++) {
      bench.set(varied.parameters().get(v), best.values().get(v));
    }
  }

  /** The stack as drawn; when it cannot be evaluated the search's result still counts. */
  private @Nullable Outcome asDrawn(Bench bench, Findings findings) {
    try {
      return Electrics.power(Outcomes.of(bench, varied.parameters()), bench).outcome();
    } catch (EvaluationFailed e) {
      findings.add(
          new Finding(
              "as-drawn-failed",
              Severity.WARNING,
              "stack as drawn",
              "the stack as drawn could not be evaluated: " + e.getMessage()));
      return null;
    }
  }

  private double aimOf(Outcome outcome) {
    double[] currents =
        outcome.subcells().stream().mapToDouble(s -> s.photocurrentMaPerCm2()).toArray();
    double[] gaps =
        outcome.subcells().stream()
            .mapToDouble(s -> s.bandgapEv() == null ? 0 : s.bandgapEv())
            .toArray();
    return aim.value(currents, gaps);
  }

  private void gapNotDecided(Findings findings) {
    if (aim.isSmallestCurrent() && objective.variesGap()) {
      findings.add(
          new Finding(
              "gap-not-decided",
              Severity.WARNING,
              "search.aim",
              "matched current alone cannot decide a bandgap, since thickness trades for it; among designs within %s mA cm⁻² the one with the largest sum of gaps was taken"
                  .formatted(StackObjective.GAP_TIE_MA_PER_CM2)));
    }
  }

  /** The search always works with step edges; the report may have something better. */
  private void pairingOfTheAim(Outcome found, Findings findings) {
    if (aim instanceof EfficiencyAim
        && found.electrical() != null
        && !found.electrical().pairing().contains("step edge")) {
      findings.add(
          new Finding(
              "aim-from-step-edges",
              Severity.WARNING,
              "search.aim",
              "the search ranked designs with saturation currents from step edges, the reported efficiency uses %s; set device.saturation: step-edge to have both alike"
                  .formatted(found.electrical().pairing())));
    }
  }

  private static void limitsBroken(Candidate best, Findings findings) {
    if (!best.isFeasible()) {
      findings.add(
          new Finding(
              "limit-broken",
              Severity.SERIOUS,
              "search.limits",
              "no design was found that keeps every limit; this one comes nearest: widen a range or a limit"));
    }
  }

  private static Map<String, String> settingsOf(SearchSettings settings) {
    Map<String, String> map = new LinkedHashMap<>();
    map.put("search.populationSize", String.valueOf(settings.effort().populationSize()));
    map.put("search.evaluations", String.valueOf(settings.budget().evaluations()));
    map.put("search.rounds", String.valueOf(settings.effort().rounds()));
    map.put("search.stallGenerations", String.valueOf(settings.effort().stallGenerations()));
    map.put("search.stallFraction", String.valueOf(settings.effort().stallFraction()));
    map.put("search.refined", String.valueOf(settings.effort().refined()));
    return map;
  }
}
