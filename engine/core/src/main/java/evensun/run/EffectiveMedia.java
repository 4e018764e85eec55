package evensun.run;

import evensun.evaluation.Bench;
import evensun.evaluation.LayerWords;
import evensun.result.MaterialUse;
import evensun.spi.Design;
import evensun.spi.EffectiveIndex;
import evensun.spi.Feature;
import evensun.spi.Grading;
import evensun.spi.Mixture;
import evensun.stack.MaterialSlot;
import evensun.stack.ResolvedLayer;
import evensun.stack.ResolvedStack;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/** Records the optical constants that stand for mixed and graded layers of a design. */
final class EffectiveMedia {

  private EffectiveMedia() {}

  /** One record per mixed layer; none where the solver does not tell. */
  static List<MaterialUse> of(Bench bench) {
    return bench.ability(EffectiveIndex.class).map(index -> uses(bench, index)).orElse(List.of());
  }

  private static List<MaterialUse> uses(Bench bench, EffectiveIndex index) {
    ResolvedStack stack = bench.model().stack();
    List<MaterialUse> uses = new ArrayList<>();
    for (int l = 0; l < stack.layers().size(); l++) {
      if (stack.layers().get(l).isMixed() && stack.layers().get(l).spec().present()) {
        uses.add(use(stack, bench.design(), index, l));
      }
    }
    return uses;
  }

  private static MaterialUse use(ResolvedStack stack, Design design, EffectiveIndex index, int l) {
    ResolvedLayer layer = stack.layers().get(l);
    double[] n = new double[stack.grid().size()];
    double[] k = new double[stack.grid().size()];
    index.evaluate(design, l, 0.5, n, k);
    boolean mixture = layer.features().stream().anyMatch(Mixture.class::isInstance);
    MaterialSlot first = stack.slots().get(layer.components().get(0).slot());
    return new MaterialUse(
        LayerWords.material(stack, layer),
        "effective medium of " + layer.name() + (mixture ? "" : " at half its depth"),
        List.of(layer.name()),
        "computed from its components by the rule " + rule(layer),
        mixture ? "mixture" : "graded",
        stack.grid().fromNm(),
        stack.grid().toNm(),
        first.material().record().temperatureK(),
        null,
        false,
        LayerWords.features(stack, layer, design),
        Arrays.stream(n).boxed().toList(),
        Arrays.stream(k).boxed().toList());
  }

  private static String rule(ResolvedLayer layer) {
    for (Feature feature : layer.features()) {
      if (feature instanceof Mixture mixture) {
        return mixture.rule().id();
      }
      if (feature instanceof Grading grading) {
        return grading.rule().id();
      }
    }
    throw new IllegalArgumentException("layer " + layer.name() + " is of one material");
  }
}
