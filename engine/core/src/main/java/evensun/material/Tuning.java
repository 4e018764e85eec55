package evensun.material;

/**
 * The range over which a material's bandgap may be chosen.
 *
 * @param lowEv smallest bandgap in eV
 * @param highEv largest bandgap in eV
 * @param defaultEv bandgap when the scenario names none, in eV
 */
public record Tuning(double lowEv, double highEv, double defaultEv) {}
