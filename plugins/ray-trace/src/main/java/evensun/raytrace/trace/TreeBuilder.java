package evensun.raytrace.trace;

import evensun.raytrace.kernel.LightTree;
import java.util.Arrays;

/** Grows a tree event by event. */
final class TreeBuilder {

  private static final int FIRST_SIZE = 1024;

  private final int[] start;
  private int count;
  private int[] parent = new int[FIRST_SIZE];
  private float[] kept = new float[FIRST_SIZE];
  private float[] factor = new float[FIRST_SIZE];
  private byte[] table = new byte[FIRST_SIZE];
  private double[] cosine = new double[FIRST_SIZE];
  private byte[] slot = new byte[2 * FIRST_SIZE];
  private float[] fixedUm = new float[2 * FIRST_SIZE];
  private float[] perThickness = new float[2 * FIRST_SIZE];

  TreeBuilder(int replicates) {
    start = new int[replicates + 1];
  }

  void beginReplicate(int replicate) {
    start[replicate] = count;
  }

  /** Adds a meeting whose legs are not known yet. */
  int add(int from, double keptShare, double lotFactor, int tableIndex, double cos) {
    if (count == parent.length) {
      grow();
    }
    parent[count] = from;
    kept[count] = (float) keptShare;
    factor[count] = (float) lotFactor;
    table[count] = (byte) tableIndex;
    cosine[count] = cos;
    for (int leg = 2 * count; leg < 2 * count + 2; leg++) {
      leg(leg, Slots.LOST, Double.POSITIVE_INFINITY, 0);
    }
    return count++;
  }

  void leg(int leg, int where, double fixed, double crossings) {
    slot[leg] = (byte) where;
    fixedUm[leg] = (float) fixed;
    perThickness[leg] = (float) crossings;
  }

  private void grow() {
    int size = 2 * count;
    parent = Arrays.copyOf(parent, size);
    kept = Arrays.copyOf(kept, size);
    factor = Arrays.copyOf(factor, size);
    table = Arrays.copyOf(table, size);
    cosine = Arrays.copyOf(cosine, size);
    slot = Arrays.copyOf(slot, 2 * size);
    fixedUm = Arrays.copyOf(fixedUm, 2 * size);
    perThickness = Arrays.copyOf(perThickness, 2 * size);
  }

  LightTree build(int rays) {
    start[start.length - 1] = count;
    return new LightTree(
        Arrays.copyOf(parent, count),
        Arrays.copyOf(kept, count),
        Arrays.copyOf(factor, count),
        Arrays.copyOf(table, count),
        Arrays.copyOf(cosine, count),
        Arrays.copyOf(slot, 2 * count),
        Arrays.copyOf(fixedUm, 2 * count),
        Arrays.copyOf(perThickness, 2 * count),
        start,
        rays);
  }
}
