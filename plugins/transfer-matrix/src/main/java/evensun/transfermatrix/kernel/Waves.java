package evensun.transfermatrix.kernel;

import java.util.Arrays;

/**
 * The packets of a stack lit from one side, each with unit intensity.
 *
 * <p>A scaled pair of waves is carried from the far side to the near one: nothing grows but by the
 * faces, and nothing is divided until the near side is reached. What reaches each layer follows on
 * the way back in real numbers, since the flux through a face is a quadratic form of its pair.
 *
 * <p>Seen from behind, r changes sign at every face; carrying −w instead of w undoes that, so that
 * only the mixed part of the flux changes sign.
 */
final class Waves {

  /** 1 from the front, -1 from behind. */
  final int step;

  /** Factor of the mixed part of the flux: 2 from the front, -2 from behind. */
  final double cross;

  /** [j][w] pair at the near face of layer j; at a near medium, the pair in it above its face. */
  final double[][] uRe;

  final double[][] uIm;
  final double[][] wRe;
  final double[][] wIm;

  /** [j][w] flux of the pair, where one of the layers it bounds is followed. */
  final double[][] flux;

  /** [j][w] how much of the square of the wave in the near medium is left at medium j. */
  final double[][] through;

  /** [near][w] 1/(|u|² Re η) in the near medium. */
  final double[][] norm;

  /** [near][w] reflectance of the packet beyond. */
  final double[][] reflectance;

  /** [near][w] flux into the far medium. */
  final double[][] transmittance;

  /** [near][w] flux shared by the incident and the reflected wave in the near medium. */
  final double[][] mixed;

  private final double[] ones;
  private final double[] zeros;
  private final double[] vRe;
  private final double[] vIm;

  private final int wavelengths;

  Waves(int step, int layers, int wavelengths) {
    this.step = step;
    this.wavelengths = wavelengths;
    cross = 2.0 * step;
    int media = layers + 2;
    uRe = new double[media][wavelengths];
    uIm = new double[media][wavelengths];
    wRe = new double[media][wavelengths];
    wIm = new double[media][wavelengths];
    flux = new double[media][wavelengths];
    through = new double[media][wavelengths];
    norm = new double[media][wavelengths];
    reflectance = new double[media][wavelengths];
    transmittance = new double[media][wavelengths];
    mixed = new double[media][wavelengths];
    ones = new double[wavelengths];
    Arrays.fill(ones, 1);
    zeros = new double[wavelengths];
    vRe = new double[wavelengths];
    vIm = new double[wavelengths];
  }

  /**
   * Solves the packet between two thick media.
   *
   * @param followed [j] whether the absorptance of layer j is wanted
   */
  void solve(Optics optics, int near, int far, boolean[] followed) {
    climb(optics, near, far, followed);
    descend(optics, near, far);
    finish(optics, near, far);
  }

  /** The face between medium j and the next one from the light. */
  int slot(Optics optics, int j) {
    return Faces.slot(optics.layout, step > 0 ? j : j - 1);
  }

  private void climb(Optics optics, int near, int far, boolean[] followed) {
    double[] onRe = ones;
    double[] onIm = zeros;
    double[] backRe = zeros;
    double[] backIm = zeros;
    for (int j = far - step; j != near; j -= step) {
      face(optics, j, onRe, onIm, backRe, backIm, vRe, vIm);
      int l = optics.layout.layer[j];
      WaveLoops.multiply(
          vRe, vIm, optics.phases.re[l], optics.phases.im[l], wRe[j], wIm[j], wavelengths);
      onRe = uRe[j];
      onIm = uIm[j];
      backRe = wRe[j];
      backIm = wIm[j];
      if (followed[j] || (j - step != near && followed[j - step])) {
        flux(optics, j);
      }
    }
    face(optics, near, onRe, onIm, backRe, backIm, wRe[near], wIm[near]);
  }

  /** From the pair (u, w) below the face of medium j to the pair above it: u + r w and r u + w. */
  private void face(
      Optics optics,
      int j,
      double[] onRe,
      double[] onIm,
      double[] backRe,
      double[] backIm,
      double[] outRe,
      double[] outIm) {
    int slot = slot(optics, j);
    double[] rRe = optics.faces.re[slot];
    double[] rIm = optics.faces.im[slot];
    System.arraycopy(onRe, 0, uRe[j], 0, wavelengths);
    System.arraycopy(onIm, 0, uIm[j], 0, wavelengths);
    WaveLoops.addProduct(rRe, rIm, backRe, backIm, uRe[j], uIm[j], wavelengths);
    System.arraycopy(backRe, 0, outRe, 0, wavelengths);
    System.arraycopy(backIm, 0, outIm, 0, wavelengths);
    WaveLoops.addProduct(rRe, rIm, onRe, onIm, outRe, outIm, wavelengths);
  }

  private void flux(Optics optics, int j) {
    int x = optics.media.place(optics.layout, j);
    WaveLoops.mixedFlux(
        optics.eta.im[x], uRe[j], uIm[j], wRe[j], wIm[j], cross, flux[j], wavelengths);
    WaveLoops.addFlux(optics.eta.re[x], uRe[j], uIm[j], wRe[j], wIm[j], flux[j], wavelengths);
  }

  private void descend(Optics optics, int near, int far) {
    double[][] passing = step > 0 ? optics.faces.onward : optics.faces.backward;
    double[] first = passing[slot(optics, near)];
    System.arraycopy(first, 0, through[near + step], 0, first.length);
    for (int j = near + step; j != far; j += step) {
      double[] size = optics.phases.size[optics.layout.layer[j]];
      WaveLoops.through(through[j], size, passing[slot(optics, j)], through[j + step], wavelengths);
    }
  }

  private void finish(Optics optics, int near, int far) {
    Admittances eta = optics.eta;
    int x = optics.media.place(optics.layout, near);
    double[] carried = eta.carried[x];
    WaveLoops.norm(uRe[near], uIm[near], carried, norm[near], wavelengths);
    WaveLoops.reflectance(
        wRe[near], wIm[near], norm[near], carried, reflectance[near], wavelengths);
    WaveLoops.product(
        norm[near], through[far], farFlux(optics, far), transmittance[near], wavelengths);
    // 1 = R + M + flux into the packet, and M is what the mixed part of that flux takes away.
    WaveLoops.mixedFlux(
        eta.im[x], uRe[near], uIm[near], wRe[near], wIm[near], -cross, vRe, wavelengths);
    WaveLoops.product(vRe, norm[near], mixed[near], wavelengths);
  }

  /** Flux of the single wave in the far medium, whose pair is (1, 0). */
  double[] farFlux(Optics optics, int far) {
    return optics.eta.re[optics.media.place(optics.layout, far)];
  }

  /**
   * Absorptance of layer j.
   *
   * @param start [w] intensity on the packet times {@link #norm}
   */
  void absorb(Optics optics, int j, int far, double[] start, boolean add, double[] out) {
    int next = j + step;
    double[] leaving = next == far ? farFlux(optics, far) : flux[next];
    if (add) {
      WaveLoops.addAbsorbed(start, through[j], flux[j], through[next], leaving, out, wavelengths);
    } else {
      WaveLoops.absorbed(start, through[j], flux[j], through[next], leaving, out, wavelengths);
    }
  }
}
