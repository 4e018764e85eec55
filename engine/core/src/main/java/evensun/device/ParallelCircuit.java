package evensun.device;

import java.util.function.DoubleUnaryOperator;

/** One voltage across all subcells; their currents add. */
final class ParallelCircuit extends Circuit {

  /** Stands for a logarithm that would be infinite. */
  private static final double FAR = 1e3;

  private final DoubleUnaryOperator balance = this::balance;
  private final DoubleUnaryOperator flow = this::currentAt;
  private final DoubleUnaryOperator excess = this::excess;
  private double slope;
  private double target;

  ParallelCircuit(Diode[] diodes, double[] coupling, double seriesOhmCm2) {
    super(diodes, coupling, seriesOhmCm2);
  }

  /** Current of all for a voltage across the junctions. */
  private double currentAt(double v) {
    double handed = 0;
    double handedSlope = 0;
    current = 0;
    slope = 0;
    for (int i = 0; i < diodes.length; i++) {
      Diode diode = diodes[i];
      received[i] = handed;
      diode.at(v);
      subcellVoltage[i] = v;
      subcellCurrent[i] = photocurrent[i] + handed - diode.current;
      current += subcellCurrent[i];
      slope += handedSlope - diode.slope;
      handed = handedDown(i);
      handedSlope = handed > 0 ? coupling[i] * diode.recombinationSlope : 0;
    }
    return current;
  }

  private double excess(double v) {
    return v - currentAt(v) * seriesVPerMa - target;
  }

  /** dP/dV = 0 as a difference of logarithms, which is nearly straight in voltage. */
  private double balance(double v) {
    double j = currentAt(v);
    double inner = v - 2 * j * seriesVPerMa;
    if (j <= 0) {
      return -FAR;
    }
    return inner <= 0 || slope >= 0 ? FAR : Math.log(j / -slope) - Math.log(inner);
  }

  @Override
  void maximise() {
    double open = openCircuitV();
    settle(open > 0 ? Bracket.root(balance, 0, open, PRECISION) : 0);
    power = open > 0 ? power : 0;
  }

  private void settle(double v) {
    voltage = v - currentAt(v) * seriesVPerMa;
    power = voltage * current;
  }

  @Override
  double openCircuitV() {
    double highest = 0;
    for (int i = 0; i < diodes.length; i++) {
      diodes[i].solve(most(i));
      highest = Math.max(highest, diodes[i].voltage);
    }
    double open = highest > 0 ? Bracket.root(flow, 0, highest, 1e-15) : 0;
    currentAt(open);
    voltage = open;
    return open;
  }

  @Override
  double at(double terminalV) {
    target = terminalV;
    double reach = 1;
    while (excess.applyAsDouble(terminalV - reach) > 0) {
      reach *= 2;
    }
    double low = terminalV - reach;
    reach = 1e-3;
    while (excess.applyAsDouble(terminalV + reach) < 0) {
      reach *= 2;
    }
    settle(Bracket.root(excess, low, terminalV + reach, 1e-15));
    return current;
  }
}
