package evensun.testkit.junit;

import evensun.spi.OpticalSolver;
import evensun.spi.Services;
import evensun.testkit.LawReport;
import evensun.testkit.LawReport.Status;
import evensun.testkit.Laws;
import evensun.testkit.Subject;
import java.util.Map;
import java.util.stream.Stream;
import org.junit.jupiter.api.Assertions;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.TestFactory;

/** Extend it and name a solver: every law of the contract becomes a test. */
public abstract class SolverContract {

  /** The solver on trial. */
  protected abstract OpticalSolver solver();

  /** What the host would offer; override it when the solver hands on to others. */
  protected Services services() {
    return Subject.noServices();
  }

  /** What a scenario would say under {@code solver.options}; override it when there is need. */
  protected Map<String, String> options() {
    return Map.of();
  }

  @TestFactory
  Stream<DynamicTest> keepsTheContract() {
    Subject subject = new Subject(solver(), services(), options());
    return Laws.all().stream()
        .map(
            law ->
                DynamicTest.dynamicTest(
                    law.name() + ": " + law.promise(), () -> verify(law.check(subject))));
  }

  private static void verify(LawReport report) {
    if (report.status() == Status.FAILED) {
      Assertions.fail(report.message() + report.smallest().map(c -> " for " + c).orElse(""));
    }
  }
}
