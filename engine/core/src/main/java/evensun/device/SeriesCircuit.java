package evensun.device;

import java.util.function.DoubleUnaryOperator;

/**
 * One current through all subcells.
 *
 * <p>The current fixes the voltage of each subcell from the top down. Voltage is a falling, concave
 * function of current unless a junction breaks down, so the power has one maximum, found where J =
 * V/|dV/dJ|; that form is nearly straight up to the limiting current, where V itself has a
 * logarithmic pole.
 */
final class SeriesCircuit extends Circuit {

  private static final int SCAN_POINTS = 400;

  private final DoubleUnaryOperator balance = this::balance;
  private final DoubleUnaryOperator excess = this::excess;
  private double slope;
  private double target;

  SeriesCircuit(Diode[] diodes, double[] coupling, double seriesOhmCm2) {
    super(diodes, coupling, seriesOhmCm2);
  }

  /** Voltage at the terminals for a current; minus infinity above the limiting current. */
  double voltageAt(double j) {
    double handed = 0;
    double handedSlope = 0;
    voltage = -j * seriesVPerMa;
    slope = -seriesVPerMa;
    current = j;
    for (int i = 0; i < diodes.length; i++) {
      Diode diode = diodes[i];
      received[i] = handed;
      diode.solve(photocurrent[i] + handed - j);
      double change = (handedSlope - 1) / diode.slope;
      subcellVoltage[i] = diode.voltage;
      subcellCurrent[i] = j;
      voltage += diode.voltage;
      slope += change;
      handed = handedDown(i);
      handedSlope = handed > 0 ? coupling[i] * diode.recombinationSlope * change : 0;
    }
    return voltage;
  }

  private double excess(double j) {
    return voltageAt(j) - target;
  }

  private double balance(double j) {
    double v = voltageAt(j);
    return Double.isInfinite(v) ? -j : -v / slope - j;
  }

  @Override
  void maximise() {
    double most = limit();
    if (!(most > 0)) {
      rest();
    } else if (breaksDown()) {
      scan(most);
    } else {
      settle(Bracket.root(balance, 0, most, PRECISION));
    }
  }

  private boolean breaksDown() {
    for (Diode diode : diodes) {
      if (diode.breaksDown()) {
        return true;
      }
    }
    return false;
  }

  /** A device without light delivers nothing. */
  private void rest() {
    settle(0);
    power = 0;
  }

  private void settle(double j) {
    voltageAt(j);
    power = voltage * j;
  }

  /**
   * With breakdown the power may have several maxima: look at all of them, then refine the best.
   */
  private void scan(double most) {
    int best = 0;
    double highest = 0;
    for (int i = 1; i < SCAN_POINTS; i++) {
      double j = most * i / SCAN_POINTS;
      double p = j * voltageAt(j);
      if (p > highest) {
        highest = p;
        best = i;
      }
    }
    if (best == 0) {
      rest();
      return;
    }
    double from = most * (best - 1) / SCAN_POINTS;
    double to = most * (best + 1) / SCAN_POINTS;
    settle(Bracket.root(balance, from, to, PRECISION));
    if (power < highest) {
      settle(most * best / SCAN_POINTS);
    }
  }

  /** A current at which the voltage is certainly not positive. */
  private double limit() {
    double smallest = Double.POSITIVE_INFINITY;
    double all = 0;
    for (int i = 0; i < diodes.length; i++) {
      double most = most(i);
      smallest = Math.min(smallest, most + diodes[i].reverseLimitMaPerCm2());
      all = Math.max(all, most);
    }
    return Math.min(smallest, all);
  }

  @Override
  double openCircuitV() {
    return voltageAt(0);
  }

  @Override
  double at(double terminalV) {
    target = terminalV;
    double low = -1;
    while (voltageAt(low) < terminalV) {
      low *= 4;
    }
    double high = 1;
    while (voltageAt(high) > terminalV) {
      high *= 4;
    }
    double j = Bracket.root(excess, low, high, 1e-15);
    voltageAt(j);
    share(terminalV);
    power = terminalV * j;
    return j;
  }

  /**
   * A saturated subcell takes whatever voltage the others leave it: its own current no longer tells
   * its voltage.
   */
  private void share(double terminalV) {
    int weakest = 0;
    for (int i = 1; i < diodes.length; i++) {
      weakest = subcellVoltage[i] < subcellVoltage[weakest] ? i : weakest;
    }
    double left = terminalV + current * seriesVPerMa;
    for (int i = 0; i < diodes.length; i++) {
      left -= i == weakest ? 0 : subcellVoltage[i];
    }
    if (diodes[weakest].saturates() && left < 0) {
      subcellVoltage[weakest] = left;
    }
    voltage = terminalV;
  }
}
