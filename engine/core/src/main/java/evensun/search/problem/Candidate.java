package evensun.search.problem;

import java.util.List;

/**
 * Values and what became of them.
 *
 * @param values [variable] as handed to the objective
 * @param verdict the judgement
 */
public record Candidate(List<Double> values, Verdict verdict) {

  public Candidate {
    values = List.copyOf(values);
  }

  public static Candidate of(double[] values, Verdict verdict) {
    return new Candidate(Numbers.list(values), verdict);
  }

  /** A copy of the values, [variable]. */
  public double[] toArray() {
    return Numbers.array(values);
  }

  /** Whether it could be judged and breaks no limit. */
  public boolean isFeasible() {
    return !verdict.isFailure() && verdict.violation() <= 0;
  }

  /** The first aim; minus infinity for a failure. */
  public double aim() {
    return verdict.isFailure() ? Double.NEGATIVE_INFINITY : verdict.aims().get(0);
  }
}
