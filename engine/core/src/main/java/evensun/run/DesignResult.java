package evensun.run;

import evensun.device.PairingChoice;
import evensun.evaluation.Bench;
import evensun.evaluation.Limit;
import evensun.evaluation.Model;
import evensun.evaluation.Neighbourhood;
import evensun.evaluation.Outcomes;
import evensun.evaluation.Parameter;
import evensun.evaluation.Reading;
import evensun.evaluation.StackObjective;
import evensun.result.Measured;
import evensun.result.Outcome;
import evensun.result.RunResult;
import evensun.result.SearchRecord;
import evensun.result.SearchRecord.ConstraintRecord;
import evensun.result.Sensitivity;
import evensun.result.WhatIf;
import evensun.run.DesignJob.Found;
import evensun.run.DesignJob.Look;
import evensun.search.SearchOutcome;
import evensun.search.SearchSettings;
import evensun.search.StopReason;
import evensun.search.problem.Candidate;
import evensun.spi.EvaluationFailed;
import evensun.spi.Finding;
import evensun.spi.Severity;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import org.jspecify.annotations.Nullable;

/** Everything a review needs about a design that a search found. */
final class DesignResult {

  /** A design this close to a limit, as a fraction of it, is held by it. */
  private static final double ACTIVE = 1e-3;

  private final Preparation preparation;
  private final Aims aims;
  private final Varied varied;
  private final SearchSettings settings;
  private final PairingChoice pairing;
  private final Findings findings = new Findings();

  /**
   * What surrounds a design whose choices are made.
   *
   * @param preparation the stack as drawn
   * @param aims its aims
   * @param varied all that varied beside the choices
   * @param designs what the values of candidates mean
   */
  record Context(Preparation preparation, Aims aims, Varied varied, Designs designs) {}

  DesignResult(Preparation preparation, Aims aims, Varied varied, SearchSettings settings) {
    this.preparation = preparation;
    this.aims = aims;
    this.varied = varied;
    this.settings = settings;
    this.pairing = Electrics.choice(preparation.model());
  }

  RunResult of(
      Context context,
      Found found,
      Candidate best,
      Look look,
      ProvenanceBuilder provenance,
      String repeatCommand) {
    Model model = preparation.model();
    try (Bench bench = model.newBench(aims.lightSums());
        Neighbourhood around = around(best)) {
      Drawn drawn = drawn(context);
      set(bench, best);
      Electrics.Powered powered = powered(bench, varied);
      Designs designs = context.designs();
      Outcome outcome =
          powered.outcome().withChoices(designs.choices(Objects.requireNonNull(found.best())));
      SearchRecord record =
          new SearchRecords(context.designs(), aims)
              .record(
                  found,
                  Objects.requireNonNull(found.best()),
                  drawn.aims(),
                  look,
                  constraints(bench));
      findings.about(bench);
      findings.addAll(powered.findings());
      findings.about(outcome);
      findings.aboutErrors(outcome, true);
      findings.about(record);
      gapNotDecided();
      limitsBroken(best);
      List<Measured> measured =
          drawn.outcome() == null
              ? null
              : preparation.measurements().against(drawn.outcome(), findings);
      List<Sensitivity> sensitivities = around.sensitivities();
      List<WhatIf> curves = around.curves();
      around.failures().forEach(this::neighbourFailed);
      return new RunResult(
          RunResult.FORMAT,
          "design",
          preparation.stack().scenario().title(),
          outcome,
          drawn.outcome(),
          record,
          Usage.materials(bench),
          Usage.spectrum(preparation.stack()),
          AssessJob.depth(bench),
          AssessJob.angular(preparation, bench, AssessJob.USUAL_ANGLE_STEP_DEG),
          sensitivities,
          curves,
          new SecondOpinions(preparation, varied, best).opinions(),
          measured,
          FlatTwin.beside(preparation, bench),
          AssessJob.published(preparation),
          findings.records(),
          Cautions.of(preparation.stack()),
          provenance.build(preparation.seed(), repeat(repeatCommand, found.outcome()), settings()));
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
        aims.first(),
        Aims.efficiency(preparation.model()).orElse(null));
  }

  private void neighbourFailed(String key, String reason) {
    findings.add(
        new Finding(
            "neighbour-failed",
            Severity.WARNING,
            key,
            "designs beside the one found could not be evaluated and are left out of its"
                + " surroundings: "
                + reason));
  }

  private Electrics.Powered powered(Bench bench, Varied shown) {
    return Electrics.power(Outcomes.of(bench, shown.parameters()), bench, pairing);
  }

  private void set(Bench bench, Candidate best) {
    for (int v = 0; v < varied.parameters().size(); v++) {
      bench.set(varied.parameters().get(v), best.values().get(v));
    }
  }

  private List<ConstraintRecord> constraints(Bench bench) {
    Reading reading = new Reading(bench).take();
    return aims.limits().stream().map(limit -> constraint(limit, limit.value(reading))).toList();
  }

  private static ConstraintRecord constraint(Limit limit, double value) {
    return new ConstraintRecord(limit.text(), value, limit.slack(value) < ACTIVE);
  }

  /**
   * The stack as drawn.
   *
   * @param outcome null where it could not be evaluated
   * @param aims value of each aim as people read it; empty where it could not be evaluated
   */
  private record Drawn(@Nullable Outcome outcome, List<Double> aims) {}

  /** When the stack as drawn cannot be evaluated the search's result still counts. */
  private Drawn drawn(Context context) {
    Aims own = context.aims();
    try (Bench bench = context.preparation().model().newBench(own.lightSums())) {
      Outcome outcome =
          powered(bench, context.varied()).outcome().withChoices(context.designs().drawnChoices());
      Reading reading = new Reading(bench).take();
      return new Drawn(
          outcome, own.all().stream().map(aim -> aim.shown(aim.value(reading))).toList());
    } catch (EvaluationFailed e) {
      findings.add(
          new Finding(
              "as-drawn-failed",
              Severity.WARNING,
              "stack as drawn",
              "the stack as drawn could not be evaluated: " + e.getMessage()));
      return new Drawn(null, List.of());
    }
  }

  private void gapNotDecided() {
    boolean variesGap =
        varied.parameters().stream().anyMatch(p -> p.kind() == Parameter.Kind.BANDGAP);
    if (aims.all().size() == 1 && aims.first().isSmallestCurrent() && variesGap) {
      findings.add(
          new Finding(
              "gap-not-decided",
              Severity.WARNING,
              "search.aim",
              "matched current alone cannot decide a bandgap, since thickness trades for it; among designs within %s mA cm⁻² the one with the largest sum of gaps was taken"
                  .formatted(StackObjective.GAP_TIE_MA_PER_CM2)));
    }
  }

  private void limitsBroken(Candidate best) {
    if (!best.isFeasible()) {
      findings.add(
          new Finding(
              "limit-broken",
              Severity.SERIOUS,
              "search.limits",
              "no design was found that keeps every limit; this one comes nearest: widen a range or"
                  + " a limit"));
    }
  }

  private Map<String, String> settings() {
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
