package evensun.bench;

import evensun.spi.OpticalSolver;
import evensun.spi.Services;
import java.util.Optional;

/** A host that offers nothing. */
final class NoServices implements Services {

  @Override
  public Optional<OpticalSolver> solver(String id) {
    return Optional.empty();
  }

  @Override
  public boolean cancelled() {
    return false;
  }
}
