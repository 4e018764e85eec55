package evensun.spi;

import java.util.Arrays;
import java.util.List;
import java.util.Optional;

/**
 * A boundary between two thick media that is shaped on a scale above the wavelength: pyramids,
 * grooves, dimples, a measured surface.
 *
 * <p>Thick media are the incident medium, the exit medium and every incoherent layer; the coherent
 * layers between two of them are the films of their boundary. A texture shapes the whole boundary:
 * all its films follow the facets, with {@link Design#thicknessNm} measured along the facet normal,
 * and the thickness of a thick layer between the mean planes of its boundaries. It stands on one
 * film of the boundary, or on the thick layer below it, with face {@link Side#FRONT}; on the last
 * layer with face {@link Side#REAR} when it shapes the boundary with the exit medium and that has
 * no films. A boundary has one texture at most.
 *
 * @param shape what is repeated over the boundary
 * @param points where the tips of pyramids and the ridges of grooves point; {@link Direction#UP}
 *     for {@link Shape#DIMPLE} is a bump; of no effect for {@link Shape#HEIGHT_MAP}
 * @param arrangement regular, or scattered with a seed, sizes and overlaps; {@link
 *     Arrangement#GRID} for a height map, which is continued periodically
 * @param facetAngleDeg angle of the facets to the mean plane in degrees, in (0, 90); for dimples
 *     that of their rim; of no effect for a height map
 * @param baseUm width of a pyramid or a groove, diameter of a dimple, in µm, greater than 0; the
 *     mean where scattered; of no effect for a height map
 * @param heightMap the measured surface of {@link Shape#HEIGHT_MAP}, else empty
 * @param face which face of the layer is meant, see above
 */
public record Texture(
    Shape shape,
    Direction points,
    Arrangement arrangement,
    Parameter facetAngleDeg,
    double baseUm,
    Optional<HeightMap> heightMap,
    Side face)
    implements Feature {

  /** The kind of this feature. */
  public static final String KIND = "texture";

  /**
   * Checks the parts.
   *
   * @throws IllegalArgumentException naming the component, the rule and the value
   */
  public Texture {
    boolean measured = shape == Shape.HEIGHT_MAP;
    require(
        measured == heightMap.isPresent(),
        "heightMap must be given for shape height-map and for no other");
    require(
        measured || (facetAngleDeg.value() > 0 && facetAngleDeg.value() < 90),
        "facetAngleDeg must be in (0, 90) degrees but was " + facetAngleDeg.value());
    require(
        measured || (baseUm > 0 && baseUm <= 1e5),
        "baseUm must be in (0, 1e5] µm but was " + baseUm);
    require(
        !measured || arrangement == Arrangement.GRID,
        "arrangement must be grid for shape height-map");
  }

  @Override
  public String kind() {
    return KIND;
  }

  @Override
  public List<Knob> knobs() {
    return facetAngleDeg.knob().stream().toList();
  }

  private static void require(boolean condition, String message) {
    if (!condition) {
      throw new IllegalArgumentException(message);
    }
  }

  /** What is repeated over the boundary. */
  public enum Shape {
    /** Four plane facets on a square base. */
    PYRAMID("pyramid"),
    /** Two plane facets along a line. */
    GROOVE("groove"),
    /** A spherical cap. */
    DIMPLE("dimple"),
    /** A measured surface. */
    HEIGHT_MAP("height-map");

    private final String id;

    Shape(String id) {
      this.id = id;
    }

    /** Name in scenarios. */
    public String id() {
      return id;
    }

    /** The shape of that name in scenarios, or empty. */
    public static Optional<Shape> of(String id) {
      return Arrays.stream(values()).filter(shape -> shape.id.equals(id)).findFirst();
    }
  }

  /** Where tips point. */
  public enum Direction {
    /** Towards the incident light. */
    UP,
    /** Away from the incident light. */
    DOWN
  }

  /** How the shapes stand side by side. */
  public enum Arrangement {
    /** On a square grid, edge to edge. */
    GRID,
    /** At random places, overlapping, with widths even within half of their mean about it. */
    SCATTERED
  }
}
