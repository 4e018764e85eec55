package evensun.spi;

import java.util.Optional;

/**
 * A number of a feature: fixed, or moved by a search.
 *
 * @param value the number when fixed; the number as drawn when it is moved
 * @param knob where its value stands in a design, or empty when fixed
 */
public record Parameter(double value, Optional<Knob> knob) {

  /** A number that no search moves. */
  public static Parameter fixed(double value) {
    return new Parameter(value, Optional.empty());
  }

  /**
   * A number that a search may move.
   *
   * @param drawn the number as drawn, in the unit of the knob
   */
  public static Parameter moved(double drawn, Knob knob) {
    return new Parameter(drawn, Optional.of(knob));
  }

  /** Its value in a design. */
  public double in(Design design) {
    return knob.isPresent() ? design.knob[knob.get().index()] : value;
  }
}
