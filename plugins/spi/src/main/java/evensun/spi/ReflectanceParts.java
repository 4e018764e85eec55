package evensun.spi;

/** Ability: reflectance split into light that never entered and light that came back out. */
public interface ReflectanceParts {

  /**
   * Splits the reflectance; the two parts sum to it.
   *
   * @param design the candidate
   * @param incidence index of the incidence, in [0, I)
   * @param neverEntered [w] out: share of the incident light that was reflected before it reached
   *     the first thick absorbing layer
   * @param cameBack [w] out: share that had been inside and left through the front
   */
  void evaluate(Design design, int incidence, double[] neverEntered, double[] cameBack);
}
