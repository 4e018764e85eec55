package evensun.scenario.reader;

import evensun.scenario.GapChoice;
import evensun.scenario.GapChoice.Key;
import evensun.scenario.tree.Fields;
import evensun.scenario.tree.Interval;
import java.util.List;

/** Binds the bandgap of a tunable material, or the composition that it follows from. */
final class GapBinder {

  /** Keys that choose a bandgap. */
  static final List<String> KEYS = List.of(Key.BANDGAP.word(), Key.COMPOSITION.word());

  private GapBinder() {}

  static GapChoice bind(Fields fields) {
    boolean composed = fields.has(Key.COMPOSITION.word());
    if (composed && fields.has(Key.BANDGAP.word())) {
      FeatureBinder.refuse(
          fields, Key.BANDGAP.word(), "follows from compositionFraction beside it");
    }
    Key key = composed ? Key.COMPOSITION : Key.BANDGAP;
    var value = fields.number(key.word(), interval(key));
    return value.isPresent() ? new GapChoice(key, value.getAsDouble()) : GapChoice.NONE;
  }

  /** Legal values of a quantity. */
  static Interval interval(Key key) {
    return key == Key.COMPOSITION ? MixtureBinder.FRACTION : StackBinder.BANDGAP;
  }
}
