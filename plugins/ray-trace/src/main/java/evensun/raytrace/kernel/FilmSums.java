package evensun.raytrace.kernel;

/** What films take of the light that meets them. */
public final class FilmSums {

  private FilmSums() {}

  /**
   * Adds what a film takes from a direction.
   *
   * @param met [w] power from the direction
   * @param absorbed [w] share that the film takes
   * @param into [w] added to
   * @param count number of wavelengths
   */
  public static void add(double[] met, double[] absorbed, double[] into, int count) {
    for (int w = 0; w < count; w++) {
      into[w] += met[w] * absorbed[w];
    }
  }

  /**
   * Adds what is neither reflected nor transmitted.
   *
   * @param met [w] power from the direction
   * @param reflected [w] share
   * @param transmitted [w] share
   * @param into [w] added to
   * @param count number of wavelengths
   */
  public static void addRest(
      double[] met, double[] reflected, double[] transmitted, double[] into, int count) {
    for (int w = 0; w < count; w++) {
      into[w] += met[w] * (1 - reflected[w] - transmitted[w]);
    }
  }
}
