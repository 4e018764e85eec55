package evensun.raytrace.kernel;

/** How much of the light of one wavelength stays on its ways. Owned by one thread. */
public final class Attenuation {

  /** [2 · event + leg] share that stays on the way. */
  public final float[] absorbed;

  /**
   * [event] what is left of the light that its leg began with, times what it stands for where light
   * goes on by lot.
   */
  public final double[] arriving;

  /** For the legs of a tree; nothing stays yet. */
  public Attenuation(LightTree tree) {
    absorbed = new float[2 * tree.count];
    arriving = new double[tree.count];
  }

  /** Finds what arrives; to be called once the shares that stay are set. */
  public void settle(LightTree tree) {
    for (int e = 0; e < tree.count; e++) {
      int by = tree.parent[e];
      arriving[e] = by < 0 ? tree.factor[e] : tree.factor[e] * (1.0 - absorbed[by]);
    }
  }
}
