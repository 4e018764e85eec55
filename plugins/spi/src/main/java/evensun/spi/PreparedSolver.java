package evensun.spi;

import java.util.List;

/** A solver made ready for one problem; safe for threads. */
public interface PreparedSolver extends AutoCloseable {

  /** The C channels in the order of the absorptance rows of a {@link Response}. */
  List<Channel> channels();

  /** A fresh evaluator with workspaces of its own, for use by one thread at a time. */
  Evaluator newEvaluator();

  /** What a user should know about this design: approximations at their limits, for instance. */
  default List<Finding> examine(Design design) {
    return List.of();
  }

  /** Numbers worth reporting about this design: slices, haze, path enhancement, rays. */
  default List<Quantity> describe(Design design) {
    return List.of();
  }

  /** Releases what the preparation holds. */
  @Override
  default void close() {}
}
