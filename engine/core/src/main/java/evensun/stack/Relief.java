package evensun.stack;

import evensun.spi.HeightMap;
import evensun.spi.Texture;
import evensun.spi.Texture.Arrangement;
import evensun.spi.Texture.Direction;
import evensun.spi.Texture.Shape;

/**
 * How far a texture reaches from its mean plane.
 *
 * @param aboveUm highest point above the mean plane in µm
 * @param belowUm lowest point below the mean plane in µm
 */
public record Relief(double aboveUm, double belowUm) {

  /** Height of the tallest of scattered shapes over that of one of mean width. */
  private static final double TALLEST = 1.5;

  /** Height from the lowest to the highest point in µm. */
  public double heightUm() {
    return aboveUm + belowUm;
  }

  /**
   * Height of one shape of mean width in µm; of a measured surface from the lowest to the highest
   * point.
   */
  public static double ofOneShapeUm(Texture texture, double facetAngleDeg) {
    return texture.heightMap().isPresent()
        ? of(texture.heightMap().get()).heightUm()
        : heightUm(texture.shape(), texture.baseUm(), facetAngleDeg);
  }

  /**
   * The relief of a texture.
   *
   * @param texture the texture
   * @param facetAngleDeg angle of its facets in degrees, in (0, 90)
   */
  public static Relief of(Texture texture, double facetAngleDeg) {
    if (texture.heightMap().isPresent()) {
      return of(texture.heightMap().get());
    }
    double heightUm = heightUm(texture.shape(), texture.baseUm(), facetAngleDeg);
    boolean grid = texture.arrangement() == Arrangement.GRID;
    double highest = grid ? heightUm : TALLEST * heightUm;
    double mean =
        grid
            ? meanFraction(texture.shape(), texture.baseUm(), heightUm) * heightUm
            : scatteredMean(texture.shape()) * heightUm;
    return texture.points() == Direction.UP
        ? new Relief(highest - mean, mean)
        : new Relief(mean, highest - mean);
  }

  /**
   * Mean height of overlapping shapes with widths within half of their mean, over the height of one
   * of mean width; computed, to 0.05, from arrays that cover their floor seven times.
   */
  private static double scatteredMean(Shape shape) {
    return shape == Shape.PYRAMID ? 0.81 : shape == Shape.GROOVE ? 1.01 : 1.05;
  }

  private static double heightUm(Shape shape, double baseUm, double facetAngleDeg) {
    double angle = Math.toRadians(facetAngleDeg);
    return 0.5 * baseUm * (shape == Shape.DIMPLE ? Math.tan(0.5 * angle) : Math.tan(angle));
  }

  /** Mean height over the height: of a pyramid a third, of a ridge half, of a cap by its volume. */
  private static double meanFraction(Shape shape, double baseUm, double heightUm) {
    return switch (shape) {
      case PYRAMID -> 1.0 / 3;
      case GROOVE -> 0.5;
      default -> Math.PI * (0.75 * baseUm * baseUm + heightUm * heightUm) / (6 * baseUm * baseUm);
    };
  }

  private static Relief of(HeightMap map) {
    double[] heightUm = map.heightUm().toArray();
    double low = Double.POSITIVE_INFINITY;
    double high = Double.NEGATIVE_INFINITY;
    double sum = 0;
    for (double height : heightUm) {
      low = Math.min(low, height);
      high = Math.max(high, height);
      sum += height;
    }
    double mean = sum / heightUm.length;
    return new Relief(high - mean, mean - low);
  }
}
