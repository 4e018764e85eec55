package evensun.material.dispersion;

/**
 * An amorphous absorber stated as an index: k = A (E − E_g)² / (E² − BE + C) and n = n∞ + (B₀E +
 * C₀) / (E² − BE + C) (Forouhi and Bloomer, Phys. Rev. B 34, 7018 (1986)), with B = 2 E₀ and C =
 * E₀² + Q². The published k does not vanish below its gap.
 *
 * @param strength A, in [0, 100]
 * @param peakEv E₀ = B/2 in eV, in [0.01, 100]
 * @param broadeningEv Q = √(C − B²/4) in eV, in [1e-3, 50]
 * @param gapEv E_g in eV, in [0, 50]
 * @param indexAtHighEnergy n∞ in [0.1, 10]
 */
public record ForouhiBloomer(
    double strength, double peakEv, double broadeningEv, double gapEv, double indexAtHighEnergy)
    implements Term {

  public ForouhiBloomer {
    Check.within("strength", strength, 0, 100);
    Check.within("peakEv", peakEv, 0.01, 100);
    Check.within("broadeningEv", broadeningEv, 1e-3, 50);
    Check.within("gapEv", gapEv, 0, 50);
    Check.within("indexAtHighEnergy", indexAtHighEnergy, 0.1, 10);
  }

  @Override
  public void addTo(double ev, double[] epsilon) {
    double b = 2 * peakEv;
    double c = peakEv * peakEv + broadeningEv * broadeningEv;
    double scale = strength / broadeningEv;
    double b0 = scale * (-0.5 * b * b + gapEv * b - gapEv * gapEv + c);
    double c0 = scale * (0.5 * b * (gapEv * gapEv + c) - 2 * gapEv * c);
    double denominator = ev * ev - b * ev + c;
    double k = strength * (ev - gapEv) * (ev - gapEv) / denominator;
    Term.index(indexAtHighEnergy + (b0 * ev + c0) / denominator, k, epsilon);
  }

  @Override
  public boolean causal() {
    return false;
  }
}
