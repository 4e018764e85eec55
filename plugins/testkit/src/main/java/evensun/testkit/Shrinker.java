package evensun.testkit;

import evensun.spi.Polarisation;
import evensun.spi.Samples;
import java.util.ArrayList;
import java.util.List;
import java.util.function.Predicate;

/** Makes a failing case as small and as plain as it gets while it still fails. */
final class Shrinker {

  private static final int MOST_ROUNDS = 200;

  private Shrinker() {}

  static StackCase shrink(StackCase failing, Predicate<StackCase> fails) {
    StackCase smallest = failing;
    for (int round = 0; round < MOST_ROUNDS; round++) {
      StackCase smaller = smaller(smallest, fails);
      if (smaller == null) {
        return smallest;
      }
      smallest = smaller;
    }
    return smallest;
  }

  private static StackCase smaller(StackCase stack, Predicate<StackCase> fails) {
    for (StackCase candidate : candidates(stack)) {
      if (!candidate.equals(stack) && fails.test(candidate)) {
        return candidate;
      }
    }
    return null;
  }

  private static List<StackCase> candidates(StackCase stack) {
    List<StackCase> found = new ArrayList<>();
    for (int l = 0; l < stack.layerCount(); l++) {
      found.add(stack.replacing(l));
    }
    if (stack.wavelengthCount() > 1) {
      for (int w = 0; w < stack.wavelengthCount(); w++) {
        found.add(stack.withWavelengthNm(Samples.of(stack.wavelengthNm().at(w))));
      }
    }
    found.add(stack.withLight(0, Polarisation.UNPOLARISED));
    if (stack.angleDeg() > 0) {
      found.add(stack.withLight(stack.angleDeg(), Polarisation.S));
      found.add(stack.withLight(Math.floor(stack.angleDeg() / 10) * 10, stack.polarisation()));
    }
    found.add(stack.withMedia(CaseMedium.of(1, 0), stack.exit()));
    plainer(stack.exit()).forEach(exit -> found.add(stack.withMedia(stack.incident(), exit)));
    for (int l = 0; l < stack.layerCount(); l++) {
      addPlainerLayers(stack, l, found);
    }
    return found;
  }

  private static void addPlainerLayers(StackCase stack, int l, List<StackCase> found) {
    CaseLayer layer = stack.layers().get(l);
    found.add(stack.replacing(l, layer.withThicknessNm(100)));
    found.add(stack.replacing(l, new CaseLayer(layer.medium(), layer.thicknessNm(), true)));
    for (CaseMedium medium : plainer(layer.medium())) {
      found.add(stack.replacing(l, new CaseLayer(medium, layer.thicknessNm(), layer.coherent())));
    }
  }

  /** Always towards plainer, or shrinking would not end. */
  private static List<CaseMedium> plainer(CaseMedium medium) {
    List<CaseMedium> found = new ArrayList<>();
    if (medium.slope() != 0) {
      found.add(new CaseMedium(medium.n(), 0, medium.k()));
    }
    if (medium.k() != 0) {
      found.add(new CaseMedium(medium.n(), medium.slope(), 0));
    }
    if (medium.k() != 0 && medium.k() != 0.1) {
      found.add(new CaseMedium(medium.n(), medium.slope(), 0.1));
    }
    if (medium.n() != 2 && medium.n() != 1) {
      found.add(new CaseMedium(2, medium.slope(), medium.k()));
    }
    return found;
  }
}
