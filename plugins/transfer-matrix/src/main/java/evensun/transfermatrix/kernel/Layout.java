package evensun.transfermatrix.kernel;

/**
 * The media of one design in the order the light meets them, absent layers left out.
 *
 * <p>Index j: 0 is the medium the light comes from, 1 to {@link #layerCount} are the layers
 * present, {@code layerCount + 1} is the medium behind. Reused by its owner, one thread at a time.
 */
public final class Layout {

  /** N, the number of layers present. */
  public int layerCount;

  /** [j] index of the layer in the problem; -1 for the medium in front, L for the one behind. */
  public final int[] layer;

  /** [j] row of the material. */
  public final int[] material;

  /** [j] thickness in nm; 0 for both ends. */
  public final double[] thicknessNm;

  /** [j] whether waves interfere inside; false for both ends. */
  public final boolean[] coherent;

  /** An empty layout with room for {@code layers} finite layers. */
  public Layout(int layers) {
    layer = new int[layers + 2];
    material = new int[layers + 2];
    thicknessNm = new double[layers + 2];
    coherent = new boolean[layers + 2];
  }

  /** Starts anew with the medium the light comes from. */
  public void start(int layerIndex, int materialIndex) {
    layerCount = -1;
    append(layerIndex, materialIndex, 0, false);
  }

  /**
   * Adds the next medium; the last one added is the medium behind.
   *
   * @param layerIndex index of the layer in the problem
   * @param materialIndex row of the material
   * @param nm thickness in nm, at least 0
   * @param interferes whether waves interfere inside
   */
  public void append(int layerIndex, int materialIndex, double nm, boolean interferes) {
    int j = layerCount + 1;
    layer[j] = layerIndex;
    material[j] = materialIndex;
    thicknessNm[j] = nm;
    coherent[j] = interferes;
    layerCount = j;
  }

  /** Closes the list with the medium behind. */
  public void finish(int layerIndex, int materialIndex) {
    append(layerIndex, materialIndex, 0, false);
    layerCount--;
  }
}
