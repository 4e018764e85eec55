package evensun.spi;

import java.util.List;
import java.util.Optional;

/** Answers designs, one thread at a time, without allocating. */
public interface Evaluator extends AutoCloseable {

  /**
   * Finds where the light goes.
   *
   * <p>The answer is a function of the design alone: the same numbers give the same bits, whatever
   * was asked before and on whichever thread.
   *
   * @param design the candidate; not written, not kept
   * @param into where the answer goes; rows that are {@code null} are not wanted
   * @throws EvaluationFailed when this design alone cannot be evaluated; every other exception
   *     counts as a defect of the solver
   */
  void evaluate(Design design, Response into);

  /**
   * Answers several designs; a solver behind a process overrides it to send them together.
   *
   * @param designs the candidates
   * @param into one response per design, in the same order
   */
  default void evaluateAll(List<Design> designs, List<Response> into) {
    for (int i = 0; i < designs.size(); i++) {
      evaluate(designs.get(i), into.get(i));
    }
  }

  /**
   * A further ability such as {@link Gradient}, sharing this evaluator's workspaces and thread. A
   * solver in a chain forwards what its inner solver offers where it can.
   *
   * @param type the interface of the ability
   * @return the ability, or empty
   */
  default <A> Optional<A> ability(Class<A> type) {
    return Optional.empty();
  }

  /** Releases the workspaces. */
  @Override
  default void close() {}
}
