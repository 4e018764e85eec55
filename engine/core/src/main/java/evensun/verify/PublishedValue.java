package evensun.verify;

import evensun.result.Published;
import java.util.function.DoubleSupplier;

/**
 * A published value and how this program computes it.
 *
 * @param what what it is
 * @param unit its unit, empty for a pure number
 * @param published the published value
 * @param tolerance how far the computed value may be from it, in its unit
 * @param source where it is published
 * @param computation computes it
 */
public record PublishedValue(
    String what,
    String unit,
    double published,
    double tolerance,
    String source,
    DoubleSupplier computation) {

  /** Computes the value and compares. */
  public Published verdict() {
    double computed = computation.getAsDouble();
    boolean agrees = Math.abs(computed - published) <= tolerance;
    return new Published(what, unit, published, computed, tolerance, source, agrees);
  }
}
