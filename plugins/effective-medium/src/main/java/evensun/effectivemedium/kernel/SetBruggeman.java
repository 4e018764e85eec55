package evensun.effectivemedium.kernel;

/**
 * Bruggeman's rule for any number of components.
 *
 * <p>Write D = (1 − P)/P and F(ε) = Σ fᵢ/(εᵢ + Dε); the rule is g(ε) = ε with g = 1/F − Dε. With cᵢ
 * = (1/F)/(εᵢ + Dε), Σ fᵢcᵢ = 1, one finds g = Σ fᵢ|cᵢ|² εᵢ + Dε (Σ fᵢ|cᵢ|² − 1), and the bracket
 * is not negative (Cauchy–Schwarz): g is a sum of the εᵢ and ε with positive weights. So g maps the
 * cone that the εᵢ span into itself, and inside it has one fixed point only, to which its iteration
 * converges (Denjoy–Wolff): the root that goes over into each εᵢ as its fraction becomes one. This
 * kernel takes Halley's steps from the roots at the wavelengths before, keeps those that stay in
 * the cone, and takes a step of g instead of those that leave it. A root found in the cone is the
 * physical one.
 */
public final class SetBruggeman {

  private static final int HALLEY_STEPS = 60;
  private static final int ALL_STEPS = 20_000;

  /** Square of the relative step, whose cube the next would be, below which that is lost. */
  private static final double CLOSE = 1e-11;

  /** Square of the relative step below which the iteration of g has converged. */
  private static final double DONE = 1e-30;

  /** [c] permittivities at one wavelength. */
  private double[] epsRe = new double[0];

  private double[] epsIm = new double[0];
  private double rootRe;
  private double rootIm;
  private double stepRe;
  private double stepIm;
  private int low;
  private int high;

  /** A kernel with its small workspace, for one thread at a time. */
  public SetBruggeman() {}

  /**
   * Mixes the components.
   *
   * @param componentRe [c][w] real parts of the permittivities
   * @param componentIm [c][w] imaginary parts, at least 0
   * @param fraction [c] volume fractions, at least 0, of sum 1
   * @param d (1 − P)/P, greater than 0; 2 for spheres
   * @param re [w] out: real part of the effective permittivity
   * @param im [w] out: imaginary part of the effective permittivity
   */
  public void mix(
      double[][] componentRe,
      double[][] componentIm,
      double[] fraction,
      double d,
      double[] re,
      double[] im) {
    if (epsRe.length != fraction.length) {
      epsRe = new double[fraction.length];
      epsIm = new double[fraction.length];
    }
    for (int w = 0; w < re.length; w++) {
      gather(componentRe, componentIm, w);
      start(fraction);
      if (w > 0) {
        // Straight on from the two wavelengths before, where there are two.
        int back = Math.max(w - 2, 0);
        double nextRe = 2 * re[w - 1] - re[back];
        double nextIm = 2 * im[w - 1] - im[back];
        if (inside(nextRe, nextIm)) {
          rootRe = nextRe;
          rootIm = nextIm;
        }
      }
      solve(fraction, d);
      re[w] = rootRe;
      im[w] = rootIm;
    }
  }

  /** Takes the components at one wavelength, and which of them stand at the edges of the cone. */
  private void gather(double[][] componentRe, double[][] componentIm, int w) {
    low = 0;
    high = 0;
    for (int c = 0; c < epsRe.length; c++) {
      epsRe[c] = componentRe[c][w];
      epsIm[c] = componentIm[c][w];
      low = turn(c, low) > 0 ? c : low;
      high = turn(high, c) > 0 ? c : high;
    }
  }

  /** Above 0 when component b lies at a larger angle than component a. */
  private double turn(int a, int b) {
    return epsRe[a] * epsIm[b] - epsIm[a] * epsRe[b];
  }

  /** The upper Wiener bound lies in the cone. */
  private void start(double[] fraction) {
    rootRe = 0;
    rootIm = 0;
    for (int c = 0; c < fraction.length; c++) {
      rootRe += fraction[c] * epsRe[c];
      rootIm += fraction[c] * epsIm[c];
    }
  }

