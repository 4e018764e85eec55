package evensun.material.dispersion;

import evensun.light.Constants;

/**
 * A resonance without loss, χ = s λ²/(λ² − λ₀²) (Sellmeier 1871); to be used away from λ₀.
 *
 * @param strength s in [0, 100]
 * @param resonanceNm λ₀ in nm, in [0, 1e6]
 */
public record Sellmeier(double strength, double resonanceNm) implements Term {

  public Sellmeier {
    Check.within("strength", strength, 0, 100);
    Check.within("resonanceNm", resonanceNm, 0, 1e6);
  }

  @Override
  public void addTo(double ev, double[] epsilon) {
    double nm = Constants.HC_EV_NM / ev;
    epsilon[0] += strength * nm * nm / (nm * nm - resonanceNm * resonanceNm);
  }
}
