package evensun.evaluation;

/** What a design can be limited to, or aim at, beside its shape. */
public enum Quantity {
  /** Largest minus smallest current of all subcells. */
  MISMATCH("mismatchMaPerCm2", "mA cm⁻²", Of.NOTHING),
  /** Smallest current of all subcells. */
  MATCHED_CURRENT("matchedCurrentMaPerCm2", "mA cm⁻²", Of.NOTHING),
  /** Sum of the currents, each with its weight. */
  CURRENT_SUM("currentSumMaPerCm2", "mA cm⁻²", Of.SUBCELLS),
  /** The current that is worst. */
  PHOTOCURRENT("photocurrentMaPerCm2", "mA cm⁻²", Of.SUBCELLS),
  /** The gap that is worst. */
  BANDGAP("bandgapEv", "eV", Of.SUBCELLS),
  /** Sum of thicknesses. */
  THICKNESS("thicknessNm", "nm", Of.LAYERS),
  /** Reflected light. */
  REFLECTED("reflectedMaPerCm2", "mA cm⁻²", Of.NOTHING),
  /** Light that enters an exit medium which belongs to no subcell. */
  TRANSMITTED("transmittedMaPerCm2", "mA cm⁻²", Of.NOTHING),
  /** Light absorbed where nothing is collected. */
  PARASITIC("parasiticMaPerCm2", "mA cm⁻²", Of.LAYERS),
  /** Largest electrical power over irradiance. */
  EFFICIENCY("efficiencyPercent", "%", Of.NOTHING);

  /** What a quantity can be of. */
  public enum Of {
    NOTHING,
    SUBCELLS,
    LAYERS
  }

  private final String key;
  private final String unit;
  private final Of of;

  Quantity(String key, String unit, Of of) {
    this.key = key;
    this.unit = unit;
    this.of = of;
  }

  /** Name in scenarios. */
  public String key() {
    return key;
  }

  /** Unit as shown to people. */
  public String unit() {
    return unit;
  }

  /** Whether it is of layers, of subcells or of the whole device. */
  public Of of() {
    return of;
  }

  /** Whether it follows smoothly from currents and other sums of light. */
  boolean isSmooth() {
    return switch (this) {
      case CURRENT_SUM, REFLECTED, TRANSMITTED, PARASITIC, EFFICIENCY -> true;
      case MISMATCH, MATCHED_CURRENT, PHOTOCURRENT, BANDGAP, THICKNESS -> false;
    };
  }

  /** The quantity of a name. */
  public static Quantity of(String key) {
    for (Quantity quantity : values()) {
      if (quantity.key.equals(key)) {
        return quantity;
      }
    }
    throw new IllegalArgumentException("no such quantity: " + key);
  }
}
