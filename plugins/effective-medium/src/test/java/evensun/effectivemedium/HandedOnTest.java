package evensun.effectivemedium;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import evensun.spi.Design;
import evensun.spi.Evaluator;
import evensun.spi.Feature;
import evensun.spi.Grading;
import evensun.spi.Incidence;
import evensun.spi.Layer;
import evensun.spi.MixingRule;
import evensun.spi.OpticalSolver;
import evensun.spi.Parameter;
import evensun.spi.Polarisation;
import evensun.spi.PreparedSolver;
import evensun.spi.Problem;
import evensun.spi.Profile;
import evensun.spi.ReflectanceParts;
import evensun.spi.Response;
import evensun.spi.Scatter;
import evensun.spi.Services;
import evensun.spi.Side;
import evensun.spi.Texture;
import evensun.spi.Traits;
import evensun.spi.UnsupportedProblem;
import evensun.transfermatrix.TransferMatrixSolver;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import org.junit.jupiter.api.Test;

/** What this solver does not resolve reaches the solver below as it is: laws of the contract. */
class HandedOnTest {

  private static final Incidence DIFFUSE =
      new Incidence(0, Polarisation.UNPOLARISED, Side.FRONT, true);

  private static final Texture TEXTURE =
      new Texture(
          Texture.Shape.PYRAMID,
          Texture.Direction.UP,
          Texture.Arrangement.GRID,
          Parameter.fixed(54.7),
          5,
          Optional.empty(),
          Side.FRONT);

  private static final Scatter SCATTER = new Scatter(0.5, 1, Side.REAR);

  private static Stacks textured() {
    Grading grading =
        new Grading(
            new Grading.End("from", 0),
            new Grading.End("to", 1),
            new Profile.Linear(),
            MixingRule.BRUGGEMAN,
            1e-4,
            OptionalDouble.empty());
    Stacks stack = Stacks.on(3.5, 0.01);
    stack.layer("graded", 1, 0, 200, grading, TEXTURE);
    stack.layer("porous", 2, 0, 80, Stacks.porous(3, 0.2));
    stack.layer("thick", false, 1.5, 1e-5, 1e5, SCATTER);
    stack.options = Map.of("next", "rays", "rays", "64");
    stack.incidence = DIFFUSE;
    return stack;
  }

  @Test
  void texturesScatteringDiffuseLightAndOptionsReachTheSolverBelow() {
    Stacks stack = textured();
    Rays rays = new Rays(new ArrayList<>());
    PreparedSolver prepared =
        new EffectiveMediumSolver().prepare(stack.problem(), stack.design(), Stacks.services(rays));
    assertThat(rays.problems).hasSize(1);
    Problem handed = rays.problems.get(0);
    assertThat(handed.options()).isEqualTo(Map.of("rays", "64"));
    assertThat(handed.incidences()).containsExactly(DIFFUSE);
    List<Layer> layers = handed.layers();
    assertThat(layers.get(0).features()).containsExactly(TEXTURE);
    assertThat(layers.get(layers.size() - 1).features()).containsExactly(SCATTER);
    List<Feature> between =
        layers.subList(1, layers.size() - 1).stream().flatMap(l -> l.features().stream()).toList();
    assertThat(between).isEmpty();
    assertThat(layers).hasSizeGreaterThan(5);
    assertThat(prepared.channels()).hasSize(5);
  }

  @Test
  void reflectanceStaysInItsParts() {
    Stacks stack = textured();
    PreparedSolver prepared =
        new EffectiveMediumSolver()
            .prepare(stack.problem(), stack.design(), Stacks.services(new Rays(new ArrayList<>())));
    ReflectanceParts parts = prepared.newEvaluator().ability(ReflectanceParts.class).orElseThrow();
    double[] never = new double[6];
    double[] back = new double[6];
    parts.evaluate(stack.design(), 0, never, back);
    assertThat(never).containsOnly(0.25);
    assertThat(back).containsOnly(0.125);
  }

  @Test
  void diffuseLightIsRefusedWhereTheSolverBelowDoesNotTakeIt() {
    Stacks stack = Stacks.on(1.5, 0).layer("film", 2, 0, 50);
    stack.incidence = DIFFUSE;
    assertThatThrownBy(stack::prepare)
        .isInstanceOf(UnsupportedProblem.class)
        .hasMessage(
            "diffuse light is not supported by solver transfer-matrix; choose another one with the option next");
  }

  /** Stands for a statistical solver: notes what it is asked, answers as flat layers do. */
  private record Rays(List<Problem> problems) implements OpticalSolver {

    @Override
    public String id() {
      return "rays";
    }

    @Override
    public Traits traits() {
      return new Traits(
          Set.of(Texture.KIND, Scatter.KIND),
          Set.of(ReflectanceParts.class),
          true,
          true,
          true,
          true);
    }

    @Override
    public PreparedSolver prepare(Problem problem, Design start, Services services) {
      problems.add(problem);
      List<Layer> flat =
          problem.layers().stream().map(layer -> layer.withFeatures(List.of())).toList();
      PreparedSolver below =
          new TransferMatrixSolver()
              .prepare(
                  problem
                      .withOptions(Map.of())
                      .withIncidences(List.of(Incidence.normal()))
                      .withStack(
                          flat,
                          problem.incidentMaterial(),
                          problem.exitMaterial(),
                          problem.materialCount()),
                  start,
                  services);
      return new PreparedSolver() {
        @Override
        public List<evensun.spi.Channel> channels() {
          return below.channels();
        }

        @Override
        public Evaluator newEvaluator() {
          return new Parted(below.newEvaluator());
        }
      };
    }
  }

  private record Parted(Evaluator below) implements Evaluator {

    @Override
    public void evaluate(Design design, Response into) {
      below.evaluate(design, into);
    }

    @Override
    public <A> Optional<A> ability(Class<A> type) {
      ReflectanceParts parts =
          (design, incidence, never, back) -> {
            java.util.Arrays.fill(never, 0.25);
            java.util.Arrays.fill(back, 0.125);
          };
      return type == ReflectanceParts.class ? Optional.of(type.cast(parts)) : Optional.empty();
    }
  }
}
