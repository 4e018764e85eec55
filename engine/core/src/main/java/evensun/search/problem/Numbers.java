package evensun.search.problem;

import java.util.ArrayList;
import java.util.List;
import java.util.SplittableRandom;

/** Small things on numbers that the search needs in several places. */
public final class Numbers {

  private Numbers() {}

  public static List<Double> list(double[] values) {
    List<Double> list = new ArrayList<>(values.length);
    for (double value : values) {
      list.add(value);
    }
    return list;
  }

  public static double[] array(List<Double> values) {
    double[] array = new double[values.size()];
    for (int i = 0; i < array.length; i++) {
      array[i] = values.get(i);
    }
    return array;
  }

  /** Largest difference of two rows of the same length. */
  public static double distance(double[] a, double[] b) {
    double largest = 0;
    for (int i = 0; i < a.length; i++) {
      largest = Math.max(largest, Math.abs(a[i] - b[i]));
    }
    return largest;
  }

  /**
   * One stream of random numbers for each (seed, step), the same on every machine: the algorithm of
   * {@link SplittableRandom} is fixed by the Java specification, unlike that of the default source.
   */
  public static SplittableRandom random(long seed, long step) {
    return new SplittableRandom(
        new SplittableRandom(seed).nextLong() ^ (step * 0x9E3779B97F4A7C15L));
  }
}
