package evensun.result;

import java.util.Map;
import org.jspecify.annotations.Nullable;

/**
 * What a small change of one quantity does, everything else kept.
 *
 * @param key the quantity
 * @param unit its unit
 * @param change the change in that unit
 * @param aimChange change of the aim when the quantity grows by {@code change}, in the aim's unit
 * @param aimChangeDown change of the aim when the quantity shrinks by {@code change}
 * @param subcellMaPerCm2 change of each subcell current when it grows, by name
 * @param efficiencyPercent change of the efficiency when it grows, absolute percent
 * @param tolerance what a deposition may miss by, in the quantity's unit: 5 % of a thickness, 0.01
 *     eV of a bandgap (common practice)
 * @param toleranceAimChange the worse change of the aim when the quantity is off by that much
 */
public record Sensitivity(
    String key,
    String unit,
    double change,
    double aimChange,
    double aimChangeDown,
    Map<String, Double> subcellMaPerCm2,
    @Nullable Double efficiencyPercent,
    double tolerance,
    double toleranceAimChange) {}
