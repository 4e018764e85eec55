package evensun.transfermatrix.kernel;

/** Finds where the light of a beam goes in a stack; one thread at a time. */
public interface Kernel {

  /**
   * Fills the wanted rows.
   *
   * @param layout the media in the order the light meets them
   * @param beam the light
   * @param n [m][w] refractive index, greater than 0
   * @param k [m][w] extinction coefficient, at least 0
   * @param revision [m] equal only if row m of n and k is; 0 is equal to nothing
   * @param into rows to fill
   */
  void solve(Layout layout, Beam beam, double[][] n, double[][] k, long[] revision, Spectra into);
}