  private void solve(double[] fraction, double d) {
    for (int i = 0; i < ALL_STEPS; i++) {
      boolean halley = halleyStep(fraction, d) && i < HALLEY_STEPS;
      if (!halley || !inside(rootRe + stepRe, rootIm + stepIm)) {
        halley = false;
        contractingStep(fraction, d);
      }
      rootRe += stepRe;
      rootIm += stepIm;
      double size = rootRe * rootRe + rootIm * rootIm;
      double move = stepRe * stepRe + stepIm * stepIm;
      if (move <= size * (halley ? CLOSE : DONE)) {
        return;
      }
    }
  }

  /**
   * Halley's step 2fs/(2s² − f f″) for f = 1/(1 + D) − ε F(ε) = 0, s = −f′; false where it has no
   * end. With r = 1/(εᵢ + Dε), F = Σ fᵢ r, G = Σ fᵢ r², H = Σ fᵢ r³: s = F − DεG, f″ = 2D(G − DεH).
   */
  private boolean halleyStep(double[] fraction, double d) {
    double fRe = 0;
    double fIm = 0;
    double gRe = 0;
    double gIm = 0;
    double hRe = 0;
    double hIm = 0;
    double eRe = d * rootRe;
    double eIm = d * rootIm;
    for (int c = 0; c < fraction.length; c++) {
      double xRe = epsRe[c] + eRe;
      double xIm = epsIm[c] + eIm;
      double inverse = 1 / (xRe * xRe + xIm * xIm);
      double rRe = xRe * inverse;
      double rIm = -xIm * inverse;
      double oneRe = fraction[c] * rRe;
      double oneIm = fraction[c] * rIm;
      double twoRe = oneRe * rRe - oneIm * rIm;
      double twoIm = oneRe * rIm + oneIm * rRe;
      fRe += oneRe;
      fIm += oneIm;
      gRe += twoRe;
      gIm += twoIm;
      hRe += twoRe * rRe - twoIm * rIm;
      hIm += twoRe * rIm + twoIm * rRe;
    }
    double valueRe = 1 / (1 + d) - (rootRe * fRe - rootIm * fIm);
    double valueIm = -(rootRe * fIm + rootIm * fRe);
    double slopeRe = fRe - (eRe * gRe - eIm * gIm);
    double slopeIm = fIm - (eRe * gIm + eIm * gRe);
    double bendRe = d * (gRe - (eRe * hRe - eIm * hIm));
    double bendIm = d * (gIm - (eRe * hIm + eIm * hRe));
    double underRe = slopeRe * slopeRe - slopeIm * slopeIm - (valueRe * bendRe - valueIm * bendIm);
    double underIm = 2 * slopeRe * slopeIm - (valueRe * bendIm + valueIm * bendRe);
    double overRe = valueRe * slopeRe - valueIm * slopeIm;
    double overIm = valueRe * slopeIm + valueIm * slopeRe;
    double square = underRe * underRe + underIm * underIm;
    double inverse = 1 / square;
    stepRe = (overRe * underRe + overIm * underIm) * inverse;
    stepIm = (overIm * underRe - overRe * underIm) * inverse;
    return square > 0;
  }

  /** g(ε) − ε. */
  private void contractingStep(double[] fraction, double d) {
    double fRe = 0;
    double fIm = 0;
    for (int c = 0; c < fraction.length; c++) {
      double xRe = epsRe[c] + d * rootRe;
      double xIm = epsIm[c] + d * rootIm;
      double scale = fraction[c] / (xRe * xRe + xIm * xIm);
      fRe += xRe * scale;
      fIm -= xIm * scale;
    }
    double inverse = 1 / (fRe * fRe + fIm * fIm);
    stepRe = fRe * inverse - (1 + d) * rootRe;
    stepIm = -fIm * inverse - (1 + d) * rootIm;
  }

  /** Whether a value lies between the two outermost components, but for rounding. */
  private boolean inside(double re, double im) {
    double lowRe = epsRe[low];
    double lowIm = epsIm[low];
    double highRe = epsRe[high];
    double highIm = epsIm[high];
    double slack = 1e-12 * (Math.abs(re) + Math.abs(im));
    boolean above = lowRe * im - lowIm * re >= -slack * (Math.abs(lowRe) + Math.abs(lowIm));
    boolean below = re * highIm - im * highRe >= -slack * (Math.abs(highRe) + Math.abs(highIm));
    return above && below && re * (lowRe + highRe) + im * (lowIm + highIm) > 0;
  }
}
