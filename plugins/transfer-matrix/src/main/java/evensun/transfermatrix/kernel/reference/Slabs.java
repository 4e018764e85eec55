package evensun.transfermatrix.kernel.reference;

import evensun.transfermatrix.kernel.Beam;
import evensun.transfermatrix.kernel.Layout;
import evensun.transfermatrix.kernel.NormalIndex;

/**
 * The media of a stack at one wavelength and polarisation: what a plane wave with a given
 * tangential index meets.
 *
 * <p>q = √(N² − s²) is the index along the normal in the quadrant Im q ≥ 0, Re q ≥ 0; the
 * admittance H/E of the tangential fields is q for s and N²/q for p (Born &amp; Wolf, Principles of
 * Optics, section 1.6).
 */
final class Slabs {

  /** N, the number of finite layers. */
  final int layerCount;

  /** [j] admittance. */
  final Complex[] admittance;

  /** [j] 2πq/λ, per nm. */
  final Complex[] wavePerNm;

  /** [j] thickness in nm. */
  final double[] thicknessNm;

  /** [j] whether waves interfere inside. */
  final boolean[] coherent;

  Slabs(
      Layout layout, Beam beam, double[][] n, double[][] k, int w, double wavelengthNm, boolean p) {
    layerCount = layout.layerCount;
    thicknessNm = layout.thicknessNm;
    coherent = layout.coherent;
    admittance = new Complex[layerCount + 2];
    wavePerNm = new Complex[layerCount + 2];
    double incident = n[layout.material[0]][w];
    for (int j = 0; j <= layerCount + 1; j++) {
      int m = layout.material[j];
      Complex index = new Complex(n[m][w], k[m][w]);
      boolean finite = j > 0 && j <= layerCount;
      Complex q = beam.normal() ? index : normalIndex(index, incident, beam.cosine(), finite);
      admittance[j] = p ? index.times(index).over(q) : q;
      wavePerNm[j] = q.times(2 * Math.PI / wavelengthNm);
    }
  }

  private static Complex normalIndex(
      Complex index, double incident, double cosine, boolean finite) {
    Complex square =
        new Complex(
            NormalIndex.squareRe(index.re(), index.im(), incident, cosine),
            NormalIndex.squareIm(index.re(), index.im()));
    double least =
        (finite ? NormalIndex.LEAST_LAYER : NormalIndex.LEAST_HALF_SPACE) * index.squared();
    return square.squared() < least * least ? new Complex(Math.sqrt(least), 0) : square.root();
  }

  /**
   * Whether the wave of medium j is followed as an intensity: half-spaces and incoherent layers.
   */
  boolean thick(int j) {
    return !coherent[j];
  }

  /** The share of an intensity that survives one crossing of medium j. */
  double passed(int j) {
    return Math.exp(-2 * wavePerNm[j].im() * thicknessNm[j]);
  }

  /** Re η of a thick medium, kept off zero where it divides: an evanescent wave carries no flux. */
  double carried(int j) {
    return Math.max(admittance[j].re(), 1e-12 * Math.sqrt(admittance[j].squared()));
  }
}
