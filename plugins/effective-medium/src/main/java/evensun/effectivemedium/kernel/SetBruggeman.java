package evensun.effectivemedium.kernel;

import java.util.Arrays;

/**
 * Bruggeman's rule for any number of components.
 *
 * <p>Write D = (1 − P)/P and F(ε) = Σ fᵢ/(εᵢ + Dε); the rule is 1/F = (1 + D)ε. Newton's steps on
 * it, F (1 − (1 + D)εF)/((1 + D)F² − DG) with G = Σ fᵢ/(εᵢ + Dε)², are exact for one component and
 * nearly so for like ones.
 *
 * <p>The rule has as many roots as components. With cᵢ = (1 + D)ε/(εᵢ + Dε) and S = Σ fᵢ|cᵢ|² each
 * of them keeps (1 + D − DS) ε = Σ fᵢ|cᵢ|² εᵢ: it lies in the cone that the εᵢ span, or opposite.
 * One lies in the cone, since g = 1/F − Dε = Σ fᵢ|cᵢ|² εᵢ + D(S − 1)ε with S ≥ 1 (Cauchy–Schwarz)
 * maps the cone into itself and so has one fixed point there, to which its iteration converges
 * (Denjoy–Wolff): the root that goes over into each εᵢ as its fraction becomes one. So S &lt; 1 +
 * 1/D tells the physical root. Wavelengths at which Newton's steps end elsewhere start again after
 * steps of g.
 *
 * <p>All wavelengths step together and leave as they settle, each for itself.
 */
public final class SetBruggeman {

  private static final int ROUNDS = 400;
  private static final int NEWTON_STEPS = 12;
  private static final int RULE_STEPS = 2;

  /** Newton's steps after which it is not worth looking who has settled. */
  private static final int UNSETTLED_STEPS = 2;

  /** Square of the relative step whose square, by which the next would be smaller, is lost. */
  private static final double CLOSE = 1e-18;

  /**
   * Rounding in S D/(1 + D), which is one at both of a pair of roots where no component absorbs.
   */
  private static final double UNCLEAR = 1e-7;

  /** [c][i] components at the wavelengths not settled yet. */
  private final double[][] epsRe;

  private final double[][] epsIm;

  /** [i] these wavelengths. */
  private final int[] place;

  private final double[] rootRe;
  private final double[] rootIm;

  /** [i] the last value known to lie in the cone. */
  private final double[] safeRe;

  private final double[] safeIm;
  private final double[] oneRe;
  private final double[] oneIm;

  /** [i] F, then the step. */
  private final double[] stepRe;

  private final double[] stepIm;

  /** [i] G. */
  private final double[] squareRe;

  private final double[] squareIm;

  /** [i] Σ fᵢ/|εᵢ + Dε|². */
  private final double[] field;

  /** Wavelengths not settled yet. */
  private int open;

  /**
   * A kernel with its workspace, for one thread at a time.
   *
   * @param components number of components
   * @param wavelengths W
   */
  public SetBruggeman(int components, int wavelengths) {
    epsRe = new double[components][wavelengths];
    epsIm = new double[components][wavelengths];
    place = new int[wavelengths];
    rootRe = new double[wavelengths];
    rootIm = new double[wavelengths];
    safeRe = new double[wavelengths];
    safeIm = new double[wavelengths];
    oneRe = new double[wavelengths];
    oneIm = new double[wavelengths];
    stepRe = new double[wavelengths];
    stepIm = new double[wavelengths];
    squareRe = new double[wavelengths];
    squareIm = new double[wavelengths];
    field = new double[wavelengths];
  }

  /**
   * Mixes the components.
   *
   * @param componentRe [c][w] real parts of the permittivities
   * @param componentIm [c][w] imaginary parts, at least 0
   * @param fraction [c] volume fractions, at least 0, of sum 1
   * @param d (1 − P)/P, greater than 0; 2 for spheres
   * @param re [w] in: real part of a mean of the components to start from, best that of their
   *     indices squared; out: of the effective permittivity, NaN where no root was reached
   * @param im [w] the imaginary part of the same
   */
  public void mix(
      double[][] componentRe,
      double[][] componentIm,
      double[] fraction,
      double d,
      double[] re,
      double[] im) {
    load(componentRe, componentIm, re, im);
    for (int round = 0; round < ROUNDS && open > 0; round++) {
      for (int s = 0; s < RULE_STEPS && round > 0; s++) {
        sum(fraction, d);
        ruleStep(stepRe, stepIm, rootRe, rootIm, d, open);
      }
      System.arraycopy(rootRe, 0, safeRe, 0, open);
      System.arraycopy(rootIm, 0, safeIm, 0, open);
      for (int s = 0; s < NEWTON_STEPS && open > 0; s++) {
        sum(fraction, d);
        newtonStep(stepRe, stepIm, squareRe, squareIm, rootRe, rootIm, d, open);
        move(stepRe, stepIm, rootRe, rootIm, open);
        if (s >= UNSETTLED_STEPS) {
          settle(d, re, im);
        }
      }
      System.arraycopy(safeRe, 0, rootRe, 0, open);
      System.arraycopy(safeIm, 0, rootIm, 0, open);
    }
    for (int i = 0; i < open; i++) { // a start outside the cone; no number is better than a guess
      re[place[i]] = Double.NaN;
      im[place[i]] = Double.NaN;
    }
  }

  private void load(double[][] componentRe, double[][] componentIm, double[] re, double[] im) {
    open = re.length;
    for (int c = 0; c < epsRe.length; c++) {
      System.arraycopy(componentRe[c], 0, epsRe[c], 0, open);
      System.arraycopy(componentIm[c], 0, epsIm[c], 0, open);
    }
    System.arraycopy(re, 0, rootRe, 0, open);
    System.arraycopy(im, 0, rootIm, 0, open);
    for (int w = 0; w < open; w++) {
      place[w] = w;
    }
  }

