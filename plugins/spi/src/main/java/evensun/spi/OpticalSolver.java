package evensun.spi;

/**
 * A method that finds where the light goes in a stack.
 *
 * <p>Implementations are named in {@code META-INF/services/evensun.spi.OpticalSolver} and have a
 * public constructor without arguments. An instance is shared by threads and holds no state of a
 * problem.
 */
public interface OpticalSolver {

  /** Name in scenarios: {@code [a-z][a-z0-9-]*}, unique among the loaded solvers. */
  String id();

  /** What this solver takes and what its evaluators may offer. */
  Traits traits();

  /**
   * Does once what does not change during a search. Whatever a solver cannot take, an option it
   * does not know included, it refuses here and never passes over.
   *
   * @param problem what stays fixed
   * @param start the stack as drawn, a first design; not kept and not written
   * @param services what the host offers, valid as long as the prepared solver is open
   * @return a solver for designs of this problem
   * @throws UnsupportedProblem with what is not supported, why, and what to do instead
   */
  PreparedSolver prepare(Problem problem, Design start, Services services);
}
