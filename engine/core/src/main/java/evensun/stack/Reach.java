package evensun.stack;

import evensun.scenario.Scenario;
import evensun.scenario.SearchSpec.VarySpec;

/**
 * The values a number takes in a run: as drawn, and wherever the search may move it.
 *
 * @param low smallest value
 * @param high largest value
 */
record Reach(double low, double high) {

  /**
   * The values behind a key.
   *
   * @param scenario whose search may move it
   * @param key as under {@code search.vary}
   * @param drawn value as drawn
   */
  static Reach of(Scenario scenario, String key, double drawn) {
    Reach reach = new Reach(drawn, drawn);
    if (scenario.search().isEmpty()) {
      return reach;
    }
    for (VarySpec vary : scenario.search().get().ranges()) {
      if (vary.key().equals(key)) {
        reach = new Reach(Math.min(drawn, vary.low()), Math.max(drawn, vary.high()));
      }
    }
    return reach;
  }
}
