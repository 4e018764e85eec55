package evensun.raytrace;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import evensun.raytrace.kernel.LightTree;
import evensun.raytrace.trace.Beam;
import evensun.raytrace.trace.Face;
import evensun.raytrace.trace.Forest;
import evensun.raytrace.trace.Media;
import evensun.spi.Incidence;
import evensun.spi.Parameter;
import evensun.spi.Polarisation;
import evensun.spi.Response;
import evensun.spi.Side;
import evensun.spi.Texture;
import evensun.spi.Texture.Arrangement;
import evensun.spi.Texture.Direction;
import evensun.spi.Texture.Shape;
import evensun.transfermatrix.TransferMatrixSolver;
import java.util.List;
import java.util.Optional;
import java.util.function.UnaryOperator;
import java.util.stream.Stream;
import org.junit.jupiter.api.Named;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** What holds for every shape: limits that know nothing of facets. */
class DiffuseLimitTest {

  private static final double NM = 1000;
  private static final double INDEX = 2;
  private static final double SLAB_UM = 100;

  /** Extinction for which one way through takes a share of 1e-4. */
  private static final double K = 1e-4 * NM / (4 * Math.PI * 1000 * SLAB_UM);

  private static final Stacks.Medium SLAB = Stacks.constant(INDEX, K);

  private static Texture texture(
      Shape shape, Direction points, Arrangement arrangement, Side side) {
    double angleDeg = shape == Shape.DIMPLE ? 50 : PyramidTest.FACET_DEG;
    return new Texture(
        shape, points, arrangement, Parameter.fixed(angleDeg), 5, Optional.empty(), side);
  }

  private static Incidence diffuse(Side side) {
    return new Incidence(0, Polarisation.UNPOLARISED, side, true);
  }

  static Stream<Named<UnaryOperator<Stacks>>> devices() {
    Texture front = texture(Shape.PYRAMID, Direction.UP, Arrangement.SCATTERED, Side.FRONT);
    Texture dimples = texture(Shape.DIMPLE, Direction.DOWN, Arrangement.GRID, Side.FRONT);
    Texture rear = texture(Shape.PYRAMID, Direction.DOWN, Arrangement.SCATTERED, Side.REAR);
    Stacks.Medium glass = Stacks.constant(1.5, 0);
    return Stream.of(
        Named.of("scattered pyramids in front", s -> s.thick("slab", SLAB, SLAB_UM, front)),
        Named.of("dimples in front", s -> s.thick("slab", SLAB, SLAB_UM, dimples)),
        Named.of("planar front, textured rear", s -> s.thick("slab", SLAB, SLAB_UM, rear)),
        Named.of("both textured", s -> s.thick("slab", SLAB, SLAB_UM, front, rear)),
        Named.of(
            "cover glass and a film",
            s ->
                s.thick("glass", glass, 500)
                    .film("coating", Stacks.constant(1.7, 0), 80, front)
                    .thick("slab", SLAB, SLAB_UM)),
        Named.of(
            "filled texture",
            s -> s.thick("filling", glass, 20).thick("slab", SLAB, SLAB_UM, front)));
  }

  /**
   * Witness: light in equilibrium with light from all directions outside has n² times its intensity
   * inside, whatever the faces, so that a weak absorber with a mirror behind it takes 4n²αW
   * (Yablonovitch, J. Opt. Soc. Am. 72, 899 (1982)). The mirror is a medium so thin that all light
   * but 0.05² of what the front lets out is reflected totally.
   */
  @ParameterizedTest
  @MethodSource("devices")
  void weakAbsorptionOfDiffuseLightKnowsTheIndexAlone(UnaryOperator<Stacks> device) {
    Response response =
        device
            .apply(Stacks.at(NM))
            .exit(Stacks.constant(0.05, 0))
            .light(diffuse(Side.FRONT))
            .rays(8192)
            .solve();
    int slab = response.absorptance.length - 1;
    double once = 1e-4;
    double enhancement = response.absorptance[slab][0] / once;
    double error = response.absorptanceStandardError[slab][0] / once;
    double limit = 4 * INDEX * INDEX;
    // Level rays are long, so that errors fall slowly.
    assertThat(error).isLessThan(0.05 * limit);
    assertThat(enhancement).isCloseTo(limit, within(3.5 * error + 0.005 * limit));
  }

