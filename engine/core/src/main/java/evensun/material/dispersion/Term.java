package evensun.material.dispersion;

/**
 * One contribution to the relative permittivity ε(E) = ε∞ + Σ χ(E), with Im χ ≥ 0 where it absorbs.
 */
public sealed interface Term
    permits ConstantIndex, Cauchy, Sellmeier, Drude, Lorentz, TaucLorentz, ForouhiBloomer {

  /**
   * Adds χ at a photon energy.
   *
   * @param ev photon energy in eV, greater than 0
   * @param epsilon [0] real part, [1] imaginary part; both are added to
   */
  void addTo(double ev, double[] epsilon);

  /** Whether n follows from k by Kramers–Kronig. */
  default boolean causal() {
    return true;
  }

  /** Adds N² − 1 for N = n + ik. */
  static void index(double n, double k, double[] epsilon) {
    epsilon[0] += n * n - k * k - 1;
    epsilon[1] += 2 * n * k;
  }
}
