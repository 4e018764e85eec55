package evensun.scenario;

import evensun.scenario.FeatureSpec.ComponentSpec;
import evensun.spi.Texture;
import java.util.List;
import java.util.Optional;

/**
 * What is not flat about an upper face as drawn. Roughness means that face alone; the others mean
 * the whole boundary that the face belongs to: all coherent films between two thick media.
 */
public sealed interface FaceSpec extends FeatureSpec {

  @Override
  default List<ComponentSpec> components() {
    return List.of();
  }

  @Override
  default FaceSpec withMaterial(String name, String other) {
    return this;
  }

  /**
   * A face rough on a scale of nanometres.
   *
   * @param rmsNm root mean square of the height in nm, greater than 0
   * @param correlationLengthNm lateral correlation length in nm, greater than 0
   * @param place where it stands
   */
  record RoughnessSpec(double rmsNm, double correlationLengthNm, Place place) implements FaceSpec {}

  /**
   * A boundary shaped on a scale above the wavelength.
   *
   * @param shape what is repeated
   * @param points where tips point
   * @param arrangement regular or scattered
   * @param facetAngleDeg angle of the facets to the mean plane as drawn, degrees; 0 for a height
   *     map
   * @param baseUm width of one feature in µm; 0 for a height map
   * @param heightMap the measured surface of a height map, else empty
   * @param place where it stands
   */
  record TextureSpec(
      Texture.Shape shape,
      Texture.Direction points,
      Texture.Arrangement arrangement,
      double facetAngleDeg,
      double baseUm,
      Optional<HeightMapSpec> heightMap,
      Place place)
      implements FaceSpec {}

  /**
   * A measured surface.
   *
   * @param table path of the grid of heights in µm, relative to the scenario
   * @param pitchUm distance of neighbouring points in µm, greater than 0
   * @param place where the file is named
   */
  record HeightMapSpec(String table, double pitchUm, Place place) {}

  /**
   * A boundary that scatters.
   *
   * @param specularFraction share that keeps the direction of a flat boundary, in [0, 1]
   * @param cosinePower of the scattered share; 1 is Lambertian
   * @param place where it stands
   */
  record ScatterSpec(double specularFraction, double cosinePower, Place place)
      implements FaceSpec {}

  /**
   * The limit of light trapping at an outer boundary.
   *
   * @param place where it stands
   */
  record IdealSpec(Place place) implements FaceSpec {}
}
