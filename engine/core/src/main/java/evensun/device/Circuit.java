package evensun.device;

/**
 * Subcells wired together; mutable, for one thread. After {@link #maximise} or {@link #at} the
 * arrays hold the state of each subcell.
 */
abstract sealed class Circuit permits SeriesCircuit, ParallelCircuit, IndependentCircuit {

  /** Precision of a root relative to itself; the power is flat there and far more precise. */
  static final double PRECISION = 1e-9;

  /** [i] the subcells, the light meets the first one first. */
  final Diode[] diodes;

  /** [i] photocurrents after collection in mA cm⁻², without luminescence; written by the caller. */
  final double[] photocurrent;

  /** [i] part of a subcell's recombination current that the next one collects. */
  final double[] coupling;

  /** Series resistance in V per mA cm⁻². */
  final double seriesVPerMa;

  /** [i] voltage of each subcell in V. */
  final double[] subcellVoltage;

  /** [i] current delivered by each subcell in mA cm⁻². */
  final double[] subcellCurrent;

  /** [i] current that each subcell receives as luminescence of the one above, in mA cm⁻². */
  final double[] received;

  /** Power of the state in mW cm⁻². */
  double power;

  /** Voltage at the terminals in V; the sum of all for independent subcells. */
  double voltage;

  /** Current at the terminals in mA cm⁻²; the sum of all for independent subcells. */
  double current;

  Circuit(Diode[] diodes, double[] coupling, double seriesOhmCm2) {
    this.diodes = diodes;
    this.coupling = coupling;
    this.seriesVPerMa = seriesOhmCm2 * 1e-3;
    this.photocurrent = new double[diodes.length];
    this.subcellVoltage = new double[diodes.length];
    this.subcellCurrent = new double[diodes.length];
    this.received = new double[diodes.length];
  }

  /** Goes to the point of largest power, at least 0. */
  abstract void maximise();

  /**
   * Goes to a voltage at the terminals.
   *
   * @param terminalV in V
   * @return current in mA cm⁻²
   */
  abstract double at(double terminalV);

  /** Voltage without current in V. */
  abstract double openCircuitV();

  /** Largest photocurrent each subcell can reach, all luminescence of the one above included. */
  final double most(int index) {
    double most = 0;
    for (int i = 0; i <= index; i++) {
      most = photocurrent[i] + (i == 0 ? 0 : coupling[i - 1] * most);
    }
    return most;
  }

  /** Luminescence handed down by a subcell; one that does not recombine hands down nothing. */
  final double handedDown(int index) {
    return coupling[index] == 0 ? 0 : coupling[index] * Math.max(0, diodes[index].recombination);
  }
}
