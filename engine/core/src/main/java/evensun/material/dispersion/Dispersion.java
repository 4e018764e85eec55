package evensun.material.dispersion;

import java.util.List;

/**
 * A sum of terms, ε(E) = ε∞ + Σ χ(E).
 *
 * @param epsilonInfinity ε∞ in [0, 100]; 1 where no term stands for the absorption far beyond
 * @param terms the terms, at least one
 */
public record Dispersion(double epsilonInfinity, List<Term> terms) {

  public Dispersion {
    Check.within("epsilonInfinity", epsilonInfinity, 0, 100);
    terms = List.copyOf(terms);
    if (terms.isEmpty()) {
      throw new IllegalArgumentException("terms must name at least one model");
    }
  }

  /**
   * The permittivity at a photon energy.
   *
   * @param ev in eV
   * @param epsilon out: [0] real part, [1] imaginary part
   */
  public void permittivity(double ev, double[] epsilon) {
    epsilon[0] = epsilonInfinity;
    epsilon[1] = 0;
    for (Term term : terms) {
      term.addTo(ev, epsilon);
    }
  }

  /**
   * The complex index at a photon energy.
   *
   * @param ev in eV
   * @param index out: [0] n, [1] k
   */
  public void index(double ev, double[] index) {
    permittivity(ev, index);
    double real = index[0];
    double imaginary = Math.max(0, index[1]);
    double modulus = Math.hypot(real, imaginary);
    index[0] = Math.sqrt(0.5 * (modulus + real));
    index[1] = real < 0 ? Math.sqrt(0.5 * (modulus - real)) : 0.5 * imaginary / index[0];
  }
}
