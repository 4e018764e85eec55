package evensun.material.dispersion;

import java.util.List;
import java.util.Optional;

/** The models by the name they have in scenarios, with the keys of their parameters in order. */
public enum TermKind {
  /** {@link ConstantIndex}. */
  CONSTANT("constant", List.of("refractiveIndex", "extinctionCoefficient")),
  /** {@link Cauchy}. */
  CAUCHY("cauchy", List.of("indexAtLongWavelength", "dispersionUm2", "dispersionUm4")),
  /** {@link Sellmeier}. */
  SELLMEIER("sellmeier", List.of("strength", "resonanceNm")),
  /** {@link Drude}. */
  DRUDE("drude", List.of("plasmaEnergyEv", "dampingEv")),
  /** {@link Lorentz}. */
  LORENTZ("lorentz", List.of("strength", "peakEv", "broadeningEv")),
  /** {@link TaucLorentz}. */
  TAUC_LORENTZ("tauc-lorentz", List.of("peakEv", "strengthEv", "broadeningEv", "gapEv")),
  /** {@link ForouhiBloomer}. */
  FOROUHI_BLOOMER(
      "forouhi-bloomer",
      List.of("strength", "peakEv", "broadeningEv", "gapEv", "indexAtHighEnergy"));

  private final String key;
  private final List<String> parameters;

  TermKind(String key, List<String> parameters) {
    this.key = key;
    this.parameters = parameters;
  }

  /** Name in scenarios. */
  public String key() {
    return key;
  }

  /** Keys of its parameters, all required, in the order of {@link #of}. */
  public List<String> parameters() {
    return parameters;
  }

  /**
   * A term.
   *
   * @param values in the order of {@link #parameters()}
   * @throws IllegalArgumentException naming the parameter that is out of its range
   */
  public Term of(double... values) {
    double[] p = values;
    return switch (this) {
      case CONSTANT -> new ConstantIndex(p[0], p[1]);
      case CAUCHY -> new Cauchy(p[0], p[1], p[2]);
      case SELLMEIER -> new Sellmeier(p[0], p[1]);
      case DRUDE -> new Drude(p[0], p[1]);
      case LORENTZ -> new Lorentz(p[0], p[1], p[2]);
      case TAUC_LORENTZ -> new TaucLorentz(p[0], p[1], p[2], p[3]);
      case FOROUHI_BLOOMER -> new ForouhiBloomer(p[0], p[1], p[2], p[3], p[4]);
    };
  }

  /** The kind of a name, or empty. */
  public static Optional<TermKind> named(String key) {
    for (TermKind kind : values()) {
      if (kind.key.equals(key)) {
        return Optional.of(kind);
      }
    }
    return Optional.empty();
  }
}
