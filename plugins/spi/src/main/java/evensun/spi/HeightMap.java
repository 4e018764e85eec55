package evensun.spi;

/**
 * A measured surface: heights on a square grid of points, continued periodically, two triangles to
 * each square.
 *
 * @param columns points along x, at least 2; the surface repeats after {@code columns · pitchUm}
 * @param rows points along y, at least 2; the surface repeats after {@code rows · pitchUm}
 * @param pitchUm distance of neighbouring points in µm, greater than 0
 * @param heightUm [row * columns + column] height towards the incident light in µm, finite
 */
public record HeightMap(int columns, int rows, double pitchUm, Samples heightUm) {

  /**
   * Checks the numbers.
   *
   * @throws IllegalArgumentException naming the component, the rule and the value
   */
  public HeightMap {
    require(columns >= 2 && rows >= 2, "a height map must have two columns and two rows or more");
    require(pitchUm > 0 && pitchUm <= 1e4, "pitchUm must be in (0, 1e4] µm but was " + pitchUm);
    require(
        heightUm.size() == columns * rows,
        "a height map of %d × %d points must have %d heights but had %d"
            .formatted(columns, rows, columns * rows, heightUm.size()));
    for (int i = 0; i < heightUm.size(); i++) {
      require(
          Double.isFinite(heightUm.at(i)),
          "height in row %d, column %d must be a finite number of µm but was %s"
              .formatted(i / columns + 1, i % columns + 1, heightUm.at(i)));
    }
  }

  private static void require(boolean condition, String message) {
    if (!condition) {
      throw new IllegalArgumentException(message);
    }
  }
}
