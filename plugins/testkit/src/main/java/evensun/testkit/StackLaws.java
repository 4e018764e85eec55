package evensun.testkit;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Collections;
import java.util.List;
import java.util.Optional;

/** Laws that compare the answers to two stacks that are physically the same, or mirrored. */
final class StackLaws {

  private static final CaseMedium OTHER = new CaseMedium(2.7, 0, 0.3);
  private static final double CUT = 0.375;

  private StackLaws() {}

  static List<Law> all() {
    return List.of(
        new CaseLaw(
            "zero-thickness",
            "a layer of zero thickness is absent",
            Cases::claimedBy,
            StackLaws::zeroThickness),
        new CaseLaw(
            "splitting",
            "a layer cut in two absorbs and transmits as before",
            Cases::claimedBy,
            StackLaws::splitting),
        new CaseLaw(
            "order-reversal",
            "light passes a stack between transparent media equally well from both sides",
            StackLaws::reciprocal,
            StackLaws::reversal));
  }

  private static Optional<String> zeroThickness(Subject subject, StackCase stack) {
    Answer without = subject.answer(stack);
    for (int at = 0; at <= stack.layerCount(); at++) {
      List<CaseLayer> more = new ArrayList<>(stack.layers());
      more.add(at, new CaseLayer(OTHER, 0, true));
      Answer with = subject.answer(stack.withLayers(more));
      double tolerance = with.tolerance + without.tolerance;
      int place = at + 1;
      Optional<String> wrong = Difference.first(stack, without(with, at), without, tolerance);
      if (wrong.isEmpty()) {
        double[] zeros = new double[stack.wavelengthCount()];
        wrong = Difference.first("its A", stack, with.absorptance[at], zeros, tolerance);
      }
      if (wrong.isPresent()) {
        return wrong.map(t -> "with a layer of 0 nm put in at place " + place + ": " + t);
      }
    }
    return Optional.empty();
  }

  private static Answer without(Answer answer, int layer) {
    List<double[]> rows = new ArrayList<>(Arrays.asList(answer.absorptance));
    rows.remove(layer);
    return new Answer(
        answer.reflectance, answer.transmittance, rows.toArray(new double[0][]), answer.tolerance);
  }

  private static Optional<String> splitting(Subject subject, StackCase stack) {
    Answer whole = subject.answer(stack);
    for (int l = 0; l < stack.layerCount(); l++) {
      CaseLayer layer = stack.layers().get(l);
      double upper = layer.thicknessNm() * CUT;
      StackCase cut =
          stack.replacing(
              l, layer.withThicknessNm(upper), layer.withThicknessNm(layer.thicknessNm() - upper));
      Answer parts = subject.answer(cut);
      int place = l + 1;
      Optional<String> wrong =
          Difference.first(stack, joined(parts, l), whole, 2 * (parts.tolerance + whole.tolerance));
      if (wrong.isPresent()) {
        return wrong.map(t -> "layer " + place + " cut in two: " + t);
      }
    }
    return Optional.empty();
  }

  /** The answer with the shares of two neighbours added. */
  private static Answer joined(Answer answer, int upper) {
    Answer joined = without(answer, upper + 1);
    double[] sum = answer.absorptance[upper].clone();
    for (int w = 0; w < sum.length; w++) {
      sum[w] += answer.absorptance[upper + 1][w];
    }
    joined.absorptance[upper] = sum;
    return joined;
  }

  /**
   * Cases the law holds for: transparent outer media, and transparent incoherent layers, since a
   * reflectance from inside an absorbing one is a convention. At an angle the mirrored light has to
   * exist: no total reflection.
   */
  private static List<StackCase> reciprocal(Subject subject) {
    return Cases.claimedBy(subject).stream()
        .map(c -> c.withMedia(c.incident(), CaseMedium.of(c.exit().n(), 0)))
        .filter(StackLaws::isReciprocal)
        .toList();
  }

  private static boolean isReciprocal(StackCase stack) {
    return stack.exit().k() == 0
        && stack.exit().slope() == 0
        && sineBehind(stack) < 0.999
        && stack.layers().stream().allMatch(l -> l.coherent() || l.medium().k() == 0);
  }

  private static double sineBehind(StackCase stack) {
    double sine = Math.sin(Math.toRadians(stack.angleDeg()));
    return stack.incident().n() * sine / stack.exit().n();
  }

  private static Optional<String> reversal(Subject subject, StackCase stack) {
    if (!isReciprocal(stack)) {
      return Optional.empty();
    }
    List<CaseLayer> reversed = new ArrayList<>(stack.layers());
    Collections.reverse(reversed);
    StackCase mirrored =
        stack
            .withLayers(reversed)
            .withMedia(stack.exit(), stack.incident())
            .withLight(Math.toDegrees(Math.asin(sineBehind(stack))), stack.polarisation());
    Answer forth = subject.answer(stack);
    Answer back = subject.answer(mirrored);
    return Difference.first(
            "T", stack, back.transmittance, forth.transmittance, forth.tolerance + back.tolerance)
        .map(text -> "from behind: " + text);
  }
}
