package evensun.scenario.tree;

/**
 * Which numbers a key takes.
 *
 * @param low lower end
 * @param high upper end
 * @param lowOpen whether the lower end itself is out
 * @param highOpen whether the upper end itself is out
 * @param unit unit of both, empty for a plain number
 */
public record Interval(double low, double high, boolean lowOpen, boolean highOpen, String unit) {

  public Interval {
    if (!(low <= high)) {
      throw new IllegalArgumentException("low must be at most high but was " + low + " > " + high);
    }
  }

  /** Both ends allowed. */
  public static Interval closed(double low, double high, String unit) {
    return new Interval(low, high, false, false, unit);
  }

  /** The lower end allowed, the upper one not. */
  public static Interval below(double low, double high, String unit) {
    return new Interval(low, high, false, true, unit);
  }

  /** The lower end not allowed, the upper one is. */
  public static Interval above(double low, double high, String unit) {
    return new Interval(low, high, true, false, unit);
  }

  /** Whether a number is inside; not a number never is. */
  public boolean contains(double value) {
    return (lowOpen ? value > low : value >= low) && (highOpen ? value < high : value <= high);
  }

  @Override
  public String toString() {
    String range =
        (lowOpen ? "(" : "[")
            + Shown.number(low)
            + ", "
            + Shown.number(high)
            + (highOpen ? ")" : "]");
    return unit.isEmpty() ? range : range + " " + unit;
  }
}
