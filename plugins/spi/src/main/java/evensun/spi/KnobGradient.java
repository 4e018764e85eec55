package evensun.spi;

/** Ability: the sums of a response with their derivatives by the knobs of the features. */
public interface KnobGradient {

  /**
   * Evaluates and differentiates.
   *
   * @param design the candidate
   * @param response filled as by {@link Evaluator#evaluate}; its sums must be wanted
   * @param into [s*K + index] ∂ sum[s] / ∂ knob[index], per unit of the knob
   */
  void evaluate(Design design, Response response, double[] into);
}
