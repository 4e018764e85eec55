package evensun.evaluation;

import evensun.device.DeviceModel;
import evensun.device.Emission;
import evensun.device.PowerModel;
import evensun.spi.Samples;
import java.util.List;

/**
 * Efficiency of the device at its maximum power, in percent; belongs to one thread.
 *
 * <p>Saturation currents come from a step edge at each bandgap, or by reciprocity from what each
 * subcell absorbs. The latter are weighted sums over the spectra, so that the solver takes them
 * along with the currents and offers their derivatives.
 */
public final class EfficiencyAim implements Aim {

  private final DeviceModel device;
  private final PowerModel power;
  private final List<LightSum> emission;
  private final double[] saturation;

  private EfficiencyAim(DeviceModel device, List<LightSum> emission) {
    this.device = device;
    this.power = device.newPowerModel();
    this.emission = List.copyOf(emission);
    this.saturation = new double[emission.size()];
  }

  /** The aim for a device whose saturation currents are those of a step edge at each bandgap. */
  public static EfficiencyAim fromStepEdges(DeviceModel device) {
    return new EfficiencyAim(device, List.of());
  }

  /** The aim for a device whose saturation currents follow from what its subcells absorb. */
  public static EfficiencyAim fromReciprocity(DeviceModel device, Model model) {
    double[] wavelengthNm = model.problem().wavelengthNm().toArray();
    Samples emitted = Samples.of(Emission.binsMaPerCm2(wavelengthNm, device.temperatureK()));
    return new EfficiencyAim(
        device,
        model.stack().subcells().stream().map(s -> LightSum.of(model, s, emitted)).toList());
  }

  @Override
  public String name() {
    return "efficiency";
  }

  @Override
  public String unit() {
    return "%";
  }

  @Override
  public double value(Reading reading) {
    if (emission.isEmpty()) {
      return power.efficiencyPercent(reading.photocurrentMaPerCm2(), reading.bandgapEv());
    }
    for (int s = 0; s < saturation.length; s++) {
      saturation[s] = reading.sum(emission.get(s));
    }
    return power.reciprocalEfficiencyPercent(reading.photocurrentMaPerCm2(), saturation);
  }

  @Override
  public List<LightSum> lightSums() {
    return emission;
  }

  @Override
  public boolean isSmooth() {
    return true;
  }

  @Override
  public Aim forAnotherThread() {
    return new EfficiencyAim(device, emission);
  }
}
