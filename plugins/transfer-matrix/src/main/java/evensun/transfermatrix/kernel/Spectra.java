package evensun.transfermatrix.kernel;

/**
 * The rows a caller wants filled for one beam; null rows are neither found nor written.
 *
 * <p>Rows of absent layers are left alone.
 */
public final class Spectra {

  /** [w] reflectance, or null. */
  public double[] reflectance;

  /** [w] net flux into the medium behind, or null. */
  public double[] transmittance;

  /** [l][w] absorptance by index of the layer in the problem, or null rows. */
  public final double[][] absorptance;

  /** Wants nothing yet, of {@code layers} layers. */
  public Spectra(int layers) {
    absorptance = new double[layers][];
  }
}
