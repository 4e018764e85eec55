package evensun.testkit;

import evensun.spi.Channel;
import evensun.spi.DepthProfile;
import evensun.spi.Design;
import evensun.spi.Evaluator;
import evensun.spi.Gradient;
import evensun.spi.Layer;
import evensun.spi.Mixture;
import evensun.spi.OpticalSolver;
import evensun.spi.PreparedSolver;
import evensun.spi.Problem;
import evensun.spi.Scatter;
import evensun.spi.Services;
import evensun.spi.Texture;
import evensun.spi.Traits;
import evensun.spi.UnsupportedProblem;
import java.util.List;
import java.util.Set;
import java.util.stream.IntStream;

/**
 * A beam down and a beam up through every layer, no interference: the simplest solver that keeps
 * every law. Built with a flaw it breaks one.
 */
final class TwoBeam implements OpticalSolver {

  /** Kinds of features that it takes, at their limits alone, where they make no difference. */
  private static final Set<String> KINDS = Set.of(Mixture.KIND, Scatter.KIND, Texture.KIND);

  private final Flaw flaw;

  TwoBeam(Flaw flaw) {
    this.flaw = flaw;
  }

  @Override
  public String id() {
    return "two-beam";
  }

  @Override
  public Traits traits() {
    return new Traits(KINDS, Set.of(Gradient.class, DepthProfile.class), true, true, false);
  }

  @Override
  public PreparedSolver prepare(Problem problem, Design start, Services services) {
    if (!problem.options().isEmpty() && flaw != Flaw.IGNORES_UNKNOWN_OPTIONS) {
      throw new UnsupportedProblem("two-beam takes no options; leave them out");
    }
    for (Layer layer : problem.layers()) {
      if (!layer.features().stream().allMatch(f -> KINDS.contains(f.kind()))
          && flaw != Flaw.IGNORES_UNKNOWN_FEATURES) {
        throw new UnsupportedProblem("two-beam takes no such features; choose another solver");
      }
    }
    TwoBeamEvaluator shared = new TwoBeamEvaluator(problem, flaw);
    return new PreparedSolver() {
      @Override
      public List<Channel> channels() {
        return IntStream.range(0, problem.layerCount()).mapToObj(Channel::of).toList();
      }

      @Override
      public Evaluator newEvaluator() {
        return flaw == Flaw.SHARES_A_WORKSPACE ? shared : new TwoBeamEvaluator(problem, flaw);
      }
    };
  }
}
