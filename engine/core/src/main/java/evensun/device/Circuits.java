package evensun.device;

import java.util.List;

/** Builds circuits from parameters. */
final class Circuits {

  private Circuits() {}

  /** A circuit whose diodes are still to be set. */
  static Circuit of(List<SubcellParameters> subcells, DeviceParameters device) {
    Diode[] diodes = new Diode[subcells.size()];
    double[] coupling = new double[diodes.length];
    for (int i = 0; i < diodes.length; i++) {
      diodes[i] = new Diode();
      coupling[i] = i + 1 < diodes.length ? subcells.get(i).luminescentCouplingFraction() : 0;
    }
    double series = device.seriesResistanceOhmCm2();
    return switch (device.connection()) {
      case SERIES -> new SeriesCircuit(diodes, coupling, series);
      case PARALLEL -> new ParallelCircuit(diodes, coupling, series);
      case INDEPENDENT -> new IndependentCircuit(diodes, coupling, series);
    };
  }

  /** Sets a diode so that its radiative efficiency holds at the open circuit of {@code oneSun}. */
  static void set(
      Diode diode, SubcellParameters subcell, double thermalV, double radiative, double oneSun) {
    double efficiency = subcell.externalRadiativeEfficiency();
    double ideality = subcell.idealityFactor();
    double other = Diode.nonRadiativeMaPerCm2(thermalV, radiative, efficiency, ideality, oneSun);
    diode.set(
        thermalV, radiative, other, ideality, subcell.shuntOhmCm2(), subcell.reverseBreakdownV());
  }
}
