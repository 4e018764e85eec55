package evensun.effectivemedium.kernel;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;

/** The rule for a metal with two dielectrics, from starts in and outside the cone it spans. */
class SetBruggemanTest {

  private static final double[][] RE = {{-13.74}, {6.2}, {1}};
  private static final double[][] IM = {{0.41}, {0}, {0}};
  private static final double[] FRACTION = {0.32, 0.3, 0.38};

  private static double[] mixed(double startRe, double startIm) {
    double[] re = {startRe};
    double[] im = {startIm};
    new SetBruggeman(3, 1).mix(RE, IM, FRACTION, 2, re, im);
    return new double[] {re[0], im[0]};
  }

  /** Outside witness: the rule itself, Σ f (ε − e)/(ε + 2e) = 0, and that no medium shines. */
  @Test
  void anyStartThatAbsorbsLeadsToTheRootThatAbsorbs() {
    for (double[] start : new double[][] {{0.5, 4}, {-3, 1}, {2, 0.5}}) {
      double[] e = mixed(start[0], start[1]);
      double sumRe = 0;
      double sumIm = 0;
      for (int c = 0; c < 3; c++) {
        double overRe = RE[c][0] - e[0];
        double overIm = IM[c][0] - e[1];
        double underRe = RE[c][0] + 2 * e[0];
        double underIm = IM[c][0] + 2 * e[1];
        double size = underRe * underRe + underIm * underIm;
        sumRe += FRACTION[c] * (overRe * underRe + overIm * underIm) / size;
        sumIm += FRACTION[c] * (overIm * underRe - overRe * underIm) / size;
      }
      assertThat(Math.hypot(sumRe, sumIm)).isLessThan(1e-12);
      assertThat(e[1]).isPositive();
    }
  }

  /** A start that would make light is refused by no number, not answered by one that does. */
  @Test
  void aStartThatMakesLightNeverLeadsToAMediumThatDoes() {
    double[] e = mixed(0.5, -4);
    assertThat(Double.isNaN(e[1]) || e[1] > 0).as("Im %s", e[1]).isTrue();
  }
}
