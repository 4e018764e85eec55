package evensun.scenario;

import java.util.List;

/**
 * A subcell: the layers whose absorbed light is its photocurrent.
 *
 * @param name unique name
 * @param absorbers layer names, or {@code layer/component} of mixed layers
 * @param diode its electrical side
 * @param place where it stands
 */
public record SubcellSpec(String name, List<String> absorbers, DiodeSpec diode, Place place) {

  public SubcellSpec {
    absorbers = List.copyOf(absorbers);
  }
}
