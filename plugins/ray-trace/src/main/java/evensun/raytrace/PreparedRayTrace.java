package evensun.raytrace;

import evensun.spi.Channel;
import evensun.spi.Design;
import evensun.spi.EvaluationFailed;
import evensun.spi.Evaluator;
import evensun.spi.Finding;
import evensun.spi.PreparedSolver;
import evensun.spi.Problem;
import evensun.spi.Quantity;
import evensun.spi.Services;
import evensun.spi.UnsupportedProblem;
import java.util.List;
import java.util.stream.IntStream;

/** The solver made ready for a stack that needs rays. */
final class PreparedRayTrace implements PreparedSolver {

  private final Problem problem;
  private final Services services;
  private final Traces traces;
  private final List<Channel> channels;

  PreparedRayTrace(Problem problem, Design start, Options options, Services services) {
    this.problem = problem;
    this.services = services;
    channels = IntStream.range(0, problem.layerCount()).mapToObj(Channel::of).toList();
    try {
      traces = new Traces(problem, RayCounts.choose(problem, start, options, services));
    } catch (EvaluationFailed e) {
      throw new UnsupportedProblem(e.getMessage());
    }
  }

  @Override
  public List<Channel> channels() {
    return channels;
  }

  @Override
  public Evaluator newEvaluator() {
    return new RayEvaluator(problem, services, traces);
  }

  @Override
  public List<Finding> examine(Design design) {
    try (RayEvaluator evaluator = new RayEvaluator(problem, services, traces)) {
      return new Validity(problem, design, evaluator).all();
    }
  }

  @Override
  public List<Quantity> describe(Design design) {
    try (RayEvaluator evaluator = new RayEvaluator(problem, services, traces)) {
      return new Facts(problem, design, evaluator).all();
    }
  }
}
