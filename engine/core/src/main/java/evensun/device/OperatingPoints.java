package evensun.device;

import evensun.result.Electrical.SubcellElectrical;
import evensun.result.Outcome;
import evensun.scenario.Connection;
import java.util.ArrayList;
import java.util.List;
import org.jspecify.annotations.Nullable;

/** Where each subcell stands when the device delivers its maximum power. */
final class OperatingPoints {

  private OperatingPoints() {}

  static List<SubcellElectrical> of(DeviceState state, double[] collected, double[] gains) {
    Circuit best = state.atMaximum(collected);
    boolean common = state.device().connection() != Connection.INDEPENDENT;
    Circuit closed = state.circuit(collected);
    if (common) {
      closed.at(0);
    }
    List<SubcellElectrical> points = new ArrayList<>();
    for (int i = 0; i < collected.length; i++) {
      SubcellParameters subcell = state.subcells().get(i);
      double saturation = state.saturation().get(i);
      points.add(
          new SubcellElectrical(
              subcell.name(),
              subcell.bandgapEv(),
              saturation,
              subcell.externalRadiativeEfficiency(),
              subcell.idealityFactor(),
              ownOpenCircuitV(state, collected, i),
              best.subcellVoltage[i],
              best.subcellCurrent[i],
              gains[i],
              collected[i],
              best.received[i],
              BlackBody.thermalVoltageV(state.device().temperatureK())
                  * Math.log1p(collected[i] / saturation),
              common ? (Double) closed.subcellVoltage[i] : null));
    }
    return List.copyOf(points);
  }

  private static double ownOpenCircuitV(DeviceState state, double[] collected, int i) {
    Diode diode = state.circuit(collected).diodes[i];
    diode.solve(collected[i]);
    return diode.voltage;
  }

  /** The subcell with the least current at maximum power, or null where the device is balanced. */
  static @Nullable String limiting(DeviceState state, double[] collected) {
    if (state.device().connection() != Connection.SERIES || collected.length < 2) {
      return null;
    }
    Circuit best = state.atMaximum(collected);
    int weakest = 0;
    double least = Double.POSITIVE_INFINITY;
    double most = 0;
    for (int i = 0; i < collected.length; i++) {
      double light = collected[i] + best.received[i];
      weakest = light < least ? i : weakest;
      least = Math.min(least, light);
      most = Math.max(most, light);
    }
    return most - least < Outcome.BALANCED_MA_PER_CM2 ? null : state.subcells().get(weakest).name();
  }
}
