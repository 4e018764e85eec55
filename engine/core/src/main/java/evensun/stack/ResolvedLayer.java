package evensun.stack;

import evensun.scenario.LayerSpec;

/**
 * A finite layer with its row of optical constants.
 *
 * @param spec as drawn
 * @param slot index of its {@link MaterialSlot}
 * @param coherent whether waves interfere inside
 */
public record ResolvedLayer(LayerSpec spec, int slot, boolean coherent) {

  /** Name of the layer. */
  public String name() {
    return spec.name();
  }
}
