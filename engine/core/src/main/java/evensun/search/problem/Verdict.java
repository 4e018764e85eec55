package evensun.search.problem;

import java.util.List;

/**
 * What became of one candidate.
 *
 * @param aims [aim] values, all to be made as large as possible; ignored for a failure
 * @param tieBreak decides between candidates whose first aims differ by less than the resolution of
 *     the objective; larger is better
 * @param violation sum of the constraint violations, 0 when all are kept
 * @param slacks [limit] distance to each limit of the objective, negative where it is broken; empty
 *     when the objective has none
 * @param failure why it could not be evaluated, empty when it could; what stands before the first
 *     colon is the kind of failure
 */
public record Verdict(
    List<Double> aims, double tieBreak, double violation, List<Double> slacks, String failure) {

  public Verdict {
    aims = List.copyOf(aims);
    slacks = List.copyOf(slacks);
  }

  /** A verdict of an objective without limits, or one that does not tell its slacks. */
  public Verdict(List<Double> aims, double tieBreak, double violation, String failure) {
    this(aims, tieBreak, violation, List.of(), failure);
  }

  /** A candidate that could be evaluated and breaks no constraint. */
  public static Verdict of(double aim, double tieBreak) {
    return new Verdict(List.of(aim), tieBreak, 0, "");
  }

  /**
   * A candidate under limits; the violation is the sum of what is missing.
   *
   * @param slacks [limit] negative where the limit is broken
   */
  public static Verdict under(List<Double> slacks, List<Double> aims, double tieBreak) {
    double violation = slacks.stream().mapToDouble(slack -> Math.max(0, -slack)).sum();
    return new Verdict(aims, tieBreak, violation, slacks, "");
  }

  /** A candidate that could not be evaluated. */
  public static Verdict failed(String reason) {
    return new Verdict(List.of(), 0, 0, reason.isEmpty() ? "unknown reason" : reason);
  }

  /** Whether it could not be evaluated. */
  public boolean isFailure() {
    return !failure.isEmpty();
  }

  /** Kind of the failure: its reason up to the first colon. */
  public String failureKind() {
    int colon = failure.indexOf(':');
    return colon < 0 ? failure : failure.substring(0, colon);
  }
}
