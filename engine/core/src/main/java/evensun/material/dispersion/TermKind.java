package evensun.material.dispersion;

import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;

/** The models by the name they have in scenarios, with the keys of their parameters in order. */
public enum TermKind {
  /** {@link ConstantIndex}. */
  CONSTANT(
      "constant",
      List.of("refractiveIndex", "extinctionCoefficient"),
      p -> new ConstantIndex(p[0], p[1])),
  /** {@link Cauchy}. */
  CAUCHY(
      "cauchy",
      List.of("indexAtLongWavelength", "dispersionUm2", "dispersionUm4"),
      p -> new Cauchy(p[0], p[1], p[2])),
  /** {@link Sellmeier}. */
  SELLMEIER("sellmeier", List.of("strength", "resonanceNm"), p -> new Sellmeier(p[0], p[1])),
  /** {@link Drude}. */
  DRUDE("drude", List.of("plasmaEnergyEv", "dampingEv"), p -> new Drude(p[0], p[1])),
  /** {@link Lorentz}. */
  LORENTZ(
      "lorentz", List.of("strength", "peakEv", "broadeningEv"), p -> new Lorentz(p[0], p[1], p[2])),
  /** {@link TaucLorentz}. */
  TAUC_LORENTZ(
      "tauc-lorentz",
      List.of("peakEv", "strengthEv", "broadeningEv", "gapEv"),
      p -> new TaucLorentz(p[0], p[1], p[2], p[3])),
  /** {@link ForouhiBloomer}. */
  FOROUHI_BLOOMER(
      "forouhi-bloomer",
      List.of("strength", "peakEv", "broadeningEv", "gapEv", "indexAtHighEnergy"),
      p -> new ForouhiBloomer(p[0], p[1], p[2], p[3], p[4]));

  private final String key;
  private final List<String> parameters;
  private final Function<double[], Term> maker;

  TermKind(String key, List<String> parameters, Function<double[], Term> maker) {
    this.key = key;
    this.parameters = parameters;
    this.maker = maker;
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
    return maker.apply(values);
  }

  /** The kind of a name, or empty. */
  public static Optional<TermKind> named(String key) {
    return Arrays.stream(values()).filter(kind -> kind.key.equals(key)).findFirst();
  }
}
