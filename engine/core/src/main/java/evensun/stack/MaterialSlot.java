package evensun.stack;

import evensun.material.Material;
import evensun.material.Tuning;
import java.util.List;
import java.util.OptionalDouble;

/**
 * One row of optical constants: a material as the layers that share it use it. A tunable material
 * has one slot per layer, since each may choose its own bandgap.
 *
 * @param name material name in the scenario
 * @param material its optical constants
 * @param bandgapEv bandgap as drawn in eV: the scenario's, else the material's, if any
 * @param layers names of the layers that use it
 */
public record MaterialSlot(
    String name, Material material, OptionalDouble bandgapEv, List<String> layers) {

  public MaterialSlot {
    layers = List.copyOf(layers);
  }

  /** Whether the bandgap may be chosen. */
  public boolean tunable() {
    return material.tuning().isPresent();
  }

  /** How the bandgap of a tunable material may be chosen. */
  public Tuning tuning() {
    return material.tuning().orElseThrow();
  }

  /** The number handed to the material's filler: the bandgap, or 0 where it has none. */
  public double fillValue() {
    return bandgapEv.orElse(0);
  }

  MaterialSlot withLayer(String layer) {
    return new MaterialSlot(
        name,
        material,
        bandgapEv,
        java.util.stream.Stream.concat(layers.stream(), java.util.stream.Stream.of(layer))
            .toList());
  }
}
