package evensun.raytrace;

import evensun.spi.Channel;
import evensun.spi.Design;
import evensun.spi.Evaluator;
import evensun.spi.Finding;
import evensun.spi.Incidence;
import evensun.spi.PreparedSolver;
import evensun.spi.Problem;
import evensun.spi.Services;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;

/**
 * A stack whose boundaries are all planes: light keeps its direction, so that the solver below
 * answers it without rays and without statistics. Diffuse light is a sum over directions.
 */
final class FlatStack implements PreparedSolver {

  private final Problem problem;
  private final List<Incidence> directions = new ArrayList<>();
  private final List<Double> weights = new ArrayList<>();
  private final int[] first; // [i] first direction of an incidence
  private final PreparedSolver below;

  FlatStack(Problem problem, Design start, Services services) {
    this.problem = problem;
    first = new int[problem.incidences().size() + 1];
    for (int i = 0; i < problem.incidences().size(); i++) {
      add(problem.incidences().get(i));
      first[i + 1] = directions.size();
    }
    below =
        TransferMatrix.from(services)
            .prepare(problem.withIncidences(directions).withOptions(Map.of()), start, services);
  }

  private void add(Incidence incidence) {
    if (!incidence.diffuse()) {
      directions.add(incidence);
      weights.add(1.0);
      return;
    }
    for (int i = 0; i < Lambert.COSINES.length; i++) {
      double angleDeg = Math.toDegrees(Math.acos(Lambert.COSINES[i]));
      directions.add(new Incidence(angleDeg, incidence.polarisation(), incidence.side()));
      weights.add(Lambert.WEIGHTS[i]);
    }
  }

  Problem problem() {
    return problem;
  }

  int directions() {
    return directions.size();
  }

  int first(int incidence) {
    return first[incidence];
  }

  double weight(int direction) {
    return weights.get(direction);
  }

  Evaluator newEvaluatorBelow() {
    return below.newEvaluator();
  }

  @Override
  public List<Channel> channels() {
    return below.channels();
  }

  @Override
  public Evaluator newEvaluator() {
    return new FlatEvaluator(this);
  }

  @Override
  public List<Finding> examine(Design design) {
    return below.examine(design);
  }

  @Override
  public void close() {
    below.close();
  }
}
