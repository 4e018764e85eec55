package evensun.raytrace.geometry;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import evensun.spi.HeightMap;
import evensun.spi.Parameter;
import evensun.spi.Samples;
import evensun.spi.Side;
import evensun.spi.Texture;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.SplittableRandom;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

class ReliefTest {

  static Stream<Relief> reliefs() {
    List<Relief> all = new ArrayList<>();
    for (Texture.Shape shape : Texture.Shape.values()) {
      for (Texture.Arrangement set : Texture.Arrangement.values()) {
        for (Texture.Direction points : Texture.Direction.values()) {
          if (shape != Texture.Shape.HEIGHT_MAP) {
            all.add(Reliefs.of(texture(shape, points, set, Optional.empty()), 50, 4));
          }
        }
      }
    }
    all.add(
        Reliefs.of(
            texture(
                Texture.Shape.HEIGHT_MAP,
                Texture.Direction.UP,
                Texture.Arrangement.GRID,
                Optional.of(hills())),
            50,
            4));
    return all.stream();
  }

  private static Texture texture(
      Texture.Shape shape,
      Texture.Direction points,
      Texture.Arrangement set,
      Optional<HeightMap> map) {
    return new Texture(shape, points, set, Parameter.fixed(50), 3, map, Side.FRONT);
  }

  private static HeightMap hills() {
    double[] height = new double[20 * 24];
    for (int i = 0; i < height.length; i++) {
      height[i] = Math.sin(2 * Math.PI * (i % 20) / 20) + Math.cos(4 * Math.PI * (i / 20) / 24.0);
    }
    return new HeightMap(20, 24, 0.25, Samples.of(height));
  }

  /**
   * Witness: the height of the surface, looked up in small steps along the line; the line is on the
   * other side of it just after the meeting and on its own side all the way before.
   */
  @ParameterizedTest
  @MethodSource("reliefs")
  void lightMeetsTheSurfaceWhereItFirstIsAtItsHeight(Relief relief) {
    SplittableRandom random = new SplittableRandom(9);
    for (int i = 0; i < 300; i++) {
      boolean above = random.nextBoolean();
      Ray ray = new Ray();
      ray.x = random.nextDouble(relief.periodXUm());
      ray.y = random.nextDouble(relief.periodYUm());
      ray.z = above ? relief.highUm() : relief.lowUm();
      double cosine = random.nextDouble(0.2, 1);
      double turn = random.nextDouble(2 * Math.PI);
      ray.dx = Math.sqrt(1 - cosine * cosine) * Math.cos(turn);
      ray.dy = Math.sqrt(1 - cosine * cosine) * Math.sin(turn);
      ray.dz = above ? -cosine : cosine;
      double[] from = {ray.x, ray.y, ray.z};
      assertThat(relief.next(ray, above)).isTrue();
      double at = ray.travelledUm;
      double slack = 1e-6 * relief.featureUm();
      assertThat(gap(relief, from, ray, at)).isCloseTo(0, within(slack));
      for (int step = 1; step < 200; step++) {
        double gap = gap(relief, from, ray, at * step / 200);
        assertThat(above ? gap : -gap).isGreaterThan(-slack);
      }
      double along = ray.dx * ray.normalX + ray.dy * ray.normalY + ray.dz * ray.normalZ;
      assertThat(above ? along : -along).isLessThanOrEqualTo(1e-9);
      assertThat(Math.hypot(Math.hypot(ray.normalX, ray.normalY), ray.normalZ))
          .isCloseTo(1, within(1e-9));
    }
  }

  private static double gap(Relief relief, double[] from, Ray ray, double at) {
    return from[2] + at * ray.dz - relief.heightUm(from[0] + at * ray.dx, from[1] + at * ray.dy);
  }

  /** Witness: volumes of a pyramid (1/3), a ridge (1/2) and a cap, over their base. */
  @Test
  void meanHeightsAreThoseOfTheSolids() {
    Texture.Direction up = Texture.Direction.UP;
    Texture.Arrangement grid = Texture.Arrangement.GRID;
    double height = 1.5 * Math.tan(Math.toRadians(50));
    Relief pyramid = Reliefs.of(texture(Texture.Shape.PYRAMID, up, grid, Optional.empty()), 50, 1);
    assertThat(pyramid.meanUm()).isCloseTo(height / 3, within(1e-3));
    Relief ridge = Reliefs.of(texture(Texture.Shape.GROOVE, up, grid, Optional.empty()), 50, 1);
    assertThat(ridge.meanUm()).isCloseTo(height / 2, within(1e-3));
    Relief cap = Reliefs.of(texture(Texture.Shape.DIMPLE, up, grid, Optional.empty()), 50, 1);
    double h = cap.highUm();
    double volume = Math.PI * h / 6 * (3 * 1.5 * 1.5 + h * h);
    assertThat(cap.meanUm()).isCloseTo(volume / 9, within(1e-3));
  }

  @Test
  void scatteredShapesCoverNearlyEverythingAndRepeatForASeed() {
    Texture scattered =
        texture(
            Texture.Shape.PYRAMID,
            Texture.Direction.UP,
            Texture.Arrangement.SCATTERED,
            Optional.empty());
    Relief one = Reliefs.of(scattered, 54.74, 5);
    Relief same = Reliefs.of(scattered, 54.74, 5);
    Relief other = Reliefs.of(scattered, 54.74, 6);
    int bare = 0;
    int different = 0;
    for (int i = 0; i < 10_000; i++) {
      double x = (i % 100) * 0.4801;
      double y = (i / 100) * 0.4797;
      assertThat(same.heightUm(x, y)).isEqualTo(one.heightUm(x, y));
      bare += one.heightUm(x, y) == 0 ? 1 : 0;
      different += one.heightUm(x, y) != other.heightUm(x, y) ? 1 : 0;
    }
    assertThat(bare).isLessThan(50);
    assertThat(different).isGreaterThan(9000);
  }
}
