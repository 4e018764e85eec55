package evensun.spi;

/**
 * What absorptance is split by: a finite layer, or one component of a mixed layer.
 *
 * @param layer index of the layer in {@link Problem#layers()}
 * @param component name of the component, empty for the whole layer
 */
public record Channel(int layer, String component) {

  /** The channel of a whole layer. */
  public static Channel of(int layer) {
    return new Channel(layer, "");
  }
}
