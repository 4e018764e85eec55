package evensun.raytrace.geometry;

import evensun.raytrace.geometry.Union.Placed;
import evensun.spi.Texture;
import java.util.ArrayList;
import java.util.List;
import java.util.SplittableRandom;

/** Makes the surface that a texture describes. */
public final class Reliefs {

  /** Side of the cell of a scattered texture, in mean widths of its shapes. */
  private static final double CELL_WIDTHS = 16;

  /**
   * How often the shapes of a scattered texture cover the cell: all but exp(−7) of it is covered.
   */
  private static final double COVER = 7;

  /** Widths of scattered shapes lie within this share of their mean. */
  private static final double SPREAD = 0.5;

  private Reliefs() {}

  /**
   * The surface of a texture.
   *
   * @param texture its description
   * @param facetAngleDeg its facet angle in degrees, in (0, 90)
   * @param seed of what is scattered
   */
  public static Relief of(Texture texture, double facetAngleDeg, long seed) {
    if (texture.shape() == Texture.Shape.HEIGHT_MAP) {
      return new HeightField(texture.heightMap().orElseThrow());
    }
    Relief upright =
        texture.arrangement() == Texture.Arrangement.GRID
            ? grid(texture, facetAngleDeg)
            : scattered(texture, facetAngleDeg, seed);
    return texture.points() == Texture.Direction.UP ? upright : new Flipped(upright);
  }

  private static Relief grid(Texture texture, double angleDeg) {
    double base = texture.baseUm();
    Solid solid = solid(texture.shape(), base, angleDeg);
    return new Union(base, base, List.of(new Placed(solid, base / 2, base / 2)));
  }

  private static Solid solid(Texture.Shape shape, double baseUm, double angleDeg) {
    double slope = Math.tan(Math.toRadians(angleDeg));
    return switch (shape) {
      case PYRAMID -> Faceted.pyramid(baseUm, slope);
      case GROOVE -> Faceted.ridge(baseUm, slope);
      default -> new Cap(baseUm, angleDeg);
    };
  }

  /** Places and widths are uniform; what another shape hides altogether is left out. */
  private static Relief scattered(Texture texture, double angleDeg, long seed) {
    SplittableRandom random = new SplittableRandom(seed);
    double base = texture.baseUm();
    double cell = CELL_WIDTHS * base;
    boolean ridges = texture.shape() == Texture.Shape.GROOVE;
    List<Placed> placed = new ArrayList<>();
    double covered = 0;
    while (covered < COVER) {
      double width = base * random.nextDouble(1 - SPREAD, 1 + SPREAD);
      Solid solid = solid(texture.shape(), width, angleDeg);
      placed.add(new Placed(solid, random.nextDouble(cell), random.nextDouble(cell)));
      covered += ridges ? width / cell : width * width / (cell * cell);
    }
    Union all = new Union(cell, base, placed);
    placed.removeIf(p -> all.heightUm(p.x(), p.y()) > p.solid().height() + 1e-9 * base);
    return new Union(cell, base, placed);
  }
}
