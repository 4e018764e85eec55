package evensun.raytrace;

import evensun.spi.OpticalSolver;
import evensun.spi.Services;
import evensun.testkit.junit.SolverContract;

/** Every law of the contract. */
class ContractTest extends SolverContract {

  @Override
  protected OpticalSolver solver() {
    return new RayTraceSolver();
  }

  @Override
  protected Services services() {
    return Stacks.services();
  }
}
