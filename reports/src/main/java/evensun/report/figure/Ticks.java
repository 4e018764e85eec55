package evensun.report.figure;

import java.util.ArrayList;
import java.util.List;

/** Round numbers along an axis. */
public final class Ticks {

  private static final double[] ROUND = {1, 2, 2.5, 5, 10};

  private Ticks() {}

  /**
   * Multiples of a round step inside the interval.
   *
   * @param low lower end
   * @param high upper end
   * @param wanted about how many
   */
  public static List<Double> of(double low, double high, int wanted) {
    List<Double> ticks = new ArrayList<>();
    double step = step(low, high, wanted);
    if (!(step > 0) || !Double.isFinite(step)) {
      return ticks;
    }
    long first = (long) Math.ceil(low / step - 1e-9);
    long last = (long) Math.floor(high / step + 1e-9);
    for (long i = first; i <= last; i++) {
      ticks.add(i * step);
    }
    return ticks;
  }

  /** The smallest round step that gives at most about so many ticks. */
  public static double step(double low, double high, int wanted) {
    double raw = (high - low) / wanted;
    double power = Math.pow(10, Math.floor(Math.log10(raw)));
    for (double round : ROUND) {
      if (round * power >= raw * 0.999) {
        return round * power;
      }
    }
    return 10 * power;
  }

  /** Decimals needed to tell such ticks apart. */
  public static int decimals(double step) {
    return step > 0
        ? Math.max(0, (int) Math.ceil(-Math.log10(step) - 1e-9) + (quarter(step) ? 1 : 0))
        : 0;
  }

  private static boolean quarter(double step) {
    double mantissa = step / Math.pow(10, Math.floor(Math.log10(step)));
    return Math.abs(mantissa - 2.5) < 1e-6;
  }
}
