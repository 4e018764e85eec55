package evensun.scenario;

import evensun.scenario.FeatureSpec.ComponentSpec;
import java.util.List;

/**
 * A finite layer as drawn.
 *
 * @param name unique name
 * @param material material name; empty where the features name the materials instead
 * @param gap how the bandgap of a tunable material is chosen
 * @param thicknessNm thickness in nm, at least 0
 * @param coherence what the scenario says about interference inside
 * @param features what is not flat, uniform and pure about it
 * @param place where it stands
 */
public record LayerSpec(
    String name,
    String material,
    GapChoice gap,
    double thicknessNm,
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
    this(name, material, gap, thicknessNm, coherence, List.of(), place);
  }

  /** This layer with one material replaced by another. */
  public LayerSpec withMaterial(String old, String other) {
    return new LayerSpec(
        name,
        material.equals(old) ? other : material,
        gap,
        thicknessNm,
        coherence,
        features.stream().map(feature -> feature.withMaterial(old, other)).toList(),
        place);
  }

  /** This layer left out: of no thickness. */
  public LayerSpec absent() {
    return new LayerSpec(name, material, gap, 0, coherence, features, place);
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
