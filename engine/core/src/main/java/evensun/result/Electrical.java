package evensun.result;

import java.util.List;
import org.jspecify.annotations.Nullable;

/**
 * The electrical side of one design.
 *
 * @param pairing which absorptance goes with which saturation current, in words
 * @param connection series, independent or parallel
 * @param temperatureK cell temperature in K
 * @param vocV open-circuit voltage in V; null for independent subcells
 * @param jscMaPerCm2 short-circuit current in mA cm⁻²; null for independent subcells
 * @param fillFactor fill factor; null for independent subcells
 * @param powerMwPerCm2 maximum power in mW cm⁻²
 * @param efficiencyPercent maximum power over irradiance, in percent
 * @param independentEfficiencyPercent the same subcells, each at its own maximum power
 * @param subcells each subcell at the operating point
 * @param curve current against voltage of the device; empty for independent subcells
 * @param mismatchCost efficiency and fill factor against the difference of the photocurrents
 * @param ladder from the detailed-balance limit to the device; the steps add up exactly
 * @param limitingSubcell subcell of a series device with the least current at maximum power, its
 *     luminescence counted; null where it is balanced or not in series
 */
public record Electrical(
    String pairing,
    String connection,
    double temperatureK,
    @Nullable Double vocV,
    @Nullable Double jscMaPerCm2,
    @Nullable Double fillFactor,
    double powerMwPerCm2,
    double efficiencyPercent,
    double independentEfficiencyPercent,
    List<SubcellElectrical> subcells,
    List<CurvePoint> curve,
    List<MismatchPoint> mismatchCost,
    List<LadderStep> ladder,
    @Nullable String limitingSubcell) {

  /**
   * A subcell at the operating point.
   *
   * @param name name
   * @param bandgapEv bandgap in eV
   * @param saturationMaPerCm2 radiative saturation current in mA cm⁻²
   * @param externalRadiativeEfficiency at its one-sun open circuit, in (0, 1]
   * @param idealityFactor of the non-radiative branch
   * @param vocV its own open-circuit voltage in V
   * @param operatingVoltageV voltage at the device's maximum power in V
   * @param operatingMaPerCm2 current at the device's maximum power in mA cm⁻²
   * @param efficiencyGainPerMaPerCm2 dη/dJ: absolute percent per mA cm⁻² of its photocurrent
   * @param collectedMaPerCm2 photocurrent after collection
   * @param luminescenceMaPerCm2 what it receives as luminescence of the subcell above, at the
   *     device's maximum power
   * @param radiativeLimitV open-circuit voltage if all recombination were radiative
   * @param shortCircuitVoltageV voltage it is driven to when the device is short-circuited; null
   *     for independent subcells
   */
  public record SubcellElectrical(
      String name,
      double bandgapEv,
      double saturationMaPerCm2,
      double externalRadiativeEfficiency,
      double idealityFactor,
      double vocV,
      double operatingVoltageV,
      double operatingMaPerCm2,
      @Nullable Double efficiencyGainPerMaPerCm2,
      double collectedMaPerCm2,
      double luminescenceMaPerCm2,
      double radiativeLimitV,
      @Nullable Double shortCircuitVoltageV) {}

  /**
   * A point of the device's curve.
   *
   * @param voltageV V
   * @param currentMaPerCm2 mA cm⁻²
   */
  public record CurvePoint(double voltageV, double currentMaPerCm2) {}

  /**
   * What a difference of the photocurrents does, their sum kept.
   *
   * @param differenceMaPerCm2 first minus second subcell, mA cm⁻²
   * @param efficiencyPercent efficiency in percent
   * @param fillFactor fill factor
   */
  public record MismatchPoint(
      double differenceMaPerCm2, double efficiencyPercent, double fillFactor) {}

  /**
   * A step from the limit to the device.
   *
   * @param label in words
   * @param efficiencyPercent absolute percent, negative for a loss; the first entry is the limit
   * @param maPerCm2 the current it stands for, where that can be said
   */
  public record LadderStep(String label, double efficiencyPercent, @Nullable Double maPerCm2) {}
}
