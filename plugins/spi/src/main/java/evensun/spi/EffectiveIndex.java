package evensun.spi;

/** Ability: the optical constants that stand for a mixed or graded layer. */
public interface EffectiveIndex {

  /**
   * Finds the effective index.
   *
   * @param design the candidate
   * @param layer index of a layer with a {@link Mixture} or a {@link Grading}
   * @param relativeDepth depth below the upper face over thickness, in [0, 1]; of no effect in a
   *     mixture
   * @param n [w] out: effective refractive index
   * @param k [w] out: effective extinction coefficient
   * @throws IllegalArgumentException for a layer of one material
   */
  void evaluate(Design design, int layer, double relativeDepth, double[] n, double[] k);
}
