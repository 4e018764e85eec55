package evensun.device;

import java.util.function.DoubleUnaryOperator;

/**
 * Each subcell at the voltage that serves the whole: its own maximum-power point, and with
 * luminescent coupling a little above it, where what the next subcell gains outweighs what this one
 * loses. The series resistance lies in each of the circuits.
 */
final class IndependentCircuit extends Circuit {

  private static final int MOST_SWEEPS = 60;

  private final DoubleUnaryOperator balance = this::balance;
  private int active;
  private double available;
  private double worth;

  IndependentCircuit(Diode[] diodes, double[] coupling, double seriesOhmCm2) {
    super(diodes, coupling, seriesOhmCm2);
  }

  @Override
  void maximise() {
    double before = -1;
    sweep(false);
    for (int i = 0; i < MOST_SWEEPS && coupled() && Math.abs(power - before) > 1e-13 * power; i++) {
      before = power;
      sweep(true);
    }
  }

  private boolean coupled() {
    for (double part : coupling) {
      if (part > 0) {
        return true;
      }
    }
    return false;
  }

  private void sweep(boolean weighted) {
    power = 0;
    voltage = 0;
    current = 0;
    double handed = 0;
    for (int i = 0; i < diodes.length; i++) {
      received[i] = handed;
      available = photocurrent[i] + handed;
      worth = weighted && i + 1 < diodes.length ? coupling[i] * Math.max(0, outer(i + 1)) : 0;
      active = i;
      settle(i);
      handed = handedDown(i);
    }
  }

  /** Worth of one more mA cm⁻² in a subcell: the voltage at which it is taken out. */
  private double outer(int i) {
    return subcellVoltage[i] - subcellCurrent[i] * seriesVPerMa;
  }

  private void settle(int i) {
    double most = Math.min(available, available + diodes[i].reverseLimitMaPerCm2());
    double j = most > 0 ? Bracket.root(balance, -1e-3 * most, most, PRECISION) : 0;
    diodes[i].solve(available - j);
    subcellCurrent[i] = j;
    subcellVoltage[i] = diodes[i].voltage;
    power += j * outer(i);
    voltage += outer(i);
    current += j;
  }

  /** d/dJ of J·V − J²R + worth·recombination, divided by |dV/dJ|. */
  private double balance(double j) {
    Diode diode = diodes[active];
    diode.solve(available - j);
    double v = diode.voltage;
    double slope = diode.slope;
    if (v <= 0) {
      return -Math.abs(j) - worth * diode.recombinationSlope;
    }
    return (v - 2 * j * seriesVPerMa) * slope - j - worth * diode.recombinationSlope;
  }

  @Override
  double openCircuitV() {
    throw new UnsupportedOperationException("independent subcells have no common open circuit");
  }

  @Override
  double at(double terminalV) {
    throw new UnsupportedOperationException("independent subcells have no common voltage");
  }
}
