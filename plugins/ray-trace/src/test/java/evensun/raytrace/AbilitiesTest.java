package evensun.raytrace;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import evensun.spi.Channel;
import evensun.spi.DepthProfile;
import evensun.spi.Design;
import evensun.spi.EvaluationFailed;
import evensun.spi.Evaluator;
import evensun.spi.Finding;
import evensun.spi.IdealFace;
import evensun.spi.PreparedSolver;
import evensun.spi.Quantity;
import evensun.spi.RaySection;
import evensun.spi.ReflectanceParts;
import evensun.spi.Response;
import evensun.spi.Side;
import evensun.spi.Texture;
import java.util.List;
import org.junit.jupiter.api.Test;

class AbilitiesTest {

  private static final Stacks STACK = PyramidTest.device(PyramidTest.pyramids(5)).rays(128);

  /** Witness: the definition. Its integral by the trapezoid rule is the absorptance. */
  @Test
  void absorptionAgainstDepthAddsUpToTheAbsorptance() {
    try (PreparedSolver prepared = STACK.prepare(new RayTraceSolver());
        Evaluator evaluator = prepared.newEvaluator()) {
      Design design = STACK.design();
      Response response = Stacks.wanted(STACK.problem());
      evaluator.evaluate(design, response);
      DepthProfile profile = evaluator.ability(DepthProfile.class).orElseThrow();
      double[] depthNm = depths(180_000);
      double[][] density = new double[depthNm.length][response.reflectance[0].length];
      profile.evaluate(design, 0, Channel.of(1), depthNm, density);
      for (int w = 10; w < response.reflectance[0].length; w++) {
        double sum = 0;
        for (int z = 1; z < depthNm.length; z++) {
          sum += (depthNm[z] - depthNm[z - 1]) * (density[z][w] + density[z - 1][w]) / 2;
        }
        assertThat(sum).isCloseTo(response.absorptance[1][w], within(4e-3));
      }
    }
  }

  /** Closer near the faces, where most is absorbed. */
  private static double[] depths(double thicknessNm) {
    int count = 4000;
    double[] depths = new double[count + 1];
    for (int z = 0; z <= count; z++) {
      depths[z] = thicknessNm * Math.pow((double) z / count, 3);
    }
    return depths;
  }

  @Test
  void whereInAFilmLightStaysIsRefusedInOneLine() {
    try (PreparedSolver prepared = STACK.prepare(new RayTraceSolver());
        Evaluator evaluator = prepared.newEvaluator()) {
      DepthProfile profile = evaluator.ability(DepthProfile.class).orElseThrow();
      assertThatThrownBy(
              () ->
                  profile.evaluate(
                      STACK.design(), 0, Channel.of(0), new double[] {1}, new double[1][46]))
          .isInstanceOf(EvaluationFailed.class)
          .hasMessageContaining("\"coating\"");
    }
  }

  @Test
  void lightThatNeverEnteredAndLightThatCameBackAreTheReflectance() {
    try (PreparedSolver prepared = STACK.prepare(new RayTraceSolver());
        Evaluator evaluator = prepared.newEvaluator()) {
      Response response = Stacks.wanted(STACK.problem());
      evaluator.evaluate(STACK.design(), response);
      int count = response.reflectance[0].length;
      double[] never = new double[count];
      double[] back = new double[count];
      evaluator
          .ability(ReflectanceParts.class)
          .orElseThrow()
          .evaluate(STACK.design(), 0, never, back);
      for (int w = 0; w < count; w++) {
        assertThat(never[w] + back[w]).isCloseTo(response.reflectance[0][w], within(1e-12));
        assertThat(Math.min(never[w], back[w])).isNotNegative();
      }
      // At 600 nm 180 µm of silicon let nothing back; at 1200 nm nearly all comes back or is lost
      // in silver.
      assertThat(back[15]).isLessThan(1e-6);
      assertThat(back[45]).isGreaterThan(0.5);
    }
  }

