package evensun.scenario;

import java.util.List;
import java.util.OptionalInt;

/**
 * What to search.
 *
 * @param vary what may vary, in the order of the file
 * @param aim name of the aim
 * @param seed seed of the search
 * @param evaluations largest number of evaluations, if the scenario sets one
 * @param place where it stands
 */
public record SearchSpec(
    List<VarySpec> vary, String aim, long seed, OptionalInt evaluations, Place place) {

  public SearchSpec {
    vary = List.copyOf(vary);
  }

  /**
   * One quantity that may vary.
   *
   * @param key such as {@code perovskite.thicknessNm}
   * @param low lower bound in the unit of the key
   * @param high upper bound in the unit of the key, at least {@code low}
   * @param place where it stands
   */
  public record VarySpec(String key, double low, double high, Place place) {}
}
