package evensun.spi;

import java.util.Arrays;

/** An immutable row of numbers; records hold this instead of arrays. */
public final class Samples {

  private static final Samples EMPTY = new Samples(new double[0]);

  private final double[] values;

  private Samples(double[] values) {
    this.values = values;
  }

  /** A copy of {@code values}. */
  public static Samples of(double... values) {
    return values.length == 0 ? EMPTY : new Samples(values.clone());
  }

  /** Number of values. */
  public int size() {
    return values.length;
  }

  /**
   * One value.
   *
   * @param index in [0, size)
   */
  public double at(int index) {
    return values[index];
  }

  /** A fresh array of all values. */
  public double[] toArray() {
    return values.clone();
  }

  @Override
  public boolean equals(Object other) {
    return other instanceof Samples samples && Arrays.equals(values, samples.values);
  }

  @Override
  public int hashCode() {
    return Arrays.hashCode(values);
  }

  @Override
  public String toString() {
    return values.length <= 8
        ? Arrays.toString(values)
        : "[" + values[0] + ", … " + values[values.length - 1] + "] (" + values.length + " values)";
  }
}
