package evensun.stack;

import evensun.material.Material;
import evensun.scenario.InputException;
import evensun.scenario.Place;

/** Where the materials of a stack come from: the scenario's own hide the library's. */
@FunctionalInterface
public interface MaterialSource {

  /**
   * A material by name.
   *
   * @param name as the scenario writes it
   * @param place where the scenario writes it
   * @throws InputException when there is none, naming the nearest one there is
   */
  Material material(String name, Place place);
}
