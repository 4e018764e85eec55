package evensun.search;

/**
 * A number that may vary.
 *
 * @param key as in the scenario
 * @param unit as shown to people, empty for a pure number
 * @param low lower bound
 * @param high upper bound, at least {@code low}
 * @param step values are {@code low} plus multiples of it; 0 for any value
 * @param drawn value as drawn, may lie outside the bounds
 */
public record Variable(
    String key, String unit, double low, double high, double step, double drawn) {

  public Variable {
    if (!(low <= high) || !(step >= 0) || Double.isInfinite(low) || Double.isInfinite(high)) {
      throw new IllegalArgumentException(
          key + ": bounds must be finite and in order, step at least 0");
    }
  }
}
