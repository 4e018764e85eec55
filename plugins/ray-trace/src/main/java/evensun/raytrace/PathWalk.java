package evensun.raytrace;

import evensun.raytrace.kernel.Attenuation;
import evensun.raytrace.kernel.LightTree;
import java.util.OptionalDouble;

/** How far light goes in a medium that would not absorb it. */
final class PathWalk {

  private final LitDevice lit;
  private final LightTree tree;
  private final int w;
  private final int slot;
  private final double thicknessUm;

  PathWalk(LitDevice lit, LightTree tree, int w, int slot, double thicknessUm) {
    this.lit = lit;
    this.tree = tree;
    this.w = w;
    this.slot = slot;
    this.thicknessUm = thicknessUm;
  }

  /**
   * Mean path over the light that comes in from other media, in thicknesses.
   *
   * @param s share of the light in s
   */
  OptionalDouble mean(double s) {
    Attenuation clear = new Attenuation(tree);
    for (int leg = 0; leg < clear.absorbed.length; leg++) {
      clear.absorbed[leg] = crosses(leg) ? 0 : lit.attenuation(w).absorbed[leg];
    }
    clear.settle(tree);
    double path = 0;
    double entered = 0;
    for (int r = 0; r + 1 < tree.start.length; r++) {
      lit.follow(w, r, s, 1 - s, clear);
      for (int leg = 2 * tree.start[r]; leg < 2 * tree.start[r + 1]; leg++) {
        if (crosses(leg)) {
          double power = lit.weighing().power(leg);
          path += power * (tree.fixedUm[leg] + tree.perThickness[leg] * thicknessUm);
          entered += comesFrom(leg) ? power : 0;
        }
      }
    }
    return entered > 0 ? OptionalDouble.of(path / entered / thicknessUm) : OptionalDouble.empty();
  }

  private boolean crosses(int leg) {
    return tree.slot[leg] == slot && tree.fixedUm[leg] != Float.POSITIVE_INFINITY;
  }

  /** Whether a leg starts in another medium: its meeting was reached by a leg booked elsewhere. */
  private boolean comesFrom(int leg) {
    int before = tree.parent[leg / 2];
    return before < 0 || tree.slot[before] != slot;
  }
}
