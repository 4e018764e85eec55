package evensun.effectivemedium.kernel;

/**
 * Bruggeman's rule for any number of components.
 *
 * <p>Write D = (1 − P)/P and F(ε) = Σ fᵢ/(εᵢ + Dε); the rule is g(ε) = ε with g = 1/F − Dε. With cᵢ
 * = (1/F)/(εᵢ + Dε), Σ fᵢcᵢ = 1, one finds g = Σ fᵢ|cᵢ|² εᵢ + Dε (Σ fᵢ|cᵢ|² − 1), and the bracket
 * is not negative (Cauchy–Schwarz): g is a sum of the εᵢ and ε with positive weights. So g maps the
 * cone that the εᵢ span into itself, and inside it has one fixed point only, to which its iteration
 * converges (Denjoy–Wolff): the root that goes over into each εᵢ as its fraction becomes one. This
 * kernel takes Newton's steps from the root at the wavelength before, keeps those that stay in the
 * cone, and takes a step of g instead of those that leave it. A root found in the cone is the
 * physical one.
 */
public final class SetBruggeman {

  private static final int NEWTON_STEPS = 60;
  private static final int ALL_STEPS = 20_000;

  /** Square of the relative step below which the next Newton step is below rounding. */
  private static final double CLOSE = 1e-20;

  /** Square of the relative step below which the iteration of g has converged. */
  private static final double DONE = 1e-30;

  private final double[] root = new double[2];
  private final double[] step = new double[2];

  /** A kernel with its small workspace, for one thread at a time. */
  public SetBruggeman() {}

  /**
   * Mixes the components.
   *
   * @param epsRe [c][w] real parts of the permittivities
   * @param epsIm [c][w] imaginary parts, at least 0
   * @param fraction [c] volume fractions, at least 0, of sum 1
   * @param d (1 − P)/P, greater than 0; 2 for spheres
   * @param re [w] out: real part of the effective permittivity
   * @param im [w] out: imaginary part of the effective permittivity
   */
  public void mix(
      double[][] epsRe, double[][] epsIm, double[] fraction, double d, double[] re, double[] im) {
    for (int w = 0; w < re.length; w++) {
      int low = 0;
      int high = 0;
      for (int c = 1; c < fraction.length; c++) {
        low = turn(epsRe, epsIm, c, low, w) > 0 ? c : low;
        high = turn(epsRe, epsIm, high, c, w) > 0 ? c : high;
      }
      start(epsRe, epsIm, fraction, w);
      if (w > 0 && inside(epsRe, epsIm, low, high, w, re[w - 1], im[w - 1])) {
        root[0] = re[w - 1];
        root[1] = im[w - 1];
      }
      solve(epsRe, epsIm, fraction, d, low, high, w);
      re[w] = root[0];
      im[w] = root[1];
    }
  }

  /** Above 0 when component b lies at a larger angle than component a. */
  private static double turn(double[][] epsRe, double[][] epsIm, int a, int b, int w) {
    return epsRe[a][w] * epsIm[b][w] - epsIm[a][w] * epsRe[b][w];
  }

  /** The upper Wiener bound lies in the cone. */
  private void start(double[][] epsRe, double[][] epsIm, double[] fraction, int w) {
    root[0] = 0;
    root[1] = 0;
    for (int c = 0; c < fraction.length; c++) {
      root[0] += fraction[c] * epsRe[c][w];
      root[1] += fraction[c] * epsIm[c][w];
    }
  }

  private void solve(
      double[][] epsRe, double[][] epsIm, double[] fraction, double d, int low, int high, int w) {
    for (int i = 0; i < ALL_STEPS; i++) {
      boolean newton = newtonStep(epsRe, epsIm, fraction, d, w) && i < NEWTON_STEPS;
      double nextRe = root[0] + step[0];
      double nextIm = root[1] + step[1];
      if (!newton || !inside(epsRe, epsIm, low, high, w, nextRe, nextIm)) {
        newton = false;
        contractingStep(epsRe, epsIm, fraction, d, w);
        nextRe = root[0] + step[0];
        nextIm = root[1] + step[1];
      }
      double size = nextRe * nextRe + nextIm * nextIm;
      double move = step[0] * step[0] + step[1] * step[1];
      root[0] = nextRe;
      root[1] = nextIm;
      if (move <= size * (newton ? CLOSE : DONE)) {
        return;
      }
    }
  }

  /** Newton's step for 1 − (1 + D) ε F(ε) = 0; false where the slope vanishes. */
  private boolean newtonStep(
      double[][] epsRe, double[][] epsIm, double[] fraction, double d, int w) {
    double fRe = 0;
    double fIm = 0;
    double gRe = 0;
    double gIm = 0;
    for (int c = 0; c < fraction.length; c++) {
      double xRe = epsRe[c][w] + d * root[0];
      double xIm = epsIm[c][w] + d * root[1];
      double inverse = 1 / (xRe * xRe + xIm * xIm);
      double rRe = xRe * inverse;
      double rIm = -xIm * inverse;
      fRe += fraction[c] * rRe;
      fIm += fraction[c] * rIm;
      gRe += fraction[c] * (rRe * rRe - rIm * rIm);
      gIm += fraction[c] * 2 * rRe * rIm;
    }
    double valueRe = 1 / (1 + d) - (root[0] * fRe - root[1] * fIm);
    double valueIm = -(root[0] * fIm + root[1] * fRe);
    double slopeRe = fRe - d * (root[0] * gRe - root[1] * gIm);
    double slopeIm = fIm - d * (root[0] * gIm + root[1] * gRe);
    double square = slopeRe * slopeRe + slopeIm * slopeIm;
    step[0] = (valueRe * slopeRe + valueIm * slopeIm) / square;
    step[1] = (valueIm * slopeRe - valueRe * slopeIm) / square;
    return square > 0;
  }

  /** g(ε) − ε. */
  private void contractingStep(
      double[][] epsRe, double[][] epsIm, double[] fraction, double d, int w) {
    double fRe = 0;
    double fIm = 0;
    for (int c = 0; c < fraction.length; c++) {
      double xRe = epsRe[c][w] + d * root[0];
      double xIm = epsIm[c][w] + d * root[1];
      double scale = fraction[c] / (xRe * xRe + xIm * xIm);
      fRe += xRe * scale;
      fIm -= xIm * scale;
    }
    double inverse = 1 / (fRe * fRe + fIm * fIm);
    step[0] = fRe * inverse - (1 + d) * root[0];
    step[1] = -fIm * inverse - (1 + d) * root[1];
  }

  /** Whether a value lies between the two outermost components, but for rounding. */
  private static boolean inside(
      double[][] epsRe, double[][] epsIm, int low, int high, int w, double re, double im) {
    double lowRe = epsRe[low][w];
    double lowIm = epsIm[low][w];
    double highRe = epsRe[high][w];
    double highIm = epsIm[high][w];
    double slack = 1e-12 * (Math.abs(re) + Math.abs(im));
    boolean above = lowRe * im - lowIm * re >= -slack * (Math.abs(lowRe) + Math.abs(lowIm));
    boolean below = re * highIm - im * highRe >= -slack * (Math.abs(highRe) + Math.abs(highIm));
    return above && below && re * (lowRe + highRe) + im * (lowIm + highIm) > 0;
  }
}
