package evensun.spi;

import java.util.List;

/**
 * A finite layer; what varies (thickness, material) stands in the {@link Design}.
 *
 * @param name as in the scenario, unique in the stack
 * @param coherent whether waves interfere inside; otherwise intensities add
 * @param features what is not flat, uniform and pure about it; those of a boundary stand on the
 *     layer whose upper face (or coating) they shape
 */
public record Layer(String name, boolean coherent, List<Feature> features) {

  public Layer {
    features = List.copyOf(features);
  }

  /** A flat, uniform, pure layer. */
  public static Layer plain(String name, boolean coherent) {
    return new Layer(name, coherent, List.of());
  }

  /** This layer with other features. */
  public Layer withFeatures(List<Feature> others) {
    return new Layer(name, coherent, others);
  }
}
