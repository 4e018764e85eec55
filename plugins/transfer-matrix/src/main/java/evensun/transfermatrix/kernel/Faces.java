package evensun.transfermatrix.kernel;

/** Interface coefficients of one polarisation, found anew only when a neighbour changes. */
final class Faces {

  /** [slot][w] real part of r = (η − η′)/(η + η′), light coming from the front. */
  final double[][] re;

  /** [slot][w] imaginary part of r. */
  final double[][] im;

  /** [slot][w] |1 + r|², what the square of a wave from the front is multiplied by. */
  final double[][] onward;

  /** [slot][w] |1 − r|², the same for a wave from behind. */
  final double[][] backward;

  /** [slot][w] real part of 1 − r². */
  final double[][] crossedRe;

  /** [slot][w] imaginary part of 1 − r². */
  final double[][] crossedIm;

  private final long[] above; // [slot] versions of the neighbours
  private final long[] below;

  private final int wavelengths;

  Faces(int layers, int wavelengths) {
    this.wavelengths = wavelengths;
    re = new double[layers + 2][wavelengths];
    im = new double[layers + 2][wavelengths];
    onward = new double[layers + 2][wavelengths];
    backward = new double[layers + 2][wavelengths];
    crossedRe = new double[layers + 2][wavelengths];
    crossedIm = new double[layers + 2][wavelengths];
    above = new long[layers + 2];
    below = new long[layers + 2];
  }

  /** The slot of the face below medium j: it goes with the layer above it. */
  static int slot(Layout layout, int j) {
    return layout.layer[j] + 1;
  }

  /** Makes the coefficients of all faces of a layout right. */
  void refresh(Layout layout, MediumRows media, Admittances eta) {
    for (int j = 0; j <= layout.layerCount; j++) {
      int slot = slot(layout, j);
      int here = media.place(layout, j);
      int next = media.place(layout, j + 1);
      if (above[slot] != media.version[here] || below[slot] != media.version[next]) {
        fresnel(
            eta.re[here],
            eta.im[here],
            eta.re[next],
            eta.im[next],
            re[slot],
            im[slot],
            wavelengths);
        passing(
            eta.re[here],
            eta.im[here],
            eta.re[next],
            eta.im[next],
            onward[slot],
            backward[slot],
            wavelengths);
        crossed(re[slot], im[slot], crossedRe[slot], crossedIm[slot], wavelengths);
        above[slot] = media.version[here];
        below[slot] = media.version[next];
      }
    }
  }

  private static void fresnel(
      double[] aRe, double[] aIm, double[] bRe, double[] bIm, double[] re, double[] im, int count) {
    for (int w = 0; w < count; w++) {
      double lessRe = aRe[w] - bRe[w];
      double lessIm = aIm[w] - bIm[w];
      double moreRe = aRe[w] + bRe[w];
      double moreIm = aIm[w] + bIm[w];
      double scale = 1 / (moreRe * moreRe + moreIm * moreIm);
      re[w] = (lessRe * moreRe + lessIm * moreIm) * scale;
      im[w] = (lessIm * moreRe - lessRe * moreIm) * scale;
    }
  }

  private static void passing(
      double[] aRe,
      double[] aIm,
      double[] bRe,
      double[] bIm,
      double[] onward,
      double[] backward,
      int count) {
    for (int w = 0; w < count; w++) {
      double moreRe = aRe[w] + bRe[w];
      double moreIm = aIm[w] + bIm[w];
      double scale = 4 / (moreRe * moreRe + moreIm * moreIm);
      onward[w] = (aRe[w] * aRe[w] + aIm[w] * aIm[w]) * scale;
      backward[w] = (bRe[w] * bRe[w] + bIm[w] * bIm[w]) * scale;
    }
  }

  private static void crossed(
      double[] rRe, double[] rIm, double[] outRe, double[] outIm, int count) {
    for (int w = 0; w < count; w++) {
      double a = rRe[w];
      double b = rIm[w];
      outRe[w] = 1 - (a * a - b * b);
      outIm[w] = -2 * a * b;
    }
  }
}
