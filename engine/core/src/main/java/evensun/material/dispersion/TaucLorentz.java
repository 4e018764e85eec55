package evensun.material.dispersion;

/**
 * An amorphous absorber: Tauc's joint density of states times a Lorentz oscillator, ε₂ = A E₀ C (E
 * − E_g)² / [((E² − E₀²)² + C²E²) E] above the gap and zero below, ε₁ its Kramers–Kronig transform
 * in closed form (Jellison and Modine, Appl. Phys. Lett. 69, 371 and 2137 (1996)).
 *
 * @param peakEv E₀ in eV, in [0.01, 100]
 * @param strengthEv A in eV, in [0, 10000]
 * @param broadeningEv C in eV, in [1e-3, 2 E₀)
 * @param gapEv E_g in eV, in [0.01, 50]
 */
public record TaucLorentz(double peakEv, double strengthEv, double broadeningEv, double gapEv)
    implements Term {

  public TaucLorentz {
    Check.within("peakEv", peakEv, 0.01, 100);
    Check.within("strengthEv", strengthEv, 0, 10000);
    Check.within("broadeningEv", broadeningEv, 1e-3, 1.999 * peakEv);
    Check.within("gapEv", gapEv, 0.01, 50);
  }

  @Override
  public void addTo(double ev, double[] epsilon) {
    epsilon[0] += real(ev);
    epsilon[1] += imaginary(ev);
  }

  private double imaginary(double e) {
    if (e <= gapEv) {
      return 0;
    }
    double detuning = e * e - peakEv * peakEv;
    double rise = e - gapEv;
    return strengthEv
        * peakEv
        * broadeningEv
        * rise
        * rise
        / ((detuning * detuning + broadeningEv * broadeningEv * e * e) * e);
  }

  private double real(double e) {
    double a = strengthEv;
    double c = broadeningEv;
    double c2 = c * c;
    double p2 = peakEv * peakEv;
    double g = gapEv;
    double g2 = g * g;
    double e2 = e * e;
    double alpha = Math.sqrt(4 * p2 - c2);
    double gamma2 = p2 - 0.5 * c2;
    double zeta4 = (e2 - gamma2) * (e2 - gamma2) + 0.25 * alpha * alpha * c2;
    double logWeight = (g2 - p2) * e2 + g2 * c2 - p2 * (p2 + 3 * g2);
    double arcWeight = (e2 - p2) * (p2 + g2) + g2 * c2;
    double log = Math.log((p2 + g2 + alpha * g) / (p2 + g2 - alpha * g));
    double arcs = Math.PI - Math.atan((2 * g + alpha) / c) + Math.atan((alpha - 2 * g) / c);
    double middle = Math.PI + 2 * Math.atan(2 * (gamma2 - g2) / (alpha * c));
    double sum =
        a * c * logWeight / (2 * alpha * peakEv) * log
            - a * arcWeight / peakEv * arcs
            + 2 * a * peakEv / alpha * g * (e2 - gamma2) * middle
            + a * peakEv * c * edges(e);
    return sum / (Math.PI * zeta4);
  }

  /** The two logarithms that are singular at the gap, where together they vanish. */
  private double edges(double e) {
    double c2 = broadeningEv * broadeningEv;
    double g = gapEv;
    double distance = Math.max(Math.abs(e - g), 1e-12);
    double square = peakEv * peakEv - g * g;
    double scale = Math.sqrt(square * square + g * g * c2);
    return -(e * e + g * g) / e * Math.log(distance / (e + g))
        + 2 * g * Math.log(distance * (e + g) / scale);
  }
}
