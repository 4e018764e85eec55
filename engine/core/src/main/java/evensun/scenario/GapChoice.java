package evensun.scenario;

/**
 * How a scenario chooses the bandgap of a tunable material.
 *
 * @param key by which quantity
 * @param value the bandgap in eV or the fraction; 0 where nothing is chosen
 */
public record GapChoice(Key key, double value) {

  /** Nothing is chosen: the material's own. */
  public static final GapChoice NONE = new GapChoice(Key.NONE, 0);

  /** The quantity that is written. */
  public enum Key {
    /** None. */
    NONE(""),
    /** The bandgap itself. */
    BANDGAP("bandgapEv"),
    /** The composition of an alloy, from which the bandgap follows. */
    COMPOSITION("compositionFraction");

    private final String word;

    Key(String word) {
      this.word = word;
    }

    /** As written in a scenario. */
    public String word() {
      return word;
    }
  }

  /** Whether anything is chosen. */
  public boolean isPresent() {
    return key != Key.NONE;
  }
}
