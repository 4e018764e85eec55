package evensun.raytrace.kernel;

/** What films take of the light that meets them. */
public final class FilmSums {

  private FilmSums() {}

  /**
   * Adds up over directions; those without light cost nothing.
   *
   * @param met [first + direction] power from a direction
   * @param first of the directions
   * @param directions their number
   * @param absorbed [direction · films + film] share that a film takes
   * @param films number of films
   * @param into [film] added to
   */
  public static void add(
      double[] met, int first, int directions, double[] absorbed, int films, double[] into) {
    for (int d = 0; d < directions; d++) {
      double power = met[first + d];
      if (power != 0) {
        int at = d * films;
        for (int f = 0; f < films; f++) {
          into[f] += power * absorbed[at + f];
        }
      }
    }
  }
}
