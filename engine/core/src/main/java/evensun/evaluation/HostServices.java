package evensun.evaluation;

import evensun.spi.OpticalSolver;
import evensun.spi.Services;
import java.util.Optional;
import java.util.function.BooleanSupplier;
import java.util.function.Function;

/**
 * What the host offers to solvers.
 *
 * @param lookup finds a loaded solver by id
 * @param stop whether the user asked to stop
 */
public record HostServices(Function<String, Optional<OpticalSolver>> lookup, BooleanSupplier stop)
    implements Services {

  @Override
  public Optional<OpticalSolver> solver(String id) {
    return lookup.apply(id);
  }

  @Override
  public boolean cancelled() {
    return stop.getAsBoolean();
  }
}
