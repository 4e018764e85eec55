package evensun.evaluation;

import java.util.List;

/** What a search makes as large as possible. */
public interface Aim {

  /** Name: that of a scenario's aim, or the quantity, such as {@code perovskite.thicknessNm}. */
  String name();

  /** Unit of its value. */
  String unit();

  /** Value of a design; larger is better. */
  double value(Reading reading);

  /** What a bench has to take along for it. */
  default List<LightSum> lightSums() {
    return List.of();
  }

  /** Whether the wanted quantity is to be small, so that the value is the quantity negated. */
  default boolean isSmallest() {
    return false;
  }

  /** The wanted quantity as people read it, from the value. */
  default double shown(double value) {
    return isSmallest() ? -value : value;
  }

  /**
   * Whether the value follows smoothly from the currents and sums of a reading, so that their
   * derivatives serve it.
   */
  default boolean isSmooth() {
    return false;
  }

  /** Whether the value is the smallest of the currents, so that their derivatives serve it. */
  default boolean isSmallestCurrent() {
    return false;
  }

  /** A second one for the same aim, for use by another thread. */
  default Aim forAnotherThread() {
    return this;
  }
}
