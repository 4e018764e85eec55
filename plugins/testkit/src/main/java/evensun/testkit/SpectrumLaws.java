package evensun.testkit;

import evensun.spi.Polarisation;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.function.IntToDoubleFunction;

/** Laws about the answer to a single stack. */
final class SpectrumLaws {

  private static final double ALMOST_NORMAL_DEG = 0.01;

  private SpectrumLaws() {}

  static List<Law> all() {
    return List.of(
        law(
            "ledger",
            "R + T + absorptances is 1 and none is negative, at every wavelength",
            Cases::claimedBy,
            SpectrumLaws::ledger),
        law(
            "transparent-layers",
            "a layer whose k is 0 absorbs nothing",
            Cases::claimedBy,
            SpectrumLaws::transparent),
        law(
            "bare-interface",
            "one face alone reflects as Fresnel's formulas say",
            s -> Cases.claimedBy(s).stream().map(c -> c.withLayers(List.of())).toList(),
            SpectrumLaws::fresnel),
        law(
            "polarisation-average",
            "unpolarised light is the mean of s and p",
            Cases::claimedBy,
            SpectrumLaws::polarisation),
        law(
            "oblique-limit",
            "light at " + ALMOST_NORMAL_DEG + " degrees behaves as light along the normal",
            s -> s.solver().traits().oblique() ? Cases.claimedBy(s) : List.of(),
            SpectrumLaws::obliqueLimit),
        law(
            "grazing-limit",
            "light along the surface is reflected",
            s -> s.solver().traits().oblique() ? Cases.claimedBy(s) : List.of(),
            SpectrumLaws::grazing));
  }

  private static Law law(
      String name,
      String promise,
      java.util.function.Function<Subject, List<StackCase>> cases,
      CaseLaw.Test test) {
    return new CaseLaw(name, promise, cases, test);
  }

  private static Optional<String> ledger(Subject subject, StackCase stack) {
    Answer answer = subject.answer(stack);
    for (int w = 0; w < stack.wavelengthCount(); w++) {
      if (!(Math.abs(answer.total(w) - 1) <= answer.tolerance)) {
        return Optional.of(text("R + T + A is %.12g at %s", answer.total(w), stack, w));
      }
      if (!(least(answer, w) >= -answer.tolerance)) {
        return Optional.of(text("a share of %.3g at %s", least(answer, w), stack, w));
      }
    }
    return Optional.empty();
  }

  private static double least(Answer answer, int w) {
    double least = Math.min(answer.reflectance[w], answer.transmittance[w]);
    for (double[] row : answer.absorptance) {
      least = Math.min(least, row[w]);
    }
    return least;
  }

  private static Optional<String> transparent(Subject subject, StackCase stack) {
    Answer answer = subject.answer(stack);
    for (int l = 0; l < stack.layerCount(); l++) {
      for (int w = 0; w < stack.wavelengthCount(); w++) {
        double share = answer.absorptance[l][w];
        if (stack.layers().get(l).medium().k() == 0 && !(Math.abs(share) <= answer.tolerance)) {
          return Optional.of(
              text("layer " + (l + 1) + " has k = 0 and absorbs %.3g at %s", share, stack, w));
        }
      }
    }
    return Optional.empty();
  }

  private static Optional<String> fresnel(Subject subject, StackCase stack) {
    Answer answer = subject.answer(stack);
    for (int w = 0; w < stack.wavelengthCount(); w++) {
      double wanted = fresnel(stack, w);
      if (!(Math.abs(answer.reflectance[w] - wanted) <= answer.tolerance)) {
        return Optional.of(
            text("R is %.12g, Fresnel's formulas give " + wanted, answer.reflectance[w], stack, w));
      }
    }
    return Optional.empty();
  }

  private static double fresnel(StackCase stack, int w) {
    double n0 = stack.incident().nAt(stack.wavelengthNm().at(w));
    double n = stack.exit().nAt(stack.wavelengthNm().at(w));
    double s = Fresnel.s(n0, stack.angleDeg(), n, stack.exit().k());
    double p = Fresnel.p(n0, stack.angleDeg(), n, stack.exit().k());
    return switch (stack.polarisation()) {
      case S -> s;
      case P -> p;
      case UNPOLARISED -> (s + p) / 2;
    };
  }

  private static Optional<String> polarisation(Subject subject, StackCase stack) {
    Answer s = subject.answer(stack.withLight(stack.angleDeg(), Polarisation.S));
    Answer p = subject.answer(stack.withLight(stack.angleDeg(), Polarisation.P));
    Answer both = subject.answer(stack.withLight(stack.angleDeg(), Polarisation.UNPOLARISED));
    return Difference.first(stack, both, Difference.mean(s, p), both.tolerance + s.tolerance)
        .map(text -> "unpolarised against the mean of s and p: " + text);
  }

  private static Optional<String> obliqueLimit(Subject subject, StackCase stack) {
    Answer normal = subject.answer(stack.withLight(0, stack.polarisation()));
    Answer almost = subject.answer(stack.withLight(ALMOST_NORMAL_DEG, stack.polarisation()));
    // Everything is even in the angle: the difference is of the order of its square, 3e-8, times
    // the phase of the thickest layer.
    double tolerance = normal.tolerance + almost.tolerance + 1e-4;
    return Difference.first(stack, almost, normal, tolerance)
        .map(text -> ALMOST_NORMAL_DEG + " degrees against the normal: " + text);
  }

  private static Optional<String> grazing(Subject subject, StackCase stack) {
    Answer answer = subject.answer(stack.withLight(89.9999, stack.polarisation()));
    return firstBelow(stack, w -> answer.reflectance[w], 0.99 - answer.tolerance)
        .map(text -> "R at 89.9999 degrees is " + text);
  }

  private static Optional<String> firstBelow(
      StackCase stack, IntToDoubleFunction value, double limit) {
    for (int w = 0; w < stack.wavelengthCount(); w++) {
      if (!(value.applyAsDouble(w) >= limit)) {
        return Optional.of(text("%.6g at %s", value.applyAsDouble(w), stack, w));
      }
    }
    return Optional.empty();
  }

  /** A sentence with one number, and the wavelength at its end. */
  static String text(String sentence, double value, StackCase stack, int w) {
    String where = stack.wavelengthNm().at(w) + " nm";
    return sentence.contains("%s")
        ? String.format(Locale.ROOT, sentence, value, where)
        : String.format(Locale.ROOT, sentence + " at " + where, value);
  }
}
