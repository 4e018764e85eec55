package evensun.raytrace.trace;

import java.util.SplittableRandom;
import org.apache.commons.math3.random.SobolSequenceGenerator;

/**
 * Numbers in [0, 1) for rays: a Sobol sequence, shifted at random for every replicate; after its
 * last dimension, and for lots, numbers hashed from seed, ray and place in the tree. Neighbouring
 * wavelengths take neighbouring pieces of the sequence, so that a sum over the spectrum sees it
 * whole.
 */
final class Draws {

  /** Dimensions from the sequence; later choices of a ray matter less. */
  static final int DIMENSIONS = 16;

  /** Odd, so that keys of neighbouring dimensions differ in all bits once mixed. */
  static final long STEP = 0xD1B54A32D192ED03L;

  private final long seed;
  private final SobolSequenceGenerator sequence = new SobolSequenceGenerator(DIMENSIONS);
  private final double[] shift = new double[DIMENSIONS];
  private long ray;

  Draws(long seed) {
    this.seed = seed;
  }

  /** Goes to the rays of one replicate and wavelength. */
  void begin(int replicate, int firstPoint) {
    SplittableRandom random = new SplittableRandom(seed + 0x9E3779B97F4A7C15L * (replicate + 1));
    for (int d = 0; d < DIMENSIONS; d++) {
      shift[d] = random.nextDouble();
    }
    ray = random.nextLong() + firstPoint;
    sequence.skipTo(firstPoint);
  }

  /** Goes to the next ray: its point, with the shift of the replicate, and the key of its lots. */
  void nextRay(Leg leg) {
    double[] point = sequence.nextVector();
    for (int d = 0; d < DIMENSIONS; d++) {
      double shifted = point[d] + shift[d];
      point[d] = shifted < 1 ? shifted : shifted - 1;
    }
    leg.point = point;
    leg.key = mixed(++ray);
  }

  /** A number hashed from a key. */
  static double unit(long key) {
    return (key >>> 11) * 0x1.0p-53;
  }

  /** Finaliser of the SplitMix64 generator (Steele, Lea and Flood, OOPSLA 2014). */
  static long mixed(long key) {
    long z = key + 0x9E3779B97F4A7C15L;
    z = (z ^ (z >>> 30)) * 0xBF58476D1CE4E5B9L;
    z = (z ^ (z >>> 27)) * 0x94D049BB133111EBL;
    return z ^ (z >>> 31);
  }
}
