package evensun.spi;

import java.util.Optional;

/** What the host offers to a solver while it prepares and evaluates; safe for threads. */
public interface Services {

  /**
   * Another loaded solver, to hand a simpler problem on to.
   *
   * @param id the other solver's {@link OpticalSolver#id()}
   * @return the solver, or empty when none of that name is loaded
   */
  Optional<OpticalSolver> solver(String id);

  /** True once the user asked to stop; poll it in preparations that take longer than a second. */
  boolean cancelled();
}
