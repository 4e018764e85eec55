package evensun.raytrace;

import static org.assertj.core.api.Assertions.assertThatThrownBy;

import evensun.spi.Design;
import evensun.spi.EvaluationFailed;
import evensun.spi.Evaluator;
import evensun.spi.Feature;
import evensun.spi.IdealFace;
import evensun.spi.Knob;
import evensun.spi.Parameter;
import evensun.spi.PreparedSolver;
import evensun.spi.Response;
import evensun.spi.Roughness;
import evensun.spi.Scatter;
import evensun.spi.Side;
import evensun.spi.Texture;
import evensun.spi.UnsupportedProblem;
import evensun.testkit.Subject;
import java.util.Map;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class BadInputTest {

  private static Stacks wafer(Feature... features) {
    return Stacks.at(800, 900).thick("wafer", Stacks.silicon(), 100, features);
  }

  private static void refuses(Stacks stack, String part) {
    assertThatThrownBy(() -> stack.prepare(new RayTraceSolver()).close())
        .isInstanceOf(UnsupportedProblem.class)
        .hasMessageContaining(part)
        .hasMessageNotContaining("\n");
  }

  @ParameterizedTest
  @ValueSource(strings = {"0", "-8", "12", "many", "1e3", "65544", ""})
  void rayCountsThatMakeNoSense(String rays) {
    refuses(wafer().options(Map.of("rays", rays)), "was \"" + rays + "\"");
  }

  @Test
  void unknownOptions() {
    refuses(wafer().options(Map.of("photons", "5")), "\"photons\" is unknown");
  }

  @Test
  void twoShapesOnOneBoundary() {
    refuses(wafer(PyramidTest.pyramids(5), new Scatter(0.5, 1, Side.FRONT)), "texture and scatter");
  }

  @Test
  void idealFacesInside() {
    refuses(
        Stacks.at(800)
            .thick("glass", Stacks.constant(1.5, 0), 1000)
            .thick("wafer", Stacks.silicon(), 100, new IdealFace(Side.FRONT)),
        "first and the last boundary");
  }

  @Test
  void roughnessTooFineToScatter() {
    refuses(wafer(new Roughness(20, 30, Side.FRONT)), "effective-medium");
  }

  @Test
  void withoutASolverForFilms() {
    Stacks stack = wafer(PyramidTest.pyramids(5));
    assertThatThrownBy(
            () ->
                new RayTraceSolver().prepare(stack.problem(), stack.design(), Subject.noServices()))
        .isInstanceOf(UnsupportedProblem.class)
        .hasMessageContaining("transfer-matrix");
  }

  @Test
  void aFacetAngleMovedToTheVertical() {
    Texture moved =
        new Texture(
            Texture.Shape.PYRAMID,
            Texture.Direction.UP,
            Texture.Arrangement.GRID,
            Parameter.moved(50, new Knob(0, "facetAngleDeg", "°", 10, 90)),
            5,
            Optional.empty(),
            Side.FRONT);
    Stacks stack = wafer(moved).rays(16);
    Design design = stack.design();
    design.knob[0] = 50;
    try (PreparedSolver prepared =
            new RayTraceSolver().prepare(stack.problem(), design, Stacks.services());
        Evaluator evaluator = prepared.newEvaluator()) {
      design.knob[0] = 90;
      assertThatThrownBy(() -> evaluator.evaluate(design, new Response()))
          .isInstanceOf(EvaluationFailed.class)
          .hasMessageContaining("must be in (0, 90) degrees but was 90");
    }
  }

  @Test
  void aLayerThinnerThanItsTexture() {
    refuses(Stacks.at(800).thick("slab", Stacks.silicon(), 1, PyramidTest.pyramids(20)), "reach");
  }
}
