package evensun.scenario;

import java.util.OptionalDouble;

/**
 * A finite layer as drawn.
 *
 * @param name unique name
 * @param material material name
 * @param bandgapEv wanted bandgap of a tunable material, in eV
 * @param thicknessNm thickness in nm, at least 0
 * @param coherence what the scenario says about interference inside
 * @param place where it stands
 */
public record LayerSpec(
    String name,
    String material,
    OptionalDouble bandgapEv,
    double thicknessNm,
    Coherence coherence,
    Place place) {

  /** This layer of another material. */
  public LayerSpec withMaterial(String other) {
    return new LayerSpec(name, other, bandgapEv, thicknessNm, coherence, place);
  }

  /** What the scenario says about interference inside a layer. */
  public enum Coherence {
    /** Nothing: coherent, and refused when its fringes are too fine for the grid. */
    DEFAULT,
    /** Written: waves interfere. */
    COHERENT,
    /** Written: intensities add. */
    INCOHERENT
  }
}
