package evensun.testkit;

import evensun.spi.Design;
import evensun.spi.EvaluationFailed;
import evensun.spi.Evaluator;
import evensun.spi.Feature;
import evensun.spi.Incidence;
import evensun.spi.Layer;
import evensun.spi.Polarisation;
import evensun.spi.PreparedSolver;
import evensun.spi.Problem;
import evensun.spi.Response;
import evensun.spi.Side;
import evensun.spi.UnsupportedProblem;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/** Laws about the manners of a call: what is written, what is refused, and how. */
final class CallLaws {

  private CallLaws() {}

  static List<Law> all() {
    return List.of(
        new CaseLaw(
            "inputs-unwritten",
            "an evaluation writes nothing but the rows that are wanted",
            Cases::claimedBy,
            CallLaws::unwritten),
        new CaseLaw(
            "weighted-sums",
            "a sum is what its weights make of absorptance and transmittance",
            Cases::claimedBy,
            CallLaws::sums),
        new CaseLaw(
            "nan",
            "a design with NaN fails or gives NaN, never a plausible number, and harms no other",
            s -> Cases.plain().stream().limit(20).toList(),
            CallLaws::nan),
        new CaseLaw(
            "impossible-requests",
            "what a solver cannot take it refuses while preparing, in one line",
            s -> Cases.plain().subList(0, 1),
            CallLaws::impossible));
  }

  private static Optional<String> unwritten(Subject subject, StackCase stack) {
    try (PreparedSolver prepared = subject.prepare(stack);
        Evaluator evaluator = prepared.newEvaluator()) {
      Design design = stack.design();
      Design before = stack.design();
      Response response = subject.spectra(prepared, stack);
      double[] wanted = response.reflectance[0];
      response.transmittance = null;
      evaluator.evaluate(design, response);
      if (response.reflectance[0] != wanted) {
        return Optional.of("the caller's row of the reflectance was replaced, not filled");
      }
      if (response.transmittance != null) {
        return Optional.of("a transmittance was written that nobody wanted");
      }
      if (!sameNumbers(design, before)) {
        return Optional.of("the design was written to");
      }
      Answer all = subject.answer(stack);
      return Difference.first("R", stack, wanted, all.reflectance, 0)
          .map(text -> "when less is wanted: " + text);
    }
  }

  private static boolean sameNumbers(Design a, Design b) {
    return Arrays.equals(a.thicknessNm, b.thicknessNm)
        && Arrays.equals(a.material, b.material)
        && Arrays.deepEquals(a.n, b.n)
        && Arrays.deepEquals(a.k, b.k)
        && Arrays.equals(a.knob, b.knob);
  }

  private static Optional<String> sums(Subject subject, StackCase stack) {
    Weighted weighted = Weighted.of(subject, stack);
    for (int s = 0; s < weighted.sums(); s++) {
      double wanted = weighted.wanted(s);
      double is = weighted.response().sum[s];
      double bare = weighted.withoutErrors()[s];
      double allowed = Answer.EXACT * Math.max(1, Math.abs(wanted));
      if (!(Math.abs(is - wanted) <= allowed)) {
        return Optional.of("sum " + s + " is " + is + ", its rows and weights make " + wanted);
      }
      if (!(Math.abs(bare - is) <= allowed)) {
        return Optional.of(
            "sum " + s + " is " + bare + " without its error but " + is + " with it");
      }
    }
    return Optional.empty();
  }

  private static Optional<String> nan(Subject subject, StackCase stack) {
    Answer good = subject.answer(stack);
    try (PreparedSolver prepared = subject.prepare(stack);
        Evaluator evaluator = prepared.newEvaluator()) {
      for (Design bad : bad(stack)) {
        Response response = subject.spectra(prepared, stack);
        Optional<String> wrong = plausible(evaluator, bad, response);
        if (wrong.isPresent()) {
          return wrong;
        }
        evaluator.evaluate(stack.design(), response);
        wrong =
            Difference.first(stack, subject.answer(prepared, response, stack), good, 0)
                .map(text -> "after a design with NaN: " + text);
        if (wrong.isPresent()) {
          return wrong;
        }
      }
      return Optional.empty();
    }
  }

  private static List<Design> bad(StackCase stack) {
    List<Design> designs = new ArrayList<>();
    if (stack.layerCount() > 0) {
      Design thickness = stack.design();
      thickness.thicknessNm[0] = Double.NaN;
      designs.add(thickness);
      Design index = stack.design();
      index.n[2][0] = Double.NaN;
      index.revision[2] = Design.nextRevision();
      designs.add(index);
    }
    return designs;
  }

  private static Optional<String> plausible(Evaluator evaluator, Design bad, Response response) {
    try {
      evaluator.evaluate(bad, response);
    } catch (EvaluationFailed e) {
      return Optional.empty();
    }
    double total = response.reflectance[0][0] + response.transmittance[0][0];
    return Double.isFinite(total)
        ? Optional.of("a design with NaN got R + T = " + total + " at the first wavelength")
        : Optional.empty();
  }

  private static Optional<String> impossible(Subject subject, StackCase stack) {
    Problem plain = stack.problem();
    List<Optional<String>> refusals = new ArrayList<>();
    refusals.add(refused(subject, stack, "an option no-such-option", withOption(plain)));
    refusals.add(refused(subject, stack, "a layer with a feature of unknown kind", odd(plain)));
    if (!subject.solver().traits().oblique()) {
      refusals.add(
          refused(
              subject,
              stack,
              "light at 30 degrees, which its traits exclude,",
              plain.withIncidences(List.of(new Incidence(30, Polarisation.S, Side.FRONT)))));
    }
    if (!subject.solver().traits().incoherent()) {
      refusals.add(
          refused(
              subject,
              stack,
              "an incoherent layer, which its traits exclude,",
              withLayers(plain, List.of(Layer.plain("thick", false)))));
    }
    return refusals.stream().flatMap(Optional::stream).findFirst();
  }

  private static Problem withOption(Problem plain) {
    return plain.withOptions(Map.of("no-such-option", "1"));
  }

  private static Problem odd(Problem plain) {
    Feature unknown = () -> "no-such-feature";
    return withLayers(plain, List.of(new Layer("odd", true, List.of(unknown))));
  }

  private static Problem withLayers(Problem plain, List<Layer> layers) {
    return plain.withStack(
        layers, plain.incidentMaterial(), plain.exitMaterial(), plain.materialCount());
  }

  private static Optional<String> refused(
      Subject subject, StackCase stack, String what, Problem problem) {
    StackCase start =
        stack.layerCount() == 0 ? stack : stack.withLayers(stack.layers().subList(0, 1));
    try (PreparedSolver prepared = subject.prepare(problem, start)) {
      return Optional.of(what + " is accepted without a word");
    } catch (UnsupportedProblem e) {
      String message = e.getMessage();
      return message == null || message.isBlank() || message.contains("\n")
          ? Optional.of(what + " is refused with a message that is not one line: " + message)
          : Optional.empty();
    }
  }
}
