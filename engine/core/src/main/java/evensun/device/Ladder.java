package evensun.device;

import evensun.light.Spectrum;
import evensun.result.Electrical.LadderStep;
import evensun.scenario.Connection;
import java.util.ArrayList;
import java.util.List;
import java.util.function.UnaryOperator;
import org.jspecify.annotations.Nullable;

/**
 * From the detailed-balance limit of the gaps down to the device, one change after another in a
 * fixed order. Every step is the difference of two efficiencies, so the steps add up exactly; a
 * step may be a gain.
 *
 * <p>The limit: independent subcells, radiative, a step of absorptance at each gap under the whole
 * spectrum. Light of a band belongs to the subcell whose band it is until a step takes it away:
 * light outside the grid, light that passes through or is absorbed by another subcell, light
 * absorbed by other layers, reflected light. Then come the connection, recombination, luminescence,
 * collection, and the resistances.
 */
final class Ladder {

  private final DeviceState state;
  private final DeviceOptics optics;
  private final double[] photocurrent;
  private final List<LadderStep> steps = new ArrayList<>();
  private DeviceState present;
  private double[] current;
  private double lastPercent;
  private double lastMaPerCm2;

  private Ladder(DeviceState state, DeviceOptics optics) {
    this.state = state;
    this.optics = optics;
    this.photocurrent = optics.photocurrents();
    this.current = photocurrent;
    this.present = ideal(state);
  }

  /** The steps; the first is the limit. Without a spectrum it is that of the photocurrents. */
  static List<LadderStep> of(DeviceState state, DeviceOptics optics, @Nullable Spectrum spectrum) {
    Ladder ladder = new Ladder(state, optics);
    if (spectrum == null) {
      ladder.step("independent radiative subcells with these photocurrents", true);
    } else {
      ladder.optical(spectrum);
    }
    ladder.electrical();
    return List.copyOf(ladder.steps);
  }

  private static DeviceState ideal(DeviceState state) {
    List<SubcellParameters> ideal = new ArrayList<>();
    List<Double> saturation = new ArrayList<>();
    for (SubcellParameters subcell : state.subcells()) {
      ideal.add(SubcellParameters.ideal(subcell.name(), subcell.bandgapEv()));
      saturation.add(BlackBody.aboveMaPerCm2(subcell.bandgapEv(), state.device().temperatureK()));
    }
    DeviceParameters independent =
        state.device().withConnection(Connection.INDEPENDENT).withSeriesResistance(0);
    return state.withSubcells(ideal).withDevice(independent).withSaturation(saturation);
  }

  private void optical(Spectrum spectrum) {
    double[] gaps = state.subcells().stream().mapToDouble(SubcellParameters::bandgapEv).toArray();
    current = StepCurrents.maPerCm2(spectrum, gaps);
    step("detailed-balance limit of these gaps", true);
    if (!optics.hasSpectra()) {
      present = present.withSaturation(state.saturation());
      become("light that no subcell absorbs", photocurrent);
      return;
    }
    double[][] bins = optics.stepBins(spectrum, gaps);
    become("light outside the grid", sums(bins));
    present = present.withSaturation(state.saturation());
    become("incomplete absorption", shifted(incomplete(bins)));
    for (int layer = 0; layer < optics.parasiticNames().size(); layer++) {
      become(
          "parasitic absorption in " + optics.parasiticNames().get(layer),
          shifted(parasitic(bins, layer)));
    }
    become("reflection", photocurrent);
  }

  private void electrical() {
    become("mismatch", device(d -> d.withConnection(state.device().connection())));
    become("non-radiative recombination", radiative(false));
    if (state.subcells().stream().anyMatch(s -> s.luminescentCouplingFraction() > 0)) {
      become("luminescent coupling", radiative(true));
    }
    become("incomplete collection", state.collected(photocurrent));
    present = state;
    step("series and shunt resistance", false);
  }

  private DeviceState device(UnaryOperator<DeviceParameters> change) {
    return present.withDevice(change.apply(present.device()));
  }

  /** The subcells with their recombination but without leaks. */
  private DeviceState radiative(boolean coupled) {
    List<SubcellParameters> subcells = new ArrayList<>();
    for (SubcellParameters s : state.subcells()) {
      subcells.add(
          SubcellParameters.ideal(s.name(), s.bandgapEv())
              .withRecombination(s.externalRadiativeEfficiency(), s.idealityFactor())
              .withCoupling(coupled ? s.luminescentCouplingFraction() : 0));
    }
    return present.withSubcells(subcells);
  }

  private static double[] sums(double[][] rows) {
    double[] sums = new double[rows.length];
    for (int s = 0; s < sums.length; s++) {
      for (double value : rows[s]) {
        sums[s] += value;
      }
    }
    return sums;
  }

  private double[] shifted(double[] change) {
    double[] next = current.clone();
    for (int s = 0; s < next.length; s++) {
      next[s] += change[s];
    }
    return next;
  }

  /** Light of a subcell's band that passes or goes to others, and what it takes of other bands. */
  private double[] incomplete(double[][] bins) {
    double[] change = new double[bins.length];
    for (int w = 0; w < optics.wavelengthCount(); w++) {
      double absorbed = 0;
      for (int s = 0; s < bins.length; s++) {
        absorbed += optics.absorptance(s, w);
      }
      for (int s = 0; s < bins.length; s++) {
        double own = optics.absorptance(s, w);
        change[s] += own * (optics.incidentMaPerCm2(w) - bins[s][w]);
        change[s] -= bins[s][w] * (optics.transmittance(w) + absorbed - own);
      }
    }
    return change;
  }

  private double[] parasitic(double[][] bins, int layer) {
    double[] change = new double[bins.length];
    for (int s = 0; s < bins.length; s++) {
      for (int w = 0; w < optics.wavelengthCount(); w++) {
        change[s] -= bins[s][w] * optics.parasitic(layer, w);
      }
    }
    return change;
  }

  private void become(String label, double[] next) {
    current = next;
    step(label, true);
  }

  private void become(String label, DeviceState next) {
    present = next;
    step(label, label.equals("mismatch"));
  }

  private void step(String label, boolean ofCurrent) {
    double percent = present.efficiencyPercent(nonNegative(current));
    double maPerCm2 = usable();
    steps.add(
        new LadderStep(
            label, percent - lastPercent, ofCurrent ? (Double) (maPerCm2 - lastMaPerCm2) : null));
    lastPercent = percent;
    lastMaPerCm2 = maPerCm2;
  }

  /**
   * Current that the connection can use: all of it, or as often as there are subcells the least.
   */
  private double usable() {
    double sum = 0;
    double least = Double.POSITIVE_INFINITY;
    for (double value : current) {
      sum += value;
      least = Math.min(least, value);
    }
    boolean series = present.device().connection() == Connection.SERIES;
    return series ? least * current.length : sum;
  }

  private static double[] nonNegative(double[] values) {
    double[] clipped = values.clone();
    for (int i = 0; i < clipped.length; i++) {
      clipped[i] = Math.max(0, clipped[i]);
    }
    return clipped;
  }
}
