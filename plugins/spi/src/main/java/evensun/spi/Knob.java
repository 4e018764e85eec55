package evensun.spi;

/**
 * A number of a feature that a search may move; its value in a design is {@code
 * Design.knob[index]}.
 *
 * @param index in [0, K)
 * @param name as in the scenario, such as {@code "fraction"}
 * @param unit as shown to people; empty for a pure number
 * @param low smallest value
 * @param high largest value, at least {@code low}
 */
public record Knob(int index, String name, String unit, double low, double high) {

  public Knob {
    if (!(low <= high)) {
      throw new IllegalArgumentException(
          "knob " + name + ": low must not exceed high but was " + low + " > " + high);
    }
  }
}
