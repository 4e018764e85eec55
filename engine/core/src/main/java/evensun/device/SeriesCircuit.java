package evensun.device;

import java.util.Arrays;
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

  /** Currents looked at between those of two subcells. */
  private static final int BETWEEN = 24;

  /** Currents closer than this, relative to themselves, count as one. */
  private static final double KNEES_APART = 1e-6;

  private final DoubleUnaryOperator balance = this::balance;
  private final DoubleUnaryOperator excess = this::excess;
  private final double[] knees;
  private final double[] nodes;
  private double slope;
  private double target;

  SeriesCircuit(Diode[] diodes, double[] coupling, double seriesOhmCm2) {
    super(diodes, coupling, seriesOhmCm2);
    knees = new double[2 * diodes.length + 1];
    nodes = new double[knees.length * BETWEEN];
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
   * With breakdown the power may have a maximum below the current of each subcell, which then turns
   * into reverse: looks between any two of these currents, and refines every maximum.
   */
  private void scan(double most) {
    int count = place(most);
    double highest = 0;
    double at = 0;
    double before = 0;
    double here = power(nodes[0]);
    for (int i = 0; i + 1 < count; i++) {
      double after = power(nodes[i + 1]);
      if (here > 0 && here >= before && here >= after) {
        boolean rising = balance(nodes[i]) > 0;
        double from = rising ? nodes[i] : i == 0 ? 0 : nodes[i - 1];
        double to = rising ? nodes[i + 1] : nodes[i];
        double refined = Bracket.root(balance, from, to, PRECISION);
        double peak = power(refined);
        double best = Math.max(peak, here);
        if (best > highest) {
          highest = best;
          at = peak >= here ? refined : nodes[i];
        }
      }
      before = here;
      here = after;
    }
    if (highest > 0) {
      settle(at);
    } else {
      rest();
    }
  }

  private double power(double j) {
    return j * voltageAt(j);
  }

  /**
   * Places rising currents between those of the subcells, densely near them; returns their number.
   */
  private int place(double most) {
    for (int i = 0; i < diodes.length; i++) {
      knees[2 * i] = Math.min(most, photocurrent[i]);
      knees[2 * i + 1] = Math.min(most, most(i));
    }
    knees[2 * diodes.length] = most;
    Arrays.sort(knees);
    int count = 0;
    double from = 0;
    for (double knee : knees) {
      for (int i = 1; i <= BETWEEN && knee > from * (1 + KNEES_APART); i++) {
        nodes[count++] = from + (knee - from) * 0.5 * (1 - Math.cos(Math.PI * i / BETWEEN));
      }
      from = count == 0 ? 0 : nodes[count - 1];
    }
    return count;
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
