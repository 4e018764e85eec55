package evensun.transfermatrix;

import evensun.spi.OpticalSolver;
import evensun.testkit.junit.SolverContract;

/** The solver keeps every law of the contract. */
class ContractTest extends SolverContract {

  @Override
  protected OpticalSolver solver() {
    return new TransferMatrixSolver();
  }
}
