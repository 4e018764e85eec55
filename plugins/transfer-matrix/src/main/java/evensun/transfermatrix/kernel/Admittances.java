package evensun.transfermatrix.kernel;

/** Admittances H/E of the tangential fields of one polarisation, by place of the medium. */
final class Admittances {

  /** [x][w] real part. */
  final double[][] re;

  /** [x][w] imaginary part. */
  final double[][] im;

  /**
   * [x][w] the real part, kept off zero where it divides: an evanescent wave carries no flux, and
   * what is divided is then zero too.
   */
  final double[][] carried;

  Admittances(int places, int wavelengths) {
    re = new double[places][wavelengths];
    im = new double[places][wavelengths];
    carried = new double[places][wavelengths];
  }

  void findCarried(int x) {
    for (int w = 0; w < re[x].length; w++) {
      double size = Math.sqrt(re[x][w] * re[x][w] + im[x][w] * im[x][w]);
      carried[x][w] = Math.max(re[x][w], 1e-12 * size);
    }
  }

  /** N²/q for p light, from the index and the admittances q of s light. */
  void fillFromIndex(int x, double[] n, double[] k, Admittances q) {
    for (int w = 0; w < n.length; w++) {
      double squareRe = (n[w] - k[w]) * (n[w] + k[w]);
      double squareIm = 2 * n[w] * k[w];
      double qRe = q.re[x][w];
      double qIm = q.im[x][w];
      double scale = 1 / (qRe * qRe + qIm * qIm);
      re[x][w] = (squareRe * qRe + squareIm * qIm) * scale;
      im[x][w] = (squareIm * qRe - squareRe * qIm) * scale;
    }
    findCarried(x);
  }
}
