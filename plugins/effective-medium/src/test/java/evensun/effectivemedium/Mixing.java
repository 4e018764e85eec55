package evensun.effectivemedium;

import evensun.spi.Design;
import evensun.spi.MixingRule;
import evensun.spi.Mixture;
import java.util.Random;

/** Mixes single permittivities with the kernels under test, and makes random ones. */
final class Mixing {

  private Mixing() {}

  static Eps mix(MixingRule rule, double p, double[] fractions, Eps... components) {
    Blend blend = blend(rule, p, fractions, components);
    return Eps.ofIndex(blend.n(0)[0], blend.k(0)[0]);
  }

  static Eps mix(MixingRule rule, double[] fractions, Eps... components) {
    return mix(rule, Mixture.SPHERE, fractions, components);
  }

  /** The first component is the host where the rule needs one. */
  static Blend blend(MixingRule rule, double p, double[] fractions, Eps... components) {
    int host = rule == MixingRule.MAXWELL_GARNETT ? 0 : -1;
    Blend blend = new Blend(rule, host, p, components.length, 1, 1);
    for (int c = 0; c < components.length; c++) {
      Eps index = components[c].root();
      blend.component(
          c, new double[] {index.re()}, new double[] {index.im()}, Design.nextRevision());
    }
    blend.mix(0, fractions);
    return blend;
  }

  /** Fractions of sum one. */
  static double[] fractions(Random random, int count) {
    double[] f = new double[count];
    double sum = 0;
    for (int c = 0; c < count; c++) {
      f[c] = random.nextDouble();
      sum += f[c];
    }
    for (int c = 0; c < count; c++) {
      f[c] /= sum;
    }
    return f;
  }

  /** A dielectric, an absorber or a metal. */
  static Eps passive(Random random) {
    return switch (random.nextInt(3)) {
      case 0 -> Eps.of(1 + 15 * random.nextDouble());
      case 1 -> Eps.ofIndex(0.5 + 4 * random.nextDouble(), 2 * random.nextDouble());
      default -> Eps.ofIndex(0.05 + 2 * random.nextDouble(), 1 + 8 * random.nextDouble());
    };
  }

  /** A dielectric or a metal that hardly absorbs, or not at all. */
  static Eps almostReal(Random random) {
    double size = Math.exp(random.nextGaussian());
    double angle = random.nextBoolean() ? 0 : Math.pow(10, -1 - 7 * random.nextDouble());
    double side = random.nextBoolean() ? 1 : -1;
    return new Eps(side * size * Math.cos(angle), size * Math.sin(angle));
  }

  /** The residual of Bruggeman's rule relative to the size of its terms. */
  static double bruggemanResidual(double p, double[] f, Eps[] components, Eps eps) {
    Eps sum = Eps.of(0);
    double size = 0;
    for (int c = 0; c < f.length; c++) {
      Eps difference = components[c].minus(eps);
      Eps term = difference.over(eps.plus(difference.times(p))).times(f[c]);
      sum = sum.plus(term);
      size += term.abs();
    }
    return sum.abs() / Math.max(size, 1e-300);
  }

  /**
   * The root of Bruggeman's rule by continuity: from the first component alone along a straight
   * path of fractions, in steps so small that Newton's method cannot leave the branch. Slow and
   * independent of the kernels.
   */
  static Eps bruggemanByContinuity(double p, double[] f, Eps... components) {
    int steps = 20_000;
    Eps eps = components[0];
    double[] now = new double[f.length];
    for (int s = 1; s <= steps; s++) {
      double t = (double) s / steps;
      for (int c = 0; c < f.length; c++) {
        now[c] = t * f[c] + (c == 0 ? 1 - t : 0);
      }
      for (int i = 0; i < 4; i++) {
        eps = newton(p, now, components, eps);
      }
    }
    return eps;
  }

  private static Eps newton(double p, double[] f, Eps[] components, Eps eps) {
    Eps value = Eps.of(0);
    Eps slope = Eps.of(0);
    for (int c = 0; c < f.length; c++) {
      Eps denominator = eps.plus(components[c].minus(eps).times(p));
      value = value.plus(components[c].minus(eps).over(denominator).times(f[c]));
      // d/dε of (εc − ε)/((1 − p)ε + p εc) is −εc/(...)².
      slope = slope.minus(components[c].over(denominator.times(denominator)).times(f[c]));
    }
    return eps.minus(value.over(slope));
  }
}
