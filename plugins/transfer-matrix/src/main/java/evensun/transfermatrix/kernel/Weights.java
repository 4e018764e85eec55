package evensun.transfermatrix.kernel;

/**
 * Weights of the sums that a gradient is wanted of; rows are the caller's, null rows are zero.
 *
 * <p>Sum s is Σ_l Σ_w absorptance[s][l][w]·A_l(w) + Σ_w transmittance[s][w]·T(w).
 */
public final class Weights {

  /** S. */
  public final int sums;

  /** [s][l][w] weights of absorptance, or null rows. */
  public final double[][][] absorptance;

  /** [s][w] weights of transmittance, or null rows. */
  public final double[][] transmittance;

  /** Weights that are all zero. */
  public Weights(int sums, int layers) {
    this.sums = sums;
    absorptance = new double[sums][layers][];
    transmittance = new double[sums][];
  }
}
