package evensun.material;

import java.util.Optional;

/**
 * The range over which a material's bandgap may be chosen.
 *
 * @param lowEv smallest bandgap in eV
 * @param highEv largest bandgap in eV
 * @param defaultEv bandgap when the scenario names none, in eV
 * @param composition how the bandgap follows from the composition, where that is known
 */
public record Tuning(
    double lowEv, double highEv, double defaultEv, Optional<Composition> composition) {

  /** A range whose bandgap is chosen as such only. */
  public Tuning(double lowEv, double highEv, double defaultEv) {
    this(lowEv, highEv, defaultEv, Optional.empty());
  }
}
