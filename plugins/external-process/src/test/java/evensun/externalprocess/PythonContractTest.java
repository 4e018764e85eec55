package evensun.externalprocess;

import evensun.spi.OpticalSolver;
import evensun.testkit.junit.SolverContract;
import java.nio.file.Path;
import java.util.Map;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.Assumptions;
import org.junit.jupiter.api.BeforeAll;

/** The example program of the template keeps every law of the contract. */
class PythonContractTest extends SolverContract {

  @BeforeAll
  static void findPython() throws InterruptedException {
    System.setProperty(
        "evensun.programs", Path.of("..", "template", "python").toAbsolutePath().toString());
    boolean found;
    try {
      found = new ProcessBuilder("python3", "--version").start().waitFor() == 0;
    } catch (java.io.IOException e) {
      found = false;
    }
    Assumptions.assumeTrue(found, "SKIPPED: no python3 in PATH, the Python example is not tried");
  }

  @AfterAll
  static void forget() {
    System.clearProperty("evensun.programs");
  }

  @Override
  protected OpticalSolver solver() {
    return new ExternalProcessSolver();
  }

  @Override
  protected Map<String, String> options() {
    return Map.of("program", "two_beam.py");
  }
}
