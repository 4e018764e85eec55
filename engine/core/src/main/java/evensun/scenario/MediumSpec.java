package evensun.scenario;

import evensun.scenario.FeatureSpec.RoughnessSpec;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * A half-space in front of or behind the stack.
 *
 * @param name layer name; the incident medium is named after its material
 * @param material material name
 * @param bandgapEv wanted bandgap of a tunable material, in eV
 * @param roughness of its face to the stack, where that is rough
 * @param place where it stands
 */
public record MediumSpec(
    String name,
    String material,
    OptionalDouble bandgapEv,
    Optional<RoughnessSpec> roughness,
    Place place) {

  /** A medium with a flat face. */
  public MediumSpec(String name, String material, OptionalDouble bandgapEv, Place place) {
    this(name, material, bandgapEv, Optional.empty(), place);
  }

  /** This medium of another material. */
  public MediumSpec withMaterial(String other) {
    return new MediumSpec(name, other, bandgapEv, roughness, place);
  }
}