  /** Witness: reciprocity. As much diffuse light gets through from behind as from the front. */
  @Test
  void diffuseLightPassesBothWaysAlike() {
    Response response =
        Stacks.at(NM)
            .film(
                "coating",
                Stacks.constant(1.7, 0.02),
                90,
                texture(Shape.PYRAMID, Direction.UP, Arrangement.SCATTERED, Side.FRONT))
            .thick("slab", Stacks.constant(INDEX, 1e-4), SLAB_UM)
            .film("rear", Stacks.constant(1.4, 0.01), 120)
            .thick(
                "glass",
                Stacks.constant(1.5, 0),
                300,
                texture(Shape.GROOVE, Direction.DOWN, Arrangement.GRID, Side.REAR))
            .light(diffuse(Side.FRONT), diffuse(Side.REAR))
            .rays(8192)
            .solve();
    double down = response.transmittance[0][0];
    double up = response.transmittance[1][0];
    assertThat(down).isBetween(0.1, 0.7);
    assertThat(up).isCloseTo(down, within(0.01));
  }

  /** Witness: a texture between equal media is none; the flat slab of the solver below. */
  @Test
  void aTextureBetweenEqualMediaIsNotSeen() {
    Stacks.Medium medium = Stacks.constant(1.6, 1e-3);
    Stacks.Medium metal = Stacks.constant(0.2, 6);
    Response filled =
        Stacks.at(600)
            .thick("filling", medium, 20)
            .thick(
                "below",
                medium,
                30,
                texture(Shape.PYRAMID, Direction.UP, Arrangement.GRID, Side.FRONT))
            .exit(metal)
            .rays(16384)
            .solve();
    Response flat =
        Stacks.at(600).thick("slab", medium, 50).exit(metal).solve(new TransferMatrixSolver());
    double error = filled.absorptanceStandardError[0][0] + filled.absorptanceStandardError[1][0];
    assertThat(error).isLessThan(2e-3);
    assertThat(filled.reflectance[0][0]).isCloseTo(flat.reflectance[0][0], within(3 * error));
    assertThat(filled.transmittance[0][0]).isCloseTo(flat.transmittance[0][0], within(3 * error));
    double absorbed = filled.absorptance[0][0] + filled.absorptance[1][0];
    assertThat(absorbed).isCloseTo(flat.absorptance[0][0], within(3 * error));
  }

  /**
   * Witness: the haze of a rough mirror, 1 − exp(−(4πσn/λ)²) (Bennett and Porteus, J. Opt. Soc. Am.
   * 51, 123 (1961)).
   */
  @Test
  void aRoughMirrorScattersItsHaze() {
    double n = 1.5;
    double rmsUm = 0.02;
    double um = NM / 1000;
    Face rough = new Face(Optional.empty(), Optional.empty(), false, rmsUm, 1);
    Media media =
        new Media(
            new double[] {um},
            new double[][] {{1}, {n}, {0.01}},
            new double[][] {{0}, {0}, {50}},
            new double[] {0, 64, 0});
    int rays = 2048;
    Beam beam = new Beam(0, false, Side.FRONT);
    LightTree tree =
        Forest.trace(List.of(Face.FLAT, rough), media, beam, 8, new int[] {rays}, 5).trees().get(0);
    double came = 0;
    double turned = 0;
    for (int e = 0; e < tree.count; e++) {
      int mirror = tree.parent[e] / 2;
      boolean first = tree.parent[e] > 0 && tree.table[mirror] == 2 && isRoot(tree, mirror);
      if (first && tree.table[e] == 1) {
        came += tree.factor[e];
        turned += tree.cosine[e] < 1 - 1e-9 ? tree.factor[e] : 0;
      }
    }
    double haze = -Math.expm1(-Math.pow(4 * Math.PI * rmsUm * n / um, 2));
    double error = Math.sqrt(haze * (1 - haze) / (8 * rays));
    assertThat(came).isCloseTo(8 * rays, within(0.02 * 8 * rays));
    assertThat(turned / came).isCloseTo(haze, within(4 * error));
  }

  private static boolean isRoot(LightTree tree, int event) {
    return tree.parent[event] >= 0 && tree.parent[tree.parent[event] / 2] < 0;
  }
}
