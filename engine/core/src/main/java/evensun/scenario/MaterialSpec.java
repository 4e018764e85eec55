package evensun.scenario;

/** A material of the scenario's own. */
public sealed interface MaterialSpec {

  /** Where it stands. */
  Place place();

  /**
   * A measured table.
   *
   * @param path of the CSV file, relative to the scenario
   * @param hold whether the end values hold beyond the table ({@code extrapolate: hold})
   * @param place where it stands
   */
  record Table(String path, boolean hold, Place place) implements MaterialSpec {}
}
