package evensun.run;

import evensun.evaluation.AngleSweep;
import evensun.evaluation.Bench;
import evensun.evaluation.DepthProfiles;
import evensun.evaluation.Model;
import evensun.evaluation.Outcomes;
import evensun.pluginhost.PluginHost;
import evensun.result.Angular;
import evensun.result.DepthLayer;
import evensun.result.Measured;
import evensun.result.Outcome;
import evensun.result.Published;
import evensun.result.RunResult;
import evensun.spi.Services;
import evensun.verify.PublishedValues;
import java.util.List;
import java.util.Map;
import org.jspecify.annotations.Nullable;

/** The stack as drawn, without a search. */
public final class AssessJob {

  /** Step of the angles in a report, in degrees. */
  public static final double USUAL_ANGLE_STEP_DEG = 5;

  private final Preparation preparation;
  private final boolean full;
  private final double angleStepDeg;

  /**
   * An assessment.
   *
   * @param preparation the scenario made ready
   * @param full whether to add generation against depth and the comparison with published values
   * @param angleStepDeg step of the angles to add in degrees, 0 for none
   */
  public AssessJob(Preparation preparation, boolean full, double angleStepDeg) {
    this.preparation = preparation;
    this.full = full;
    this.angleStepDeg = angleStepDeg;
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
      Electrics.Powered powered = Electrics.power(Outcomes.of(bench, List.of()), bench);
      Outcome outcome = powered.outcome();
      Findings findings = new Findings();
      findings.addAll(powered.findings());
      findings.about(bench);
      findings.about(outcome);
      findings.aboutErrors(outcome, false);
      List<Measured> measured = preparation.measurements().against(outcome, findings);
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
          angleStepDeg > 0 ? angular(preparation, bench, angleStepDeg) : null,
          null,
          null,
          null,
          measured,
          FlatTwin.beside(preparation, bench),
          full ? published(preparation) : null,
          findings.records(),
          Cautions.of(preparation.stack()),
          provenance.build(
              preparation.choice().statistical() ? preparation.seed() : null,
              repeatCommand,
              Map.of()));
    }
  }

  /**
   * Published values beside computed ones, those of rays where the run traces rays; null where the
   * solver of flat stacks is not loaded.
   */
  static @Nullable List<Published> published(Preparation preparation) {
    PluginHost host = preparation.host();
    Services services = host.services(() -> false);
    boolean rays = preparation.choice().statistical();
    return host.solver(SolverChoice.FLAT)
        .map(
            flat ->
                rays
                    ? PublishedValues.all(flat, services)
                    : PublishedValues.withoutRays(flat, services))
        .map(PublishedValues::compared)
        .orElse(null);
  }

  static @Nullable List<DepthLayer> depth(Bench bench) {
    return DepthProfiles.of(bench).orElse(null);
  }

  /**
   * Currents against angle for the bench's design; null where the solver takes no oblique light.
   */
  static @Nullable Angular angular(Preparation preparation, Bench bench, double stepDeg) {
    boolean useful =
        preparation.choice().solver().traits().oblique()
            && !preparation.choice().statistical()
            && !preparation.stack().scenario().light().diffuse()
            && !preparation.stack().isMonochromatic();
    if (!useful) {
      return null;
    }
    try (Model model = preparation.modelFor(AngleSweep.incidences(preparation.model(), stepDeg));
        Bench oblique = model.newBench()) {
      oblique.copyFrom(bench);
      return AngleSweep.of(oblique);
    }
  }
}
