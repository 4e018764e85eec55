package evensun.search.problem;

import java.util.Arrays;

/** Genes that can be looked up: equal exactly when every number is. */
public final class GeneKey {
  private final double[] genes;

  public GeneKey(double[] genes) {
    this.genes = genes;
  }

  @Override
  public boolean equals(Object other) {
    return other instanceof GeneKey key && Arrays.equals(genes, key.genes);
  }

  @Override
  public int hashCode() {
    return Arrays.hashCode(genes);
  }
}
