package evensun.stack;

import evensun.scenario.LayerSpec;
import evensun.spi.Feature;
import java.util.ArrayList;
import java.util.List;

/**
 * A finite layer with its row of optical constants.
 *
 * @param spec as drawn
 * @param slot index of its {@link MaterialSlot}; of the first component where it is mixed
 * @param coherent whether waves interfere inside
 * @param features what is not flat, uniform and pure about it, as solvers see it
 * @param components what is mixed in it; empty when it is of one material
 */
public record ResolvedLayer(
    LayerSpec spec,
    int slot,
    boolean coherent,
    List<Feature> features,
    List<ResolvedComponent> components) {

  public ResolvedLayer {
    features = List.copyOf(features);
    components = List.copyOf(components);
  }

  /** A flat, uniform, pure layer. */
  public ResolvedLayer(LayerSpec spec, int slot, boolean coherent) {
    this(spec, slot, coherent, List.of(), List.of());
  }

  /** Name of the layer. */
  public String name() {
    return spec.name();
  }

  /** Whether a mixture or grading stands in place of one material. */
  public boolean isMixed() {
    return !components.isEmpty();
  }

  ResolvedLayer withFeature(Feature feature) {
    List<Feature> more = new ArrayList<>(features);
    more.add(feature);
    return new ResolvedLayer(spec, slot, coherent, more, components);
  }

  /** This layer without what shapes its boundary, or scatters there. */
  ResolvedLayer flattened() {
    List<Feature> kept =
        features.stream().filter(feature -> !Boundary.KINDS.contains(feature.kind())).toList();
    return new ResolvedLayer(spec, slot, coherent, kept, components);
  }

  /**
   * A component of a mixed layer.
   *
   * @param name name in the layer
   * @param slot index of its {@link MaterialSlot}
   */
  public record ResolvedComponent(String name, int slot) {}
}
