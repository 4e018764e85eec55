package evensun.scenario;

import java.util.List;
import java.util.OptionalDouble;

/**
 * A half-space in front of or behind the stack.
 *
 * @param name layer name; the incident medium is named after its material
 * @param material material name
 * @param bandgapEv wanted bandgap of a tunable material, in eV
 * @param faces what is not flat about its face to the stack
 * @param place where it stands
 */
public record MediumSpec(
    String name, String material, OptionalDouble bandgapEv, List<FaceSpec> faces, Place place) {

  public MediumSpec {
    faces = List.copyOf(faces);
  }

  /** A medium with a flat face. */
  public MediumSpec(String name, String material, OptionalDouble bandgapEv, Place place) {
    this(name, material, bandgapEv, List.of(), place);
  }

  /** This medium of another material. */
  public MediumSpec withMaterial(String other) {
    return new MediumSpec(name, other, bandgapEv, faces, place);
  }
}
