package evensun.material.dispersion;

/**
 * Free carriers, χ = −Eₚ²/(E² + iΓE) (Drude 1900).
 *
 * @param plasmaEnergyEv unscreened plasma energy Eₚ in eV, in [0, 50]
 * @param dampingEv Γ in eV, in [1e-4, 10]
 */
public record Drude(double plasmaEnergyEv, double dampingEv) implements Term {

  public Drude {
    Check.within("plasmaEnergyEv", plasmaEnergyEv, 0, 50);
    Check.within("dampingEv", dampingEv, 1e-4, 10);
  }

  @Override
  public void addTo(double ev, double[] epsilon) {
    double scale = plasmaEnergyEv * plasmaEnergyEv / (ev * ev + dampingEv * dampingEv);
    epsilon[0] -= scale;
    epsilon[1] += scale * dampingEv / ev;
  }
}
