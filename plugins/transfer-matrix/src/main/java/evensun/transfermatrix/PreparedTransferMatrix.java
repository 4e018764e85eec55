package evensun.transfermatrix;

import evensun.spi.Channel;
import evensun.spi.Design;
import evensun.spi.Evaluator;
import evensun.spi.Finding;
import evensun.spi.PreparedSolver;
import evensun.spi.Problem;
import java.util.ArrayList;
import java.util.List;

/** A problem that was found fit; immutable. */
final class PreparedTransferMatrix implements PreparedSolver {

  private final Problem problem;
  private final Options options;
  private final List<Channel> channels;

  PreparedTransferMatrix(Problem problem, Options options) {
    this.problem = problem;
    this.options = options;
    List<Channel> layers = new ArrayList<>();
    for (int l = 0; l < problem.layerCount(); l++) {
      layers.add(Channel.of(l));
    }
    channels = List.copyOf(layers);
  }

  @Override
  public List<Channel> channels() {
    return channels;
  }

  @Override
  public Evaluator newEvaluator() {
    return new TransferMatrixEvaluator(problem, options.kernel());
  }

  @Override
  public List<Finding> examine(Design design) {
    return MixedTerms.examine(problem, design);
  }
}
