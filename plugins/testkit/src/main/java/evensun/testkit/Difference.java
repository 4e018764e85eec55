package evensun.testkit;

import java.util.Locale;
import java.util.Optional;

/** Compares answers. */
final class Difference {

  private Difference() {}

  /** The first number by which two answers differ, in words, or empty. */
  static Optional<String> first(StackCase stack, Answer is, Answer wanted, double tolerance) {
    Optional<String> found = first("R", stack, is.reflectance, wanted.reflectance, tolerance);
    if (found.isEmpty()) {
      found = first("T", stack, is.transmittance, wanted.transmittance, tolerance);
    }
    for (int l = 0; l < is.absorptance.length && found.isEmpty(); l++) {
      String name = "A of layer " + (l + 1);
      found = first(name, stack, is.absorptance[l], wanted.absorptance[l], tolerance);
    }
    return found;
  }

  /** The first number by which two rows differ, in words, or empty. */
  static Optional<String> first(
      String name, StackCase stack, double[] is, double[] wanted, double tolerance) {
    for (int w = 0; w < is.length; w++) {
      boolean same = Double.compare(is[w], wanted[w]) == 0;
      if (!same && !(Math.abs(is[w] - wanted[w]) <= tolerance)) {
        return Optional.of(
            String.format(
                Locale.ROOT,
                "%s is %.12g instead of %.12g at %s nm",
                name,
                is[w],
                wanted[w],
                stack.wavelengthNm().at(w)));
      }
    }
    return Optional.empty();
  }

  /** The mean of two answers to stacks of one shape. */
  static Answer mean(Answer a, Answer b) {
    double[][] absorptance = new double[a.absorptance.length][];
    for (int l = 0; l < absorptance.length; l++) {
      absorptance[l] = mean(a.absorptance[l], b.absorptance[l]);
    }
    return new Answer(
        mean(a.reflectance, b.reflectance),
        mean(a.transmittance, b.transmittance),
        absorptance,
        Math.max(a.tolerance, b.tolerance));
  }

  private static double[] mean(double[] a, double[] b) {
    double[] mean = new double[a.length];
    for (int w = 0; w < mean.length; w++) {
      mean[w] = (a[w] + b[w]) / 2;
    }
    return mean;
  }
}
