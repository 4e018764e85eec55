package evensun.scenario;

import java.util.List;

/**
 * A half-space in front of or behind the stack.
 *
 * @param name layer name; the incident medium is named after its material
 * @param material material name
 * @param gap how the bandgap of a tunable material is chosen
 * @param faces what is not flat about its face to the stack
 * @param place where it stands
 */
public record MediumSpec(
    String name, String material, GapChoice gap, List<FaceSpec> faces, Place place) {

  public MediumSpec {
    faces = List.copyOf(faces);
  }

  /** A medium with a flat face. */
  public MediumSpec(String name, String material, GapChoice gap, Place place) {
    this(name, material, gap, List.of(), place);
  }

  /** This medium of another material. */
  public MediumSpec withMaterial(String other) {
    return new MediumSpec(name, other, gap, faces, place);
  }
}
