package evensun.spi;

/** Ability: the sums of a response with their derivatives by thickness, in one sweep. */
public interface Gradient {

  /**
   * Evaluates and differentiates.
   *
   * @param design the candidate
   * @param response filled as by {@link Evaluator#evaluate}; its sums must be wanted
   * @param into [s*L + l] ∂ sum[s] / ∂ thicknessNm[l], per nm
   */
  void evaluate(Design design, Response response, double[] into);
}
