package evensun.evaluation;

import evensun.scenario.SearchSpec.LimitSpec;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import org.jspecify.annotations.Nullable;

/**
 * A limit on a quantity of a design.
 *
 * @param text as people read it
 * @param gauge reads the quantity
 * @param bound the limit, in the unit of the quantity
 */
public record Limit(String text, Gauge gauge, double bound) {

  /**
   * The limits of a specification: one for each end that is set.
   *
   * @param efficiency tells the efficiency; needed for that quantity alone
   */
  public static List<Limit> of(LimitSpec spec, Model model, @Nullable Aim efficiency) {
    List<Limit> limits = new ArrayList<>();
    spec.atLeast().ifPresent(bound -> limits.add(of(spec, bound, false, model, efficiency)));
    spec.atMost().ifPresent(bound -> limits.add(of(spec, bound, true, model, efficiency)));
    return limits;
  }

  private static Limit of(
      LimitSpec spec, double bound, boolean upper, Model model, @Nullable Aim efficiency) {
    Quantity quantity = Quantity.of(spec.quantity());
    Gauge gauge = Gauge.of(quantity, spec.of(), List.of(), upper, model, efficiency);
    return new Limit(text(quantity, spec.of(), bound, upper), gauge, bound);
  }

  private static String text(Quantity quantity, List<String> names, double bound, boolean upper) {
    String of = names.isEmpty() ? "" : " of " + String.join(", ", names);
    String number = bound == Math.rint(bound) ? String.valueOf((long) bound) : "" + bound;
    return String.format(
        Locale.ROOT,
        "%s%s %s %s %s",
        quantity.key(),
        of,
        upper ? "≤" : "≥",
        number,
        quantity.unit());
  }

  /** What a bench has to take along. */
  public List<LightSum> lightSums() {
    return gauge.lightSums();
  }

  /** The same for another thread. */
  Limit forAnotherThread() {
    return new Limit(text, gauge.forAnotherThread(), bound);
  }

  /** Value of the quantity in its unit. */
  public double value(Reading reading) {
    return gauge.value(reading);
  }

  /** How far a value is from the limit, as a fraction of the limit; negative when it is broken. */
  public double slack(double value) {
    double scale = Math.max(1e-6, Math.abs(bound));
    return (gauge.large() ? bound - value : value - bound) / scale;
  }
}
