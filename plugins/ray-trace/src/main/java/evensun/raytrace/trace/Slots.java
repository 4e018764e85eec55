package evensun.raytrace.trace;

/**
 * Where light may be booked: nowhere (0), in thick medium m, or out at the top after having been as
 * deep as medium m. Medium 0 is the incident one, the last the exit medium.
 *
 * @param media number of thick media, at least 2
 */
public record Slots(int media) {

  /** Light that was lost on the way; the energy balance shows it. */
  public static final int LOST = 0;

  /** Absorbed in a medium; for the exit medium: transmitted. */
  public int in(int medium) {
    return 1 + medium;
  }

  /** Left at the top after having been as deep as a medium. */
  public int top(int deepest) {
    return 1 + media + deepest;
  }

  /** Number of slots. */
  public int count() {
    return 1 + 2 * media;
  }
}