  /** Fills F, G and Σ fᵢ/|εᵢ + Dε|². */
  private void sum(double[] fraction, double d) {
    Arrays.fill(stepRe, 0, open, 0);
    Arrays.fill(stepIm, 0, open, 0);
    Arrays.fill(squareRe, 0, open, 0);
    Arrays.fill(squareIm, 0, open, 0);
    Arrays.fill(field, 0, open, 0);
    for (int c = 0; c < fraction.length; c++) {
      invert(epsRe[c], epsIm[c], rootRe, rootIm, d, oneRe, oneIm, open);
      add(oneRe, oneIm, fraction[c], stepRe, stepIm, open);
      addSquare(oneRe, oneIm, fraction[c], squareRe, squareIm, open);
      addNorm(oneRe, oneIm, fraction[c], field, open);
    }
  }

  /** 1/(εᵢ + Dε). */
  private static void invert(
      double[] epsRe,
      double[] epsIm,
      double[] rootRe,
      double[] rootIm,
      double d,
      double[] oneRe,
      double[] oneIm,
      int count) {
    for (int i = 0; i < count; i++) {
      double xRe = epsRe[i] + d * rootRe[i];
      double xIm = epsIm[i] + d * rootIm[i];
      double inverse = 1 / (xRe * xRe + xIm * xIm);
      oneRe[i] = xRe * inverse;
      oneIm[i] = -xIm * inverse;
    }
  }

  private static void add(
      double[] oneRe, double[] oneIm, double fraction, double[] re, double[] im, int count) {
    for (int i = 0; i < count; i++) {
      re[i] += fraction * oneRe[i];
      im[i] += fraction * oneIm[i];
    }
  }

  private static void addSquare(
      double[] oneRe, double[] oneIm, double fraction, double[] re, double[] im, int count) {
    for (int i = 0; i < count; i++) {
      re[i] += fraction * (oneRe[i] * oneRe[i] - oneIm[i] * oneIm[i]);
      im[i] += 2 * fraction * (oneRe[i] * oneIm[i]);
    }
  }

  private static void addNorm(
      double[] oneRe, double[] oneIm, double fraction, double[] norm, int count) {
    for (int i = 0; i < count; i++) {
      norm[i] += fraction * (oneRe[i] * oneRe[i] + oneIm[i] * oneIm[i]);
    }
  }

  /** Turns F into Newton's step. */
  private static void newtonStep(
      double[] fRe,
      double[] fIm,
      double[] gRe,
      double[] gIm,
      double[] rootRe,
      double[] rootIm,
      double d,
      int count) {
    for (int i = 0; i < count; i++) {
      double aRe = fRe[i];
      double aIm = fIm[i];
      double restRe = 1 - (1 + d) * (rootRe[i] * aRe - rootIm[i] * aIm);
      double restIm = -(1 + d) * (rootRe[i] * aIm + rootIm[i] * aRe);
      double underRe = (1 + d) * (aRe * aRe - aIm * aIm) - d * gRe[i];
      double underIm = (1 + d) * (2 * aRe * aIm) - d * gIm[i];
      double overRe = aRe * restRe - aIm * restIm;
      double overIm = aRe * restIm + aIm * restRe;
      double inverse = 1 / (underRe * underRe + underIm * underIm);
      fRe[i] = (overRe * underRe + overIm * underIm) * inverse;
      fIm[i] = (overIm * underRe - overRe * underIm) * inverse;
    }
  }

  /** Puts g = 1/F − Dε in the place of ε. */
  private static void ruleStep(
      double[] fRe, double[] fIm, double[] rootRe, double[] rootIm, double d, int count) {
    for (int i = 0; i < count; i++) {
      double inverse = 1 / (fRe[i] * fRe[i] + fIm[i] * fIm[i]);
      rootRe[i] = fRe[i] * inverse - d * rootRe[i];
      rootIm[i] = -fIm[i] * inverse - d * rootIm[i];
    }
  }

  private static void move(
      double[] stepRe, double[] stepIm, double[] rootRe, double[] rootIm, int count) {
    for (int i = 0; i < count; i++) {
      rootRe[i] += stepRe[i];
      rootIm[i] += stepIm[i];
    }
  }

  /** Writes the wavelengths that have come to the physical root, and closes up the others. */
  private void settle(double d, double[] re, double[] im) {
    int kept = 0;
    for (int i = 0; i < open; i++) {
      if (settled(i, d)) {
        write(i, re, im);
      } else {
        keep(i, kept++);
      }
    }
    open = kept;
  }

  private boolean settled(int i, double d) {
    double size = rootRe[i] * rootRe[i] + rootIm[i] * rootIm[i];
    double move = stepRe[i] * stepRe[i] + stepIm[i] * stepIm[i];
    // S D/(1 + D); where it is one, the root that absorbs is the limit of weak absorption.
    double side = field[i] * size * d * (1 + d);
    return move <= size * CLOSE && (side < 1 - UNCLEAR || side < 1 + UNCLEAR && rootIm[i] > 0);
  }

  private void write(int i, double[] re, double[] im) {
    re[place[i]] = rootRe[i];
    im[place[i]] = rootIm[i];
  }

  private void keep(int from, int to) {
    if (from == to) {
      return;
    }
    place[to] = place[from];
    rootRe[to] = rootRe[from];
    rootIm[to] = rootIm[from];
    safeRe[to] = safeRe[from];
    safeIm[to] = safeIm[from];
    for (int c = 0; c < epsRe.length; c++) {
      epsRe[c][to] = epsRe[c][from];
      epsIm[c][to] = epsIm[c][from];
    }
  }
}
