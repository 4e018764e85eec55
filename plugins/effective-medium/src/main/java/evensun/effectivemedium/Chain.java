package evensun.effectivemedium;

import evensun.spi.Design;
import evensun.spi.Evaluator;
import evensun.spi.OpticalSolver;
import evensun.spi.PreparedSolver;
import evensun.spi.Problem;
import evensun.spi.Response;
import evensun.spi.Services;

/** A plan with the solver below prepared for it; safe for threads. */
final class Chain implements AutoCloseable {

  private final Plan plan;
  private final PreparedSolver below;
  private final ChannelMap channels;

  private Chain(Plan plan, PreparedSolver below) {
    this.plan = plan;
    this.below = below;
    channels = new ChannelMap(plan, below.channels());
  }

  /**
   * Prepares the solver below.
   *
   * @param plan the plan
   * @param start the stack as drawn
   * @param solver the solver below
   * @param services of the host
   */
  static Chain of(Plan plan, Design start, OpticalSolver solver, Services services) {
    Fit fit = new Fit(plan);
    fit.update(start);
    Problem plain = plan.plainProblem(solver.traits().features());
    return new Chain(plan, solver.prepare(plain, fit.plain(), services));
  }

  Plan plan() {
    return plan;
  }

  PreparedSolver below() {
    return below;
  }

  ChannelMap channels() {
    return channels;
  }

  ChainedEvaluator newEvaluator() {
    return new ChainedEvaluator(plan, channels, below.newEvaluator());
  }

  /** All spectra of a design. */
  Response spectra(Design design) {
    Response response =
        Response.spectra(
            plan.problem().incidences().size(),
            channels.drawn().size(),
            plan.problem().wavelengthCount());
    try (Evaluator evaluator = newEvaluator()) {
      evaluator.evaluate(design, response);
    }
    return response;
  }

  @Override
  public void close() {
    below.close();
  }
}
