package evensun.spi;

import java.util.Arrays;
import java.util.Optional;

/**
 * A rule for the effective permittivity ε of a fine mixture of components with volume fractions fᵢ
 * and permittivities εᵢ.
 */
public enum MixingRule {
  /**
   * Σ fᵢ (εᵢ − ε) / (ε + P (εᵢ − ε)) = 0 with the depolarisation factor P, 1/3 for spheres: every
   * component alike (Bruggeman, Ann. Phys. 416, 636 (1935)).
   */
  BRUGGEMAN("bruggeman"),
  /**
   * (ε − h) / (ε + 2h) = Σ fᵢ (εᵢ − h) / (εᵢ + 2h): spheres inside a host of permittivity h
   * (Maxwell Garnett, Phil. Trans. R. Soc. A 203, 385 (1904)).
   */
  MAXWELL_GARNETT("maxwell-garnett"),
  /** (ε − 1) / (ε + 2) = Σ fᵢ (εᵢ − 1) / (εᵢ + 2): polarisable points in vacuum. */
  LORENTZ_LORENZ("lorentz-lorenz"),
  /** ε^⅓ = Σ fᵢ εᵢ^⅓, for low contrast (Looyenga, Physica 31, 401 (1965)). */
  LOOYENGA("looyenga"),
  /** ε = Σ fᵢ εᵢ: field along the boundaries, the upper Wiener bound. */
  WIENER_PARALLEL("wiener-parallel"),
  /** 1/ε = Σ fᵢ/εᵢ: field across the boundaries, the lower Wiener bound. */
  WIENER_SERIES("wiener-series"),
  /** √ε = Σ fᵢ √εᵢ: the complex refractive index itself is mixed. */
  REFRACTIVE_INDEX("refractive-index");

  private final String id;

  MixingRule(String id) {
    this.id = id;
  }

  /** Name in scenarios. */
  public String id() {
    return id;
  }

  /** The rule of that name in scenarios, or empty. */
  public static Optional<MixingRule> of(String id) {
    return Arrays.stream(values()).filter(rule -> rule.id.equals(id)).findFirst();
  }
}
