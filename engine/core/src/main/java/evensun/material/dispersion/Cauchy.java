package evensun.material.dispersion;

import evensun.light.Constants;

/**
 * Index of a transparent medium, n = a + b/λ² + c/λ⁴ with λ in µm (Cauchy 1837).
 *
 * @param indexAtLongWavelength a in [0.5, 10]
 * @param dispersionUm2 b in µm², in [-10, 10]
 * @param dispersionUm4 c in µm⁴, in [-10, 10]
 */
public record Cauchy(double indexAtLongWavelength, double dispersionUm2, double dispersionUm4)
    implements Term {

  public Cauchy {
    Check.within("indexAtLongWavelength", indexAtLongWavelength, 0.5, 10);
    Check.within("dispersionUm2", dispersionUm2, -10, 10);
    Check.within("dispersionUm4", dispersionUm4, -10, 10);
  }

  @Override
  public void addTo(double ev, double[] epsilon) {
    double um = Constants.HC_EV_NM / ev / 1000;
    double inverse = 1 / (um * um);
    Term.index(
        indexAtLongWavelength + inverse * (dispersionUm2 + inverse * dispersionUm4), 0, epsilon);
  }
}
