package evensun.search.problem;

import java.util.List;

/**
 * A number that may vary.
 *
 * @param key as in the scenario
 * @param unit as shown to people, empty for a pure number
 * @param low lower bound
 * @param high upper bound, at least {@code low}
 * @param step values are {@code low} plus multiples of it; 0 for any value
 * @param drawn value as drawn, may lie outside the bounds
 * @param choices names of the alternatives when the value is an index (0, 1, ...) into them and has
 *     no order; otherwise empty
 */
public record Variable(
    String key,
    String unit,
    double low,
    double high,
    double step,
    double drawn,
    List<String> choices) {

  public Variable {
    choices = List.copyOf(choices);
    if (!(low <= high) || !(step >= 0) || Double.isInfinite(low) || Double.isInfinite(high)) {
      throw new IllegalArgumentException(
          key + ": bounds must be finite and in order, step at least 0");
    }
    if (!choices.isEmpty() && (low != 0 || high != choices.size() - 1 || step != 1)) {
      throw new IllegalArgumentException(
          key + ": a choice runs from 0 to " + (choices.size() - 1) + " in steps of 1");
    }
  }

  /** A number, not a choice. */
  public Variable(String key, String unit, double low, double high, double step, double drawn) {
    this(key, unit, low, high, step, drawn, List.of());
  }

  /** A choice between alternatives that have no order. */
  public static Variable choice(String key, List<String> choices, int drawn) {
    return new Variable(key, "", 0, choices.size() - 1, 1, drawn, choices);
  }

  /** The same number between the same bounds, free of its steps. */
  public Variable withoutSteps() {
    return new Variable(key, unit, low, high, 0, drawn);
  }

  /** Whether the value is an index into {@link #choices}. */
  public boolean isChoice() {
    return !choices.isEmpty();
  }

  /** Number of whole steps between the bounds; 0 for a continuous variable. */
  public long stepCount() {
    // A range that ends on a step must not lose it to the rounding of decimal fractions.
    return step > 0 ? (long) Math.floor((high - low) / step + 1e-9) : 0;
  }
}
