package evensun.raytrace.trace;

/** How much randomised light leaves an ideal front. */
public final class IdealShare {

  private IdealShare() {}

  /**
   * 1/n², n the index inside over that outside; all where the outside is denser.
   *
   * @param outside index of the incident medium
   * @param inside index of the layer below
   */
  public static double leaving(double outside, double inside) {
    return Math.min(1, outside * outside / (inside * inside));
  }
}
