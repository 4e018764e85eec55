package evensun.device;

import evensun.result.Electrical.MismatchPoint;
import evensun.scenario.Connection;
import java.util.ArrayList;
import java.util.List;

/** What a difference of the first two photocurrents does to the device, their sum kept. */
final class MismatchCost {

  private static final int POINTS = 41;
  private static final double LARGEST_SHIFT_MA_PER_CM2 = 3;
  private static final double LARGEST_SHARE = 0.4;

  private MismatchCost() {}

  /** Efficiency and fill factor around the design; empty unless in series. */
  static List<MismatchPoint> of(DeviceState state, double[] photocurrent) {
    boolean series = state.device().connection() == Connection.SERIES;
    if (photocurrent.length < 2 || !series) {
      return List.of();
    }
    double smaller = Math.min(photocurrent[0], photocurrent[1]);
    double largest = Math.min(LARGEST_SHIFT_MA_PER_CM2, LARGEST_SHARE * smaller);
    if (!(largest > 0)) {
      return List.of();
    }
    List<MismatchPoint> points = new ArrayList<>();
    double half = 0.5 * (photocurrent[0] + photocurrent[1]);
    double centre = 0.5 * (photocurrent[0] - photocurrent[1]);
    for (int i = 0; i < POINTS; i++) {
      double shift = centre + largest * (2.0 * i / (POINTS - 1) - 1);
      double[] moved = photocurrent.clone();
      moved[0] = half + shift;
      moved[1] = half - shift;
      points.add(point(state, state.collected(moved), 2 * shift));
    }
    return List.copyOf(points);
  }

  private static MismatchPoint point(DeviceState state, double[] collected, double difference) {
    Circuit circuit = state.circuit(collected);
    double open = circuit.openCircuitV();
    double closed = circuit.at(0);
    circuit.maximise();
    return new MismatchPoint(
        difference,
        PowerModel.percent(circuit.power, state.irradianceWPerM2()),
        fillFactor(circuit.power, open, closed));
  }

  /** Fill factor; 0 for a device that delivers nothing. */
  static double fillFactor(double powerMwPerCm2, double openV, double closedMaPerCm2) {
    double box = openV * closedMaPerCm2;
    return box > 0 ? powerMwPerCm2 / box : 0;
  }
}
