package evensun.testkit;

import java.util.Optional;

/**
 * How a law fared with a solver.
 *
 * @param law name of the law
 * @param promise what it asks for
 * @param status how it ended
 * @param tried number of cases tried
 * @param message what went wrong, why it does not apply, or what was measured; empty when it passed
 * @param smallest the smallest case found that breaks it, where the law is about a stack
 */
public record LawReport(
    String law,
    String promise,
    Status status,
    int tried,
    String message,
    Optional<StackCase> smallest) {

  /** How a law ended. */
  public enum Status {
    /** Every case kept it. */
    PASSED,
    /** A case broke it. */
    FAILED,
    /** The solver promises nothing that the law is about. */
    NOT_PROMISED,
    /** Measured; nothing to pass or fail. */
    INFORMATION
  }

  static LawReport passed(Law law, int tried) {
    return of(law, Status.PASSED, tried, "");
  }

  static LawReport failed(Law law, int tried, String message) {
    return of(law, Status.FAILED, tried, message);
  }

  static LawReport failed(Law law, int tried, String message, StackCase smallest) {
    return new LawReport(
        law.name(), law.promise(), Status.FAILED, tried, message, Optional.of(smallest));
  }

  static LawReport notPromised(Law law, String message) {
    return of(law, Status.NOT_PROMISED, 0, message);
  }

  static LawReport information(Law law, String message) {
    return of(law, Status.INFORMATION, 1, message);
  }

  private static LawReport of(Law law, Status status, int tried, String message) {
    return new LawReport(law.name(), law.promise(), status, tried, message, Optional.empty());
  }
}
