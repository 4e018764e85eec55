package evensun.spi;

/** Ability: absorption against depth. */
public interface DepthProfile {

  /**
   * Absorbed fraction of the incident light per nm of depth; its integral over the layer is the
   * absorptance.
   *
   * @param design the candidate
   * @param incidence index of the incidence, in [0, I)
   * @param channel which layer or component
   * @param depthNm [z] depths below the layer's upper face in nm, in [0, thickness]
   * @param into [z][w] absorbed fraction per nm
   * @throws EvaluationFailed where the solver knows how much a channel absorbs, but not where
   */
  void evaluate(Design design, int incidence, Channel channel, double[] depthNm, double[][] into);
}
