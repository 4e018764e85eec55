package example.beerlambert;

import evensun.spi.Channel;
import evensun.spi.Design;
import evensun.spi.Evaluator;
import evensun.spi.Incidence;
import evensun.spi.Layer;
import evensun.spi.OpticalSolver;
import evensun.spi.PreparedSolver;
import evensun.spi.Problem;
import evensun.spi.Services;
import evensun.spi.Side;
import evensun.spi.Traits;
import evensun.spi.UnsupportedProblem;
import java.util.List;
import java.util.Set;
import java.util.stream.IntStream;

/** An estimate without interference, for light along the normal. Start here: rename and rewrite. */
public final class BeerLambertSolver implements OpticalSolver {

  @Override
  public String id() {
    return "beer-lambert";
  }

  @Override
  public Traits traits() {
    boolean oblique = false;
    boolean incoherent = true;
    boolean statistical = false;
    return new Traits(Set.of(), Set.of(), oblique, incoherent, statistical);
  }

  @Override
  public PreparedSolver prepare(Problem problem, Design start, Services services) {
    refuseWhatItCannotTake(problem);
    return new PreparedSolver() {
      @Override
      public List<Channel> channels() {
        return IntStream.range(0, problem.layerCount()).mapToObj(Channel::of).toList();
      }

      @Override
      public Evaluator newEvaluator() {
        return new BeerLambertEvaluator(problem);
      }
    };
  }

  private static void refuseWhatItCannotTake(Problem problem) {
    if (!problem.options().isEmpty()) {
      throw new UnsupportedProblem("solver beer-lambert takes no options; leave them out");
    }
    for (Incidence incidence : problem.incidences()) {
      if (incidence.angleDeg() != 0 || incidence.side() != Side.FRONT) {
        throw new UnsupportedProblem(
            "solver beer-lambert takes light along the normal from the front only;"
                + " set light.angleDeg to 0 or choose another solver");
      }
    }
    for (Layer layer : problem.layers()) {
      if (!layer.features().isEmpty()) {
        throw new UnsupportedProblem(
            "solver beer-lambert takes flat, pure layers, but \"%s\" is none; choose another solver"
                .formatted(layer.name()));
      }
    }
  }
}
