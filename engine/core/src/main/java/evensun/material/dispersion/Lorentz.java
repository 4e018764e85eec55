package evensun.material.dispersion;

/**
 * A damped oscillator, χ = s E₀²/(E₀² − E² − iΓE) (Lorentz 1906).
 *
 * @param strength s, its share of the permittivity at low energy, in [0, 1000]
 * @param peakEv E₀ in eV, in [1e-3, 100]
 * @param broadeningEv Γ in eV, in [1e-4, 50]
 */
public record Lorentz(double strength, double peakEv, double broadeningEv) implements Term {

  public Lorentz {
    Check.within("strength", strength, 0, 1000);
    Check.within("peakEv", peakEv, 1e-3, 100);
    Check.within("broadeningEv", broadeningEv, 1e-4, 50);
  }

  @Override
  public void addTo(double ev, double[] epsilon) {
    double square = peakEv * peakEv;
    double detuning = square - ev * ev;
    double loss = broadeningEv * ev;
    double scale = strength * square / (detuning * detuning + loss * loss);
    epsilon[0] += scale * detuning;
    epsilon[1] += scale * loss;
  }
}
