package evensun.effectivemedium;

import evensun.spi.OpticalSolver;
import evensun.spi.Services;
import evensun.testkit.Subject;
import evensun.testkit.junit.SolverContract;
import evensun.transfermatrix.TransferMatrixSolver;

/** The solver keeps every law of the contract on stacks that need no replacing. */
class ContractTest extends SolverContract {

  @Override
  protected OpticalSolver solver() {
    return new EffectiveMediumSolver();
  }

  @Override
  protected Services services() {
    return Subject.with(new TransferMatrixSolver());
  }
}
