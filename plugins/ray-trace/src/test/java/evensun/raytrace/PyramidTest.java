package evensun.raytrace;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import evensun.raytrace.geometry.Reliefs;
import evensun.raytrace.kernel.LightTree;
import evensun.raytrace.trace.Beam;
import evensun.raytrace.trace.Face;
import evensun.raytrace.trace.Forest;
import evensun.raytrace.trace.Media;
import evensun.spi.HeightMap;
import evensun.spi.Incidence;
import evensun.spi.Parameter;
import evensun.spi.Polarisation;
import evensun.spi.Response;
import evensun.spi.Samples;
import evensun.spi.Side;
import evensun.spi.Texture;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

class PyramidTest {

  /** Angle of {111} facets to a {100} surface: arctan √2. */
  static final double FACET_DEG = Math.toDegrees(Math.atan(Math.sqrt(2)));

  private static final double N_600 = 3.939;

  static Texture pyramids(double baseUm) {
    return texture(Texture.Shape.PYRAMID, Texture.Direction.UP, Texture.Arrangement.GRID, baseUm);
  }

  static Texture texture(
      Texture.Shape shape, Texture.Direction points, Texture.Arrangement set, double baseUm) {
    return new Texture(
        shape, points, set, Parameter.fixed(FACET_DEG), baseUm, Optional.empty(), Side.FRONT);
  }

  /**
   * Witness: geometry. The first facet is met at arctan √2 = 54.74°, the next at 180° − 3 · 54.74°
   * = 15.79°, and a ninth of the rays meets a third at 86.3°.
   */
  @Test
  void regularPyramidsAreMetAtTheKnownAngles() {
    LightTree tree = reflections(8192);
    int[] count = new int[4];
    for (int e = 0; e < tree.count; e++) {
      int bounce = 0;
      for (int at = e; at >= 0; at = tree.parent[at] < 0 ? -1 : tree.parent[at] / 2) {
        bounce++;
      }
      count[bounce]++;
      double wanted = bounce == 1 ? FACET_DEG : bounce == 2 ? 180 - 3 * FACET_DEG : 86.3;
      double angleDeg = Math.toDegrees(Math.acos(tree.cosine[e]));
      assertThat(angleDeg).isCloseTo(wanted, within(bounce == 3 ? 0.05 : 1e-6));
    }
    assertThat(count[1]).isEqualTo(8192);
    assertThat(count[2]).isEqualTo(8192);
    assertThat(count[3] / 8192.0).isCloseTo(1.0 / 9, within(0.004));
  }

  /** Meetings in air with a perfect mirror of pyramids: a metal whose light never comes back. */
  private static LightTree reflections(int rays) {
    Face face =
        new Face(Optional.of(Reliefs.of(pyramids(5), FACET_DEG, 1)), Optional.empty(), false, 0, 0);
    double[][] n = {{1}, {0.01}};
    double[][] k = {{0}, {50}};
    Media media = new Media(new double[] {0.6}, n, k, new double[2]);
    Forest forest =
        Forest.trace(
            List.of(face), media, new Beam(0, false, Side.FRONT), 8, new int[] {rays / 8}, 3);
    return forest.trees().get(0);
  }

  /** Witness: the product of Fresnel reflectances of both facets, polarisation by polarisation. */
  @ParameterizedTest
  @EnumSource(Polarisation.class)
  void bareSiliconReflectsTheProductOfBothFacets(Polarisation polarisation) {
    Response response =
        Stacks.at(600)
            .film("facet", Stacks.constant(1, 0), 0, pyramids(5))
            .exit(Stacks.constant(N_600, 1e-9))
            .light(new Incidence(0, polarisation, Side.FRONT))
            .rays(32768)
            .solve();
    double first = Math.toRadians(FACET_DEG);
    double second = Math.toRadians(180 - 3 * FACET_DEG);
    double third = Math.toRadians(86.3);
    double s = s(first) * s(second);
    double p = p(first) * p(second);
    double twice = (s + p) / 2;
    // The plane of incidence turns before the third facet; between its s and p lies the truth.
    double low = (8 * twice + twice * Math.min(s(third), p(third))) / 9;
    double high = (8 * twice + twice * Math.max(s(third), p(third))) / 9;
    assertThat(response.reflectance[0][0]).isBetween(low - 2e-4, high + 2e-4);
  }

  private static double s(double angle) {
    double beyond = Math.sqrt(N_600 * N_600 - Math.pow(Math.sin(angle), 2));
    return Math.pow((Math.cos(angle) - beyond) / (Math.cos(angle) + beyond), 2);
  }

  private static double p(double angle) {
    double beyond = Math.sqrt(N_600 * N_600 - Math.pow(Math.sin(angle), 2));
    double a = N_600 * N_600 * Math.cos(angle);
    return Math.pow((a - beyond) / (a + beyond), 2);
  }

  static Stacks device(Texture texture) {
    return Stacks.grid(300, 1200, 20)
        .film("coating", Stacks.constant(2.0, 0), 75, texture)
        .thick("wafer", Stacks.silicon(), 180)
        .film("spacer", Stacks.constant(1.45, 0), 100)
        .exit(Stacks.table("silver"));
  }

  /** Witness: geometrical optics knows no length but the ratio to the thickness of the wafer. */
  @Test
  void theSizeOfPyramidsDoesNotMatter() {
    Response small = device(pyramids(2)).rays(512).solve();
    Response large = device(pyramids(10)).rays(512).solve();
    double error = Math.hypot(small.sumStandardError[1], large.sumStandardError[1]);
    // What is left beyond the noise is light that crosses a tip of silicon, absorbed along 10 µm.
    assertThat(Math.abs(small.sum[1] - large.sum[1])).isLessThan(4 * error + 0.01);
  }

  /** Witness: the same surface, described by facets. */
  @Test
  void aHeightMapOfPyramidsIsTheAnalyticArray() {
    int points = 32;
    double pitch = 5.0 / points;
    double[] height = new double[points * points];
    for (int i = 0; i < height.length; i++) {
      double x = Math.abs(i % points - points / 2.0);
      double y = Math.abs(i / points - points / 2.0);
      height[i] = -Math.sqrt(2) * pitch * Math.max(x, y);
    }
    Texture map =
        new Texture(
            Texture.Shape.HEIGHT_MAP,
            Texture.Direction.UP,
            Texture.Arrangement.GRID,
            Parameter.fixed(1),
            1,
            Optional.of(new HeightMap(points, points, pitch, Samples.of(height))),
            Side.FRONT);
    Response measured = device(map).rays(512).solve();
    Response analytic = device(pyramids(5)).rays(512).solve();
    for (int w = 0; w < analytic.reflectance[0].length; w++) {
      double allowed = 5 * analytic.absorptanceStandardError[1][w] + 2e-3;
      assertThat(measured.reflectance[0][w]).isCloseTo(analytic.reflectance[0][w], within(allowed));
    }
    assertThat(measured.sum[1]).isCloseTo(analytic.sum[1], within(0.02));
  }
}
