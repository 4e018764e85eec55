package evensun.raytrace;

import evensun.spi.UnsupportedProblem;
import java.util.Map;
import java.util.OptionalInt;

/**
 * What a scenario may set under {@code solver.options} for this solver.
 *
 * @param rays rays per wavelength; empty to choose them from the wanted error
 */
record Options(OptionalInt rays) {

  /** Independent estimates, from whose scatter errors are found. */
  static final int REPLICATES = 8;

  private static final String RAYS = "rays";
  private static final int LEAST_RAYS = 16;
  private static final int MOST_RAYS = 65_536;

  /**
   * Reads the options.
   *
   * @throws UnsupportedProblem naming an unknown option or value and what is allowed
   */
  static Options of(Map<String, String> options) {
    for (String key : options.keySet()) {
      if (!key.equals(RAYS)) {
        throw new UnsupportedProblem(
            "option \"%s\" is unknown to solver ray-trace; it takes rays: %s"
                .formatted(key, allowed()));
      }
    }
    String value = options.get(RAYS);
    return new Options(value == null ? OptionalInt.empty() : OptionalInt.of(rays(value)));
  }

  private static int rays(String value) {
    int rays;
    try {
      rays = Integer.parseInt(value.strip());
    } catch (NumberFormatException e) {
      throw wrong(value);
    }
    if (rays < LEAST_RAYS || rays > MOST_RAYS || rays % REPLICATES != 0) {
      throw wrong(value);
    }
    return rays;
  }

  private static UnsupportedProblem wrong(String value) {
    return new UnsupportedProblem(
        "option rays of solver ray-trace must be %s but was \"%s\"; leave it out to have it chosen from the wanted error"
            .formatted(allowed(), value));
  }

  private static String allowed() {
    return "a multiple of %d in [%d, %d] per wavelength"
        .formatted(REPLICATES, LEAST_RAYS, MOST_RAYS);
  }
}
