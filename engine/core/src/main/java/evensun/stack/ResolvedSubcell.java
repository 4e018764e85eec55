package evensun.stack;

import java.util.List;

/**
 * A subcell with its absorbers found in the stack.
 *
 * @param name name
 * @param absorbers its absorbers in the scenario's order
 */
public record ResolvedSubcell(String name, List<Absorber> absorbers) {

  public ResolvedSubcell {
    absorbers = List.copyOf(absorbers);
  }

  /**
   * An absorber.
   *
   * @param layer index of the finite layer; the number of finite layers stands for the exit medium
   * @param component component of a mixed layer, empty for the whole layer
   * @param slot its row of optical constants
   */
  public record Absorber(int layer, String component, int slot) {}
}
