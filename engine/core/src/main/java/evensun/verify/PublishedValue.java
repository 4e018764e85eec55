package evensun.verify;

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
  public Verdict verdict() {
    double computed = computation.getAsDouble();
    boolean agrees = Math.abs(computed - published) <= tolerance;
    return new Verdict(what, unit, published, computed, tolerance, source, agrees);
  }

  /**
   * A published value beside the computed one.
   *
   * @param what what it is
   * @param unit its unit
   * @param published the published value
   * @param computed the computed value
   * @param tolerance how far they may differ
   * @param source where it is published
   * @param agrees whether they do agree
   */
  public record Verdict(
      String what,
      String unit,
      double published,
      double computed,
      double tolerance,
      String source,
      boolean agrees) {}
}
