package evensun.scenario;

/**
 * A measured curve.
 *
 * @param subcell the subcell whose external quantum efficiency it is; empty for the reflectance of
 *     the device
 * @param path of the file, relative to the scenario
 * @param place where it stands
 */
public record MeasuredSpec(String subcell, String path, Place place) {

  /** Whether it is the reflectance of the device. */
  public boolean isReflectance() {
    return subcell.isEmpty();
  }
}
