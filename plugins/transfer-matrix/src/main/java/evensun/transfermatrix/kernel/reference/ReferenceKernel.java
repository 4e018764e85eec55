package evensun.transfermatrix.kernel.reference;

import evensun.transfermatrix.kernel.Beam;
import evensun.transfermatrix.kernel.FastKernel;
import evensun.transfermatrix.kernel.Kernel;
import evensun.transfermatrix.kernel.Layout;
import evensun.transfermatrix.kernel.Spectra;

/**
 * The kernel to read: one wavelength at a time, complex numbers as objects, reflection ratios
 * instead of wave pairs. It allocates and is some thirty times slower than {@link FastKernel}; it
 * serves as second opinion, and as the source of depth profiles.
 */
public final class ReferenceKernel implements Kernel {

  private final double[] wavelengthNm;

  /** For these vacuum wavelengths in nm. */
  public ReferenceKernel(double[] wavelengthNm) {
    this.wavelengthNm = wavelengthNm.clone();
  }

  @Override
  public void solve(
      Layout layout, Beam beam, double[][] n, double[][] k, long[] revision, Spectra into) {
    for (int w = 0; w < wavelengthNm.length; w++) {
      clear(layout, w, into);
      if (beam.s() > 0) {
        add(lit(layout, beam, n, k, w, false), layout, beam.s(), w, into);
      }
      if (beam.p() > 0) {
        add(lit(layout, beam, n, k, w, true), layout, beam.p(), w, into);
      }
    }
  }

  private LitStack lit(Layout layout, Beam beam, double[][] n, double[][] k, int w, boolean p) {
    return new LitStack(new Slabs(layout, beam, n, k, w, wavelengthNm[w], p));
  }

  private static void clear(Layout layout, int w, Spectra into) {
    if (into.reflectance != null) {
      into.reflectance[w] = 0;
    }
    if (into.transmittance != null) {
      into.transmittance[w] = 0;
    }
    for (int j = 1; j <= layout.layerCount; j++) {
      double[] row = into.absorptance[layout.layer[j]];
      if (row != null) {
        row[w] = 0;
      }
    }
  }

  private static void add(LitStack lit, Layout layout, double share, int w, Spectra into) {
    if (into.reflectance != null) {
      into.reflectance[w] += share * lit.reflectance();
    }
    if (into.transmittance != null) {
      into.transmittance[w] += share * lit.transmittance();
    }
    for (int j = 1; j <= layout.layerCount; j++) {
      double[] row = into.absorptance[layout.layer[j]];
      if (row != null) {
        row[w] += share * lit.absorptance(j);
      }
    }
  }

  /**
   * Absorption against depth in one layer.
   *
   * @param j the layer's place in the layout, in [1, N]
   * @param depthNm [z] depth in nm from the face the light meets first, in [0, thickness]
   * @param into [z][w] share of the light absorbed per nm
   */
  public void depth(
      Layout layout,
      Beam beam,
      double[][] n,
      double[][] k,
      int j,
      double[] depthNm,
      double[][] into) {
    for (int w = 0; w < wavelengthNm.length; w++) {
      LitStack s = beam.s() > 0 ? lit(layout, beam, n, k, w, false) : null;
      LitStack p = beam.p() > 0 ? lit(layout, beam, n, k, w, true) : null;
      for (int z = 0; z < depthNm.length; z++) {
        into[z][w] = share(beam.s(), s, j, depthNm[z]) + share(beam.p(), p, j, depthNm[z]);
      }
    }
  }

  private static double share(double weight, LitStack lit, int j, double depthNm) {
    return lit == null ? 0 : weight * lit.absorbedPerNm(j, depthNm);
  }

  /**
   * The largest share of the light, over all wavelengths, that each incoherent layer takes because
   * incident and reflected waves at its faces are not independent.
   *
   * @param largest [l] raised to the share found, by index of the layer in the problem
   */
  public void mixedTerms(Layout layout, Beam beam, double[][] n, double[][] k, double[] largest) {
    for (int w = 0; w < wavelengthNm.length; w++) {
      LitStack s = beam.s() > 0 ? lit(layout, beam, n, k, w, false) : null;
      LitStack p = beam.p() > 0 ? lit(layout, beam, n, k, w, true) : null;
      for (int j = 1; j <= layout.layerCount; j++) {
        if (!layout.coherent[j]) {
          double term = mixed(beam.s(), s, j) + mixed(beam.p(), p, j);
          int l = layout.layer[j];
          largest[l] = Math.max(largest[l], Math.abs(term));
        }
      }
    }
  }

  private static double mixed(double weight, LitStack lit, int j) {
    return lit == null ? 0 : weight * lit.mixedTerm(j);
  }
}
