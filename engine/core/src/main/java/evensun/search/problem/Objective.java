package evensun.search.problem;

import java.util.List;

/** What is wanted, as numbers in and numbers out; safe for threads. */
public interface Objective {

  /** The numbers that may vary, in the order of the values handed to a worker. */
  List<Variable> variables();

  /** Names of the aims, at least one; all are made as large as possible. */
  List<String> aims();

  /** Names of the limits whose slacks a verdict tells, in its order. */
  default List<String> limits() {
    return List.of();
  }

  /**
   * Candidates whose first aims differ by less than this are ranked by their tie-break; in the unit
   * of the first aim, 0 for none.
   */
  default double tieResolution() {
    return 0;
  }

  /** A fresh worker for one thread. */
  Worker newWorker();

  /** Judges candidates, one thread at a time; the verdict depends on the values alone. */
  interface Worker extends AutoCloseable {

    /**
     * Judges one candidate.
     *
     * @param values [variable] within the bounds; not kept
     */
    Verdict judge(double[] values);

    /**
     * The parts whose smallest is the first aim, with their derivatives, when both are known; an
     * aim of another form, or a solver without derivatives, has none.
     *
     * @param values [variable]
     * @param parts [part] out
     * @param gradient [part][variable] out
     * @return whether parts and gradient were written
     */
    default boolean parts(double[] values, double[] parts, double[][] gradient) {
      return false;
    }

    /** Number of parts that {@link #parts} writes. */
    default int partCount() {
      return 0;
    }

    @Override
    default void close() {}
  }
}
