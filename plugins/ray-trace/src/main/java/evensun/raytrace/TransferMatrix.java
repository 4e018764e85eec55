package evensun.raytrace;

import evensun.spi.OpticalSolver;
import evensun.spi.Services;
import evensun.spi.UnsupportedProblem;

/** The solver of thin films below this one. */
final class TransferMatrix {

  private static final String ID = "transfer-matrix";

  private TransferMatrix() {}

  static OpticalSolver from(Services services) {
    return services
        .solver(ID)
        .orElseThrow(
            () ->
                new UnsupportedProblem(
                    "solver ray-trace asks solver "
                        + ID
                        + " for the films, which is not loaded; evensun plugins lists those that are"));
  }
}
