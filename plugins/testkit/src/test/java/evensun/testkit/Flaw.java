package evensun.testkit;

import evensun.spi.Feature;
import evensun.spi.Mixture;
import evensun.spi.Scatter;
import evensun.spi.Texture;

/** A mistake that a solver may make, and the law that is meant to catch it. */
enum Flaw {
  NONE(""),
  MAKES_LIGHT("ledger"),
  ABSORBS_IN_TRANSPARENT_LAYERS("transparent-layers"),
  REFLECTS_TOO_MUCH("bare-interface"),
  TAKES_UNPOLARISED_FOR_S("polarisation-average"),
  JUMPS_OFF_THE_NORMAL("oblique-limit"),
  KNOWS_NO_GRAZING_LIGHT("grazing-limit"),
  KEEPS_ABSENT_LAYERS("zero-thickness"),
  CLIPS_THICKNESS("splitting"),
  PREFERS_A_DIRECTION("order-reversal"),
  SMOOTHS_OVER_WAVELENGTHS("wavelength-by-wavelength"),
  MISTAKES_MIXTURES("mixture-of-one"),
  MISTAKES_SCATTER("scatter-nothing"),
  MISTAKES_TEXTURES("even-surface"),
  REMEMBERS("same-input-same-output"),
  SHARES_A_WORKSPACE("threads"),
  SHUFFLES_A_BATCH("batch"),
  WRITES_TO_THE_DESIGN("inputs-unwritten"),
  REPLACES_ROWS("inputs-unwritten"),
  FORGETS_WHAT_IS_TRANSMITTED("weighted-sums"),
  ADDS_TO_OLD_SUMS("weighted-sums"),
  SUMS_ONLY_WITH_ERRORS("weighted-sums"),
  TAKES_NAN_FOR_ZERO("nan"),
  IGNORES_UNKNOWN_OPTIONS("impossible-requests"),
  IGNORES_UNKNOWN_FEATURES("impossible-requests"),
  HAS_WRONG_SLOPES("gradient"),
  HALVES_THE_DEPTH_PROFILE("depth-integral"),
  HANGS("nan"),
  THROWS("ledger");

  final String law;

  Flaw(String law) {
    this.law = law;
  }

  /** Whether a solver with this flaw takes a feature for something else. */
  boolean mistakes(Feature feature) {
    return switch (this) {
      case MISTAKES_MIXTURES -> feature instanceof Mixture;
      case MISTAKES_SCATTER -> feature instanceof Scatter;
      case MISTAKES_TEXTURES -> feature instanceof Texture;
      default -> false;
    };
  }
}
