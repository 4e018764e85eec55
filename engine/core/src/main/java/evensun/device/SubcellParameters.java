package evensun.device;

/**
 * The electrical side of one subcell.
 *
 * @param name name
 * @param bandgapEv bandgap in eV, in (0, 10]
 * @param externalRadiativeEfficiency part of all recombination at the one-sun open circuit that
 *     leaves as light through the front, in (0, 1]
 * @param idealityFactor of the non-radiative branch, in [0.5, 5]
 * @param shuntOhmCm2 shunt resistance in Ω cm², greater than 0; infinite for none
 * @param collectionFraction part of the absorbed light that is collected, in [0, 1]
 * @param reverseBreakdownV reverse voltage at which the breakdown branch carries 1 mA cm⁻², greater
 *     than 0; infinite for none
 * @param luminescentCouplingFraction part of all recombination that the next subcell collects, in
 *     [0, 1 − externalRadiativeEfficiency]
 */
public record SubcellParameters(
    String name,
    double bandgapEv,
    double externalRadiativeEfficiency,
    double idealityFactor,
    double shuntOhmCm2,
    double collectionFraction,
    double reverseBreakdownV,
    double luminescentCouplingFraction) {

  /** Smallest and largest ideality of the non-radiative branch. */
  public static final double LOWEST_IDEALITY = 0.5;

  /** Largest ideality of the non-radiative branch. */
  public static final double HIGHEST_IDEALITY = 5;

  public SubcellParameters {
    check(name, "bandgapEv", bandgapEv, bandgapEv > 0 && bandgapEv <= 10, "in (0, 10] eV");
    check(
        name,
        "externalRadiativeEfficiency",
        externalRadiativeEfficiency,
        externalRadiativeEfficiency > 0 && externalRadiativeEfficiency <= 1,
        "in (0, 1]");
    check(
        name,
        "idealityFactor",
        idealityFactor,
        idealityFactor >= LOWEST_IDEALITY && idealityFactor <= HIGHEST_IDEALITY,
        "in [0.5, 5]");
    check(name, "shuntOhmCm2", shuntOhmCm2, shuntOhmCm2 > 0, "greater than 0 Ω cm²");
    check(
        name,
        "collectionFraction",
        collectionFraction,
        collectionFraction >= 0 && collectionFraction <= 1,
        "in [0, 1]");
    check(name, "reverseBreakdownV", reverseBreakdownV, reverseBreakdownV > 0, "greater than 0 V");
    check(
        name,
        "luminescentCouplingFraction",
        luminescentCouplingFraction,
        luminescentCouplingFraction >= 0
            && luminescentCouplingFraction + externalRadiativeEfficiency <= 1 + 1e-12,
        "in [0, 1 − externalRadiativeEfficiency]");
  }

  /** An ideal subcell: radiative, without leaks, collecting everything, coupled to nothing. */
  public static SubcellParameters ideal(String name, double bandgapEv) {
    double none = Double.POSITIVE_INFINITY;
    return new SubcellParameters(name, bandgapEv, 1, 1, none, 1, none, 0);
  }

  /** The same with another radiative efficiency and ideality of the non-radiative branch. */
  public SubcellParameters withRecombination(double efficiency, double ideality) {
    return new SubcellParameters(
        name,
        bandgapEv,
        efficiency,
        ideality,
        shuntOhmCm2,
        collectionFraction,
        reverseBreakdownV,
        luminescentCouplingFraction);
  }

  /** The same with another shunt resistance in Ω cm². */
  public SubcellParameters withShunt(double ohmCm2) {
    return new SubcellParameters(
        name,
        bandgapEv,
        externalRadiativeEfficiency,
        idealityFactor,
        ohmCm2,
        collectionFraction,
        reverseBreakdownV,
        luminescentCouplingFraction);
  }

  /** The same with another collected part. */
  public SubcellParameters withCollection(double fraction) {
    return new SubcellParameters(
        name,
        bandgapEv,
        externalRadiativeEfficiency,
        idealityFactor,
        shuntOhmCm2,
        fraction,
        reverseBreakdownV,
        luminescentCouplingFraction);
  }

  /** The same with another reverse breakdown voltage in V. */
  public SubcellParameters withBreakdown(double volts) {
    return new SubcellParameters(
        name,
        bandgapEv,
        externalRadiativeEfficiency,
        idealityFactor,
        shuntOhmCm2,
        collectionFraction,
        volts,
        luminescentCouplingFraction);
  }

  /** The same with another luminescent coupling to the next subcell. */
  public SubcellParameters withCoupling(double fraction) {
    return new SubcellParameters(
        name,
        bandgapEv,
        externalRadiativeEfficiency,
        idealityFactor,
        shuntOhmCm2,
        collectionFraction,
        reverseBreakdownV,
        fraction);
  }

  private static void check(String name, String key, double value, boolean kept, String rule) {
    if (!kept) {
      throw new IllegalArgumentException(
          "subcell \"" + name + "\": " + key + " must be " + rule + " but was " + value);
    }
  }
}
