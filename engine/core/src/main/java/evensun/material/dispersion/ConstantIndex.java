package evensun.material.dispersion;

/**
 * The same complex index at every wavelength.
 *
 * @param refractiveIndex n in [0.01, 20]
 * @param extinctionCoefficient k in [0, 20]
 */
public record ConstantIndex(double refractiveIndex, double extinctionCoefficient) implements Term {

  public ConstantIndex {
    Check.within("refractiveIndex", refractiveIndex, 0.01, 20);
    Check.within("extinctionCoefficient", extinctionCoefficient, 0, 20);
  }

  @Override
  public void addTo(double ev, double[] epsilon) {
    Term.index(refractiveIndex, extinctionCoefficient, epsilon);
  }

  @Override
  public boolean causal() {
    return extinctionCoefficient == 0;
  }
}
