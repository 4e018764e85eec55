package evensun.testkit;

import evensun.spi.Feature;
import evensun.spi.HeightMap;
import evensun.spi.Layer;
import evensun.spi.Mixture;
import evensun.spi.Parameter;
import evensun.spi.PreparedSolver;
import evensun.spi.Problem;
import evensun.spi.Samples;
import evensun.spi.Scatter;
import evensun.spi.Side;
import evensun.spi.Texture;
import evensun.spi.UnsupportedProblem;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.IntFunction;

/** Laws about features at their limits, where a layer is as flat, uniform and pure as without. */
final class FeatureLaws {

  /** A feature makes a preparation dear, so that few cases have to do. */
  private static final int MOST_CASES = 12;

  /** A surface without heights, wider than any film is thick; as few points as a map has. */
  private static final HeightMap EVEN = new HeightMap(2, 2, 1e4, Samples.of(0, 0, 0, 0));

  /** Light so weak that all lots of a statistical solver may have missed it, and its error too. */
  private static final double WEAK = 1e-4;

  private FeatureLaws() {}

  static List<Law> all() {
    return List.of(
        law(
            "mixture-of-one",
            "a mixture that holds one component alone is that component",
            Mixture.KIND,
            FeatureLaws::alone),
        law(
            "scatter-nothing",
            "a boundary that keeps all directions is flat",
            Scatter.KIND,
            layer -> new Scatter(1, 1, Side.FRONT)),
        law(
            "even-surface",
            "a measured surface without heights is flat",
            Texture.KIND,
            layer -> even()));
  }

  private static Law law(String name, String promise, String kind, IntFunction<Feature> limit) {
    return new CaseLaw(
        name,
        promise,
        subject -> claimed(subject, kind, limit),
        (subject, stack) -> violation(subject, stack, limit));
  }

  private static List<StackCase> claimed(Subject subject, String kind, IntFunction<Feature> limit) {
    return subject.solver().traits().features().contains(kind)
        ? Cases.claimedBy(subject).stream()
            .limit(MOST_CASES)
            .filter(stack -> takes(subject, stack, limit.apply(0)))
            .toList()
        : List.of();
  }

  /** A chain claims what the solver below it may take, and refuses it where that one does not. */
  private static boolean takes(Subject subject, StackCase stack, Feature feature) {
    try (PreparedSolver prepared = subject.prepare(with(stack.problem(), 0, feature), stack)) {
      return true;
    } catch (UnsupportedProblem e) {
      return false;
    }
  }

  private static Optional<String> violation(
      Subject subject, StackCase stack, IntFunction<Feature> limit) {
    Answer without = subject.answer(stack);
    for (int l = 0; l < stack.layerCount(); l++) {
      Answer with = subject.answer(with(stack.problem(), l, limit.apply(l)), stack);
      int place = l + 1;
      Optional<String> wrong =
          Difference.first(
              stack, with, without, with.tolerance + without.tolerance + weak(subject));
      if (wrong.isPresent()) {
        return wrong.map(text -> "at layer " + place + ": " + text);
      }
    }
    return Optional.empty();
  }

  private static double weak(Subject subject) {
    return subject.solver().traits().statistical() ? WEAK : 0;
  }

  private static Problem with(Problem problem, int layer, Feature feature) {
    List<Layer> layers = new ArrayList<>(problem.layers());
    layers.set(layer, layers.get(layer).withFeatures(List.of(feature)));
    return problem.withStack(
        layers, problem.incidentMaterial(), problem.exitMaterial(), problem.materialCount());
  }

  /** All of the layer's own material, numbered after those of the outer media. */
  private static Mixture alone(int layer) {
    return Mixture.bruggeman(
        List.of(
            Mixture.Component.fixed("own", layer + 2, 1), Mixture.Component.fixed("none", 0, 0)));
  }

  private static Texture even() {
    return new Texture(
        Texture.Shape.HEIGHT_MAP,
        Texture.Direction.UP,
        Texture.Arrangement.GRID,
        Parameter.fixed(0),
        0,
        Optional.of(EVEN),
        Side.FRONT);
  }
}
