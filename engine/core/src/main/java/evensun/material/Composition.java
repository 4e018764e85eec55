package evensun.material;

/**
 * How the bandgap of an alloy follows from its composition: E(x) = a + b x + c x².
 *
 * @param element whose fraction x is, as spoken
 * @param atZeroEv a, in eV
 * @param linearEv b, in eV, greater than 0
 * @param bowingEv c, in eV, at least 0
 */
public record Composition(String element, double atZeroEv, double linearEv, double bowingEv) {

  public Composition {
    if (!(linearEv > 0 && bowingEv >= 0)) {
      throw new IllegalArgumentException(
          "a bandgap must rise with the composition but had slope "
              + linearEv
              + " eV and bowing "
              + bowingEv
              + " eV");
    }
  }

  /** Bandgap in eV of a fraction in [0, 1]. */
  public double bandgapEv(double fraction) {
    return atZeroEv + fraction * (linearEv + fraction * bowingEv);
  }

  /** The fraction that has a bandgap in eV; may leave [0, 1]. */
  public double fraction(double bandgapEv) {
    double rise = bandgapEv - atZeroEv;
    return 2 * rise / (linearEv + Math.sqrt(linearEv * linearEv + 4 * bowingEv * rise));
  }
}
