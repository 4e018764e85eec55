package evensun.scenario;

import evensun.scenario.FaceSpec.RoughnessSpec;
import evensun.scenario.FeatureSpec.ComponentSpec;
import java.util.List;

/**
 * A finite layer as drawn.
 *
 * @param name unique name
 * @param material material name; empty where the features name the materials instead
 * @param gap how the bandgap of a tunable material is chosen
 * @param thicknessNm thickness in nm, at least 0; of a layer left out the one it would have
 * @param present whether it is there; a layer left out keeps its name and its place
 * @param coherence what the scenario says about interference inside
 * @param features what is not flat, uniform and pure about it
 * @param place where it stands
 */
public record LayerSpec(
    String name,
    String material,
    GapChoice gap,
    double thicknessNm,
    boolean present,
    Coherence coherence,
    List<FeatureSpec> features,
    Place place) {

  public LayerSpec {
    features = List.copyOf(features);
  }

  /** A flat, uniform, pure layer. */
  public LayerSpec(
      String name,
      String material,
      GapChoice gap,
      double thicknessNm,
      Coherence coherence,
      Place place) {
    this(name, material, gap, thicknessNm, true, coherence, List.of(), place);
  }

  /** This layer with one material replaced by another. */
  public LayerSpec withMaterial(String old, String other) {
    return new LayerSpec(
        name,
        material.equals(old) ? other : material,
        gap,
        thicknessNm,
        present,
        coherence,
        features.stream().map(feature -> feature.withMaterial(old, other)).toList(),
        place);
  }

  /** This layer there, or left out. */
  public LayerSpec withPresent(boolean there) {
    return new LayerSpec(name, material, gap, thicknessNm, there, coherence, features, place);
  }

  /** Thickness in the stack as drawn in nm, 0 where the layer is left out. */
  public double drawnNm() {
    return present ? thicknessNm : 0;
  }

  /**
   * The features that the stack has: of a layer left out all but the roughness of its own face,
   * since the shape of a boundary belongs to all its films.
   */
  public List<FeatureSpec> drawnFeatures() {
    return present
        ? features
        : features.stream().filter(feature -> !(feature instanceof RoughnessSpec)).toList();
  }

  /** What is mixed in this layer, in the order of the file; empty when it is of one material. */
  public List<ComponentSpec> components() {
    return features.stream().flatMap(feature -> feature.components().stream()).toList();
  }

  /** What the scenario says about interference inside a layer. */
  public enum Coherence {
    /** Nothing: coherent, and refused when its fringes are too fine for the grid. */
    DEFAULT,
    /** Written: waves interfere. */
    COHERENT,
    /** Written: intensities add. */
    INCOHERENT,
    /** Fills a texture below and is flat on top ({@code planarises: true}): intensities add. */
    PLANARISES;

    /** Whether waves interfere inside. */
    public boolean interferes() {
      return this == DEFAULT || this == COHERENT;
    }
  }
}
