package evensun.search.problem;

/**
 * What the genetic algorithm compares: a failure ranks behind every design, a design that breaks a
 * limit behind every one that breaks less, and the aim decides among those that keep all limits.
 */
public final class Fitness implements Comparable<Fitness> {

  /** Violation of a failure; larger than any that an objective reports. */
  private static final double FAILED = Double.MAX_VALUE;

  public final Verdict verdict;
  public final double violation;
  public final double first;
  final double second;

  private Fitness(Verdict verdict, double violation, double first, double second) {
    this.verdict = verdict;
    this.violation = violation;
    this.first = first;
    this.second = second;
  }

  /**
   * The fitness of a verdict.
   *
   * @param floor first aims at or above it count as equally good and the tie-break decides; minus
   *     infinity is the usual case in which the first aim decides
   */
  public static Fitness of(Verdict verdict, double floor) {
    if (verdict.isFailure()) {
      return new Fitness(verdict, FAILED, Double.NEGATIVE_INFINITY, 0);
    }
    double aim = verdict.aims().get(0);
    if (floor == Double.NEGATIVE_INFINITY) {
      return new Fitness(verdict, verdict.violation(), aim, verdict.tieBreak());
    }
    double below = Math.max(0, floor - aim);
    return new Fitness(verdict, verdict.violation() + below, verdict.tieBreak(), aim);
  }

  public boolean isFeasible() {
    return violation <= 0;
  }

  /** Number of aims; none for a failure, and failures share one violation and one front. */
  public int objectiveCount() {
    return verdict.isFailure() ? 0 : verdict.aims().size();
  }

  public double objective(int aim) {
    return verdict.aims().get(aim);
  }

  @Override
  public int compareTo(Fitness other) {
    if (violation != other.violation) {
      return Double.compare(other.violation, violation);
    }
    int byFirst = Double.compare(first, other.first);
    return byFirst != 0 ? byFirst : Double.compare(second, other.second);
  }

  @Override
  public boolean equals(Object other) {
    return other instanceof Fitness that && verdict.equals(that.verdict) && first == that.first;
  }

  @Override
  public int hashCode() {
    return verdict.hashCode();
  }
}
