package evensun.testkit;

/**
 * A finite layer of a case.
 *
 * @param medium what it consists of
 * @param thicknessNm thickness in nm, at least 0
 * @param coherent whether waves interfere inside
 */
public record CaseLayer(CaseMedium medium, double thicknessNm, boolean coherent) {

  /** This layer, thicker or thinner. */
  public CaseLayer withThicknessNm(double other) {
    return new CaseLayer(medium, other, coherent);
  }
}
