package evensun.report.chart;

import evensun.report.figure.Ticks;

/**
 * An axis.
 *
 * @param label what it counts
 * @param unit its unit, empty for none
 * @param min lower end
 * @param max upper end
 * @param logarithmic whether it counts powers of ten; both ends are then above zero
 */
public record Axis(String label, String unit, double min, double max, boolean logarithmic) {

  /** A linear axis. */
  public static Axis linear(String label, String unit, double min, double max) {
    return new Axis(label, unit, min, max > min ? max : min + 1, false);
  }

  /** A linear axis from round number to round number, wide enough for both values. */
  public static Axis covering(String label, String unit, double low, double high) {
    double step = Ticks.step(low, Math.max(high, low + Math.max(1e-9, Math.abs(low) * 1e-9)), 5);
    double from = Math.floor(low / step + 1e-9) * step;
    return linear(label, unit, from, Math.ceil(high / step - 1e-9) * step);
  }

  /** A logarithmic axis. */
  public static Axis logarithmic(String label, String unit, double min, double max) {
    return new Axis(label, unit, min, max > min ? max : min * 10, true);
  }

  /** Label and unit, such as {@code wavelength, nm}. */
  public String title() {
    return unit.isEmpty() ? label : label + ", " + unit;
  }

  /** Where a value stands, 0 at the lower end and 1 at the upper. */
  double fraction(double value) {
    if (logarithmic) {
      return Math.log(Math.max(value, min) / min) / Math.log(max / min);
    }
    return (value - min) / (max - min);
  }
}
