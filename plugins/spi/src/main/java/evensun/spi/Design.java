package evensun.spi;

import java.util.concurrent.atomic.AtomicLong;

/**
 * One candidate: the numbers that a search moves. The host owns and reuses it, one per thread; a
 * solver reads it during a call, never writes it and never keeps its arrays.
 */
public final class Design {

  private static final AtomicLong REVISIONS = new AtomicLong();

  /** [l] thickness in nm, at least 0; a layer of zero thickness is absent. */
  public final double[] thicknessNm;

  /**
   * [l] index of the layer's material, a row of {@link #n} and {@link #k}; ignored for mixtures.
   */
  public final int[] material;

  /** [m][w] refractive index, greater than 0. */
  public final double[][] n;

  /** [m][w] extinction coefficient, at least 0. */
  public final double[][] k;

  /** [m] changes whenever row m of n or k does: equal revisions mean equal rows. */
  public final long[] revision;

  /** [index] values of the knobs of the features. */
  public final double[] knob;

  /**
   * A design with all numbers zero and every layer of material 0.
   *
   * @param layers L
   * @param materials M
   * @param wavelengths W
   * @param knobs K
   */
  public Design(int layers, int materials, int wavelengths, int knobs) {
    thicknessNm = new double[layers];
    material = new int[layers];
    n = new double[materials][wavelengths];
    k = new double[materials][wavelengths];
    revision = new long[materials];
    knob = new double[knobs];
  }

  /** A design of the shape that {@code problem} asks for. */
  public static Design of(Problem problem) {
    return new Design(
        problem.layerCount(),
        problem.materialCount(),
        problem.wavelengthCount(),
        problem.knobCount());
  }

  /** A revision that no row has had before in this process; the host calls it after filling one. */
  public static long nextRevision() {
    return REVISIONS.incrementAndGet();
  }

  /** Takes over every number and revision of another design of the same shape. */
  public void copyFrom(Design other) {
    System.arraycopy(other.thicknessNm, 0, thicknessNm, 0, thicknessNm.length);
    System.arraycopy(other.material, 0, material, 0, material.length);
    System.arraycopy(other.knob, 0, knob, 0, knob.length);
    for (int m = 0; m < n.length; m++) {
      if (revision[m] != other.revision[m] || revision[m] == 0) {
        System.arraycopy(other.n[m], 0, n[m], 0, n[m].length);
        System.arraycopy(other.k[m], 0, k[m], 0, k[m].length);
        revision[m] = other.revision[m];
      }
    }
  }
}
