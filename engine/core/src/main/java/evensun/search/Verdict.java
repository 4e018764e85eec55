package evensun.search;

import java.util.List;

/**
 * What became of one candidate.
 *
 * @param aims [aim] values, all to be made as large as possible; ignored for a failure
 * @param tieBreak decides between candidates whose first aims differ by less than the resolution of
 *     the objective; larger is better
 * @param violation sum of the constraint violations, 0 when all are kept
 * @param failure why it could not be evaluated, empty when it could
 */
public record Verdict(List<Double> aims, double tieBreak, double violation, String failure) {

  public Verdict {
    aims = List.copyOf(aims);
  }

  /** A candidate that could be evaluated and breaks no constraint. */
  public static Verdict of(double aim, double tieBreak) {
    return new Verdict(List.of(aim), tieBreak, 0, "");
  }

  /** A candidate that could not be evaluated. */
  public static Verdict failed(String reason) {
    return new Verdict(List.of(), 0, 0, reason);
  }

  /** Whether it could not be evaluated. */
  public boolean isFailure() {
    return !failure.isEmpty();
  }
}