  /**
   * Witness: mean path 4n²W of randomised weakly absorbed light with a perfect mirror behind
   * (Yablonovitch, J. Opt. Soc. Am. 72, 899 (1982)), escape 1/n² at each meeting with the front.
   */
  @Test
  void idealFacesMakeThePathFourNSquaredThicknessesLong() {
    double n = 3.5;
    Stacks ideal =
        Stacks.at(1200)
            .thick(
                "wafer",
                Stacks.constant(n, 1e-9),
                100,
                new IdealFace(Side.FRONT),
                new IdealFace(Side.REAR))
            .rays(8192);
    try (PreparedSolver prepared = ideal.prepare(new RayTraceSolver())) {
      double path = value(prepared.describe(ideal.design()), "pathLengthEnhancement");
      assertThat(path).isCloseTo(4 * n * n, within(0.02 * 4 * n * n));
    }
    Response response = ideal.solve();
    double alphaUm = 4 * Math.PI * 1e-9 / 1.2;
    double weak = response.absorptance[0][0] / (alphaUm * 100);
    assertThat(weak).isCloseTo(4 * n * n, within(5 * error(response, alphaUm)));
  }

  private static double error(Response response, double alphaUm) {
    return response.absorptanceStandardError[0][0] / (alphaUm * 100);
  }

  @Test
  void describesFilmsAlongTheNormalOfTheSubstrate() {
    try (PreparedSolver prepared = STACK.prepare(new RayTraceSolver())) {
      List<Quantity> facts = prepared.describe(STACK.design());
      double along = value(facts, "coating.thicknessAlongSubstrateNormalNm");
      // Geometry: 75 nm over cos 54.74° = 1/√3.
      assertThat(along).isCloseTo(75 * Math.sqrt(3), within(0.5));
      assertThat(value(facts, "rayCount")).isEqualTo(128);
      assertThat(value(facts, "pathLengthEnhancement")).isBetween(10.0, 60.0);
    }
  }

  private static double value(List<Quantity> facts, String key) {
    return facts.stream().filter(f -> f.key().equals(key)).findFirst().orElseThrow().value();
  }

  @Test
  void examinesWhatRaysTakeForGranted() {
    Stacks fine = PyramidTest.device(PyramidTest.pyramids(0.7)).rays(32);
    try (PreparedSolver prepared = fine.prepare(new RayTraceSolver())) {
      assertThat(prepared.examine(fine.design()).stream().map(Finding::code))
          .contains(
              "geometrical-optics",
              "texture-near-wavelength",
              "film-against-texture",
              "energy-balance",
              "ray-error");
    }
  }

  @Test
  void drawsRaysThatLoseLightAlongTheirWay() {
    try (PreparedSolver prepared = STACK.prepare(new RayTraceSolver());
        Evaluator evaluator = prepared.newEvaluator()) {
      RaySection.View view =
          evaluator.ability(RaySection.class).orElseThrow().view(STACK.design(), 0, 40, 5);
      assertThat(view.outlines()).hasSize(2);
      assertThat(view.outlines().get(0).xUm().at(256)).isEqualTo(20);
      assertThat(view.outlines().get(1).zUm().at(0)).isEqualTo(180);
      assertThat(view.paths().stream().map(RaySection.Path::ray).distinct()).hasSize(5);
      for (RaySection.Path path : view.paths()) {
        assertThat(path.endShare()).isBetween(0.0, path.startShare() + 1e-12);
      }
    }
  }

  @Test
  void aFilmThickerThanItsTextureIsRefusedInOneLine() {
    Texture fine = PyramidTest.pyramids(0.05);
    assertThatThrownBy(() -> PyramidTest.device(fine).prepare(new RayTraceSolver()))
        .hasMessageContaining("\"coating\" is 75 nm thick")
        .hasMessageNotContaining("\n");
  }
}
