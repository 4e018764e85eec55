package evensun.transfermatrix.kernel;

import java.util.Arrays;

/**
 * The kernel for searches: loops over wavelengths that the JIT compiler turns into vector
 * instructions, nothing allocated per design, and what materials decide kept while they stay.
 *
 * <p>The result depends on the numbers of the call alone, to the last bit: what is kept is what
 * would be found again. It keeps the coefficients of one beam; calls that change beams are right
 * but slower.
 */
public final class FastKernel implements Kernel {

  private final int layers;
  private final int thickLayers;
  private final int wavelengths;
  private final MediumRows media;
  private final Phases phases;
  private final Optics s;
  private final Optics p;
  private final Intensities stack;
  private StackGradient gradient; // made when first asked for

  /**
   * A kernel with its workspaces.
   *
   * @param wavelengthNm vacuum wavelengths in nm
   * @param coherent [l] whether waves interfere in a layer
   * @param materials number of materials
   */
  public FastKernel(double[] wavelengthNm, boolean[] coherent, int materials) {
    layers = coherent.length;
    wavelengths = wavelengthNm.length;
    int thick = 0;
    for (boolean c : coherent) {
      thick += c ? 0 : 1;
    }
    thickLayers = thick;
    media = new MediumRows(wavelengthNm.clone(), materials);
    phases = new Phases(layers, wavelengths);
    s = new Optics(media, phases, media.s, new Faces(layers, wavelengths));
    p = new Optics(media, phases, media.p, new Faces(layers, wavelengths));
    stack = new Intensities(layers, thickLayers, wavelengths);
  }

  @Override
  public void solve(
      Layout layout, Beam beam, double[][] n, double[][] k, long[] revision, Spectra into) {
    media.refresh(layout, beam, n, k, revision);
    phases.refresh(layout, media);
    if (beam.s() > 0) {
      solve(s, layout, beam.s(), false, into);
    }
    if (beam.p() > 0) {
      solve(p, layout, beam.p(), beam.s() > 0, into);
    }
  }

  private void solve(Optics optics, Layout layout, double share, boolean add, Spectra into) {
    optics.refresh(layout);
    stack.solve(optics, share, into);
    stack.report(optics, add, into);
  }

  /**
   * Fills the wanted rows and finds the derivatives of weighted sums.
   *
   * @param into rows to fill; those of weighted layers must be wanted
   * @param derivative [s*L + l] derivative of sum s by the thickness of layer l, per nm
   */
  public void differentiate(
      Layout layout,
      Beam beam,
      double[][] n,
      double[][] k,
      long[] revision,
      Spectra into,
      Weights weights,
      double[] derivative) {
    Arrays.fill(derivative, 0, weights.sums * layers, 0);
    if (gradient == null) {
      gradient = new StackGradient(stack, layers, thickLayers, wavelengths);
    }
    media.refresh(layout, beam, n, k, revision);
    phases.refresh(layout, media);
    if (beam.s() > 0) {
      solve(s, layout, beam.s(), false, into);
      gradient.add(s, weights, layers, derivative);
    }
    if (beam.p() > 0) {
      solve(p, layout, beam.p(), beam.s() > 0, into);
      gradient.add(p, weights, layers, derivative);
    }
  }
}
