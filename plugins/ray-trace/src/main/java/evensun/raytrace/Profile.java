package evensun.raytrace;

import evensun.raytrace.kernel.LightTree;
import evensun.raytrace.trace.Forest;
import evensun.raytrace.trace.Slots;
import evensun.spi.Design;
import evensun.spi.Polarisation;
import java.util.Arrays;

/**
 * Absorption against depth in one thick layer: every crossing absorbs along its way; what stays
 * within the height of a texture counts as spread over that height.
 */
final class Profile {

  private final LitDevice lit;
  private final Forest forest;
  private final int medium;
  private final int slot;
  private final double thicknessUm;
  private final double[] depthUm;
  private double alphaPerUm;
  private double[] density; // [z] per µm
  private double taken;

  /**
   * A profile.
   *
   * @param lit made ready for the design
   * @param medium the thick layer
   * @param depthNm [z] depths below its upper face
   */
  Profile(LitDevice lit, Design design, int medium, double[] depthNm) {
    this.lit = lit;
    this.medium = medium;
    forest = lit.traced().forest();
    slot = new Slots(lit.traced().device().mediaCount()).in(medium);
    thicknessUm = lit.traced().device().thicknessUm(design, medium);
    depthUm = Arrays.stream(depthNm).map(nm -> nm / 1000).toArray();
  }

  /**
   * Finds the profile of a wavelength.
   *
   * @param absorptance of the whole layer, which the profile adds up to
   * @param into [z][w] out: absorbed fraction per nm
   */
  void solve(Design design, Polarisation light, int w, double absorptance, double[][] into) {
    alphaPerUm = lit.alphaPerUm(design, medium, w);
    density = new double[depthUm.length];
    taken = 0;
    double s = light == Polarisation.S ? 1 : light == Polarisation.P ? 0 : 0.5;
    LightTree tree = forest.trees().get(w);
    for (int r = 0; r < forest.replicates(); r++) {
      lit.follow(w, r, s, 1 - s, lit.attenuation(w));
      for (int leg = 2 * tree.start[r]; leg < 2 * tree.start[r + 1]; leg++) {
        if (tree.slot[leg] == slot) {
          add(tree, leg, lit.attenuation(w).absorbed[leg]);
        }
      }
    }
    double scale = taken > 0 ? absorptance / taken / 1000 : 0;
    for (int z = 0; z < depthUm.length; z++) {
      into[z][w] = scale * density[z];
    }
  }

  private void add(LightTree tree, int leg, double absorbed) {
    double power = lit.weighing().power(leg) * absorbed;
    if (power == 0) {
      return;
    }
    taken += power;
    int table = tree.table[leg / 2];
    int boundary = table == 2 * lit.traced().faces().size() ? fresh() : table / 2;
    boolean down = boundary < medium;
    if (tree.perThickness[leg] == 0) {
      addAtFace(power, boundary, down);
    } else {
      addAlong(power, tree.fixedUm[leg], tree.perThickness[leg], down);
    }
  }

  private int fresh() {
    return lit.traced().forest().angles().freshBoundary();
  }

  private void addAtFace(double power, int boundary, boolean down) {
    var face = lit.traced().faces().get(boundary);
    double height = Math.min(thicknessUm, face.aboveMeanUm() + face.belowMeanUm());
    for (int z = 0; z < depthUm.length; z++) {
      double away = down ? depthUm[z] : thicknessUm - depthUm[z];
      density[z] += away <= height ? power / height : 0;
    }
  }

  private void addAlong(double power, double fixedUm, double perThickness, boolean down) {
    boolean opaque = fixedUm == Double.POSITIVE_INFINITY;
    double steep = perThickness + (opaque ? 0 : fixedUm / thicknessUm);
    double rate = alphaPerUm * steep;
    double all = -Math.expm1(-rate * thicknessUm);
    double first = all > 0 ? power * rate / all : power / thicknessUm;
    for (int z = 0; z < depthUm.length; z++) {
      double away = down ? depthUm[z] : thicknessUm - depthUm[z];
      density[z] += first * Math.exp(-rate * away);
    }
  }
}
