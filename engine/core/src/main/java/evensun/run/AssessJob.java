package evensun.run;

import evensun.evaluation.AngleSweep;
import evensun.evaluation.Bench;
import evensun.evaluation.DepthProfiles;
import evensun.evaluation.Model;
import evensun.evaluation.Outcomes;
import evensun.result.Angular;
import evensun.result.DepthLayer;
import evensun.result.Outcome;
import evensun.result.RunResult;
import java.util.List;
import java.util.Map;
import org.jspecify.annotations.Nullable;

/** The stack as drawn, without a search. */
public final class AssessJob {

  private final Preparation preparation;
  private final boolean full;

  /**
   * An assessment.
   *
   * @param preparation the scenario made ready
   * @param full whether to add what only a report shows: depth profiles and angles
   */
  public AssessJob(Preparation preparation, boolean full) {
    this.preparation = preparation;
    this.full = full;
  }

  /**
   * Evaluates the stack.
   *
   * @param repeatCommand command that repeats this
   * @throws evensun.spi.EvaluationFailed when the solver cannot evaluate it
   */
  public RunResult run(String repeatCommand) {
    ProvenanceBuilder provenance = new ProvenanceBuilder(preparation);
    Model model = preparation.model();
    try (Bench bench = model.newBench()) {
      Outcome outcome = Outcomes.of(bench, List.of());
      Findings findings = new Findings();
      findings.about(preparation.stack(), model, bench.design());
      findings.about(outcome);
      return new RunResult(
          RunResult.FORMAT,
          "assess",
          preparation.stack().scenario().title(),
          outcome,
          null,
          null,
          Usage.materials(bench),
          Usage.spectrum(preparation.stack()),
          full ? depth(bench) : null,
          full ? angular(preparation, bench) : null,
          null,
          null,
          null,
          findings.records(),
          Cautions.of(preparation.stack()),
          provenance.build(null, repeatCommand, Map.of()));
    }
  }

  static @Nullable List<DepthLayer> depth(Bench bench) {
    return DepthProfiles.of(bench).orElse(null);
  }

  /**
   * Currents against angle for the bench's design; null where the solver takes no oblique light.
   */
  static @Nullable Angular angular(Preparation preparation, Bench bench) {
    boolean useful =
        preparation.choice().solver().traits().oblique()
            && !preparation.choice().solver().traits().statistical()
            && !preparation.stack().isMonochromatic();
    if (!useful) {
      return null;
    }
    try (Model model = preparation.modelFor(AngleSweep.incidences(preparation.model(), 5));
        Bench oblique = model.newBench()) {
      oblique.copyFrom(bench);
      return AngleSweep.of(oblique);
    }
  }
}
