package evensun.evaluation;

import evensun.device.DeviceModel;
import evensun.device.PowerModel;

/** Efficiency of the device at its maximum power, in percent; belongs to one thread. */
public final class EfficiencyAim implements Aim {

  private final DeviceModel device;
  private final PowerModel power;

  /** The aim for a device. */
  public EfficiencyAim(DeviceModel device) {
    this.device = device;
    this.power = device.newPowerModel();
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
    return power.efficiencyPercent(reading.photocurrentMaPerCm2(), reading.bandgapEv());
  }

  @Override
  public Aim forAnotherThread() {
    return new EfficiencyAim(device);
  }
}
