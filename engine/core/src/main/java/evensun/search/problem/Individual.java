package evensun.search.problem;

import java.util.List;

/**
 * A member of the population.
 *
 * @param birth generation in which it was born
 * @param genes [variable] in [0, 1]
 * @param verdict what became of it
 */
public record Individual(long birth, List<Double> genes, Verdict verdict) {
  public Individual {
    genes = List.copyOf(genes);
  }

  public boolean isFeasible() {
    return !verdict.isFailure() && verdict.violation() <= 0;
  }

  public double[] geneArray() {
    return Numbers.array(genes);
  }
}
