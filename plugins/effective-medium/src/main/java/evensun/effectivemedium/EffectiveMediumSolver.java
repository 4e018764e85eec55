package evensun.effectivemedium;

import evensun.spi.DepthProfile;
import evensun.spi.Design;
import evensun.spi.EffectiveIndex;
import evensun.spi.EvaluationFailed;
import evensun.spi.Feature;
import evensun.spi.Gradient;
import evensun.spi.Grading;
import evensun.spi.IdealFace;
import evensun.spi.Incidence;
import evensun.spi.Layer;
import evensun.spi.Mixture;
import evensun.spi.OpticalSolver;
import evensun.spi.Polarisation;
import evensun.spi.PreparedSolver;
import evensun.spi.Problem;
import evensun.spi.RaySection;
import evensun.spi.ReflectanceParts;
import evensun.spi.Roughness;
import evensun.spi.Scatter;
import evensun.spi.Services;
import evensun.spi.Side;
import evensun.spi.Texture;
import evensun.spi.Traits;
import evensun.spi.UnsupportedProblem;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;

/**
 * Mixed, graded and rough layers as plain ones, for the solver below.
 *
 * <p>Option {@code next}: id of the solver below, {@code transfer-matrix} unless set. All other
 * options go to it, and so do features of kinds that this solver does not know, diffuse light, and
 * faces so coarsely rough that they scatter.
 */
public final class EffectiveMediumSolver implements OpticalSolver {

  /** Kinds of features that this solver resolves. */
  static final Set<String> RESOLVED = Set.of(Mixture.KIND, Grading.KIND, Roughness.KIND);

  private static final String ID = "effective-medium";
  private static final String DEFAULT_NEXT = "transfer-matrix";

  /** Where half of diffuse light comes from nearer to the normal, half from further away. */
  private static final Incidence MEAN_DIRECTION =
      new Incidence(45, Polarisation.UNPOLARISED, Side.FRONT);

  /** For the service loader. */
  public EffectiveMediumSolver() {}

  @Override
  public String id() {
    return ID;
  }

  @Override
  public Traits traits() {
    return new Traits(
        Set.of(
            Mixture.KIND, Grading.KIND, Roughness.KIND, Texture.KIND, Scatter.KIND, IdealFace.KIND),
        Set.of(
            Gradient.class,
            DepthProfile.class,
            EffectiveIndex.class,
            ReflectanceParts.class,
            RaySection.class),
        true,
        true,
        false,
        true);
  }

  @Override
  public PreparedSolver prepare(Problem problem, Design start, Services services) {
    String next = problem.options().getOrDefault("next", DEFAULT_NEXT);
    OpticalSolver below = solver(next, services);
    requireTaken(problem, below);
    try {
      return prepare(problem.withOptions(handedOn(problem)), start, below, services);
    } catch (EvaluationFailed e) {
      throw new UnsupportedProblem(e.getMessage());
    }
  }

  private static PreparedSolver prepare(
      Problem problem, Design start, OpticalSolver below, Services services) {
    Planner planner = new Planner(problem, start);
    SliceChoice choice =
        planner.hasGrading() && below.traits().statistical()
            ? judgedFlat(problem, start, services)
            : new SliceChoice(planner, start, below, services);
    Chain chain = Chain.of(planner.plan(choice.count()), start, below, services);
    return new PreparedChain(
        chain,
        planner.hasGrading() ? Optional.of(choice) : Optional.empty(),
        planner.tolerance(),
        below.traits().features().contains(Roughness.KIND));
  }

  /** Slices chosen by the flat stack: noise would hide what finer slices change. */
  private static SliceChoice judgedFlat(Problem problem, Design start, Services services) {
    List<Incidence> directions =
        problem.incidences().stream().map(i -> i.diffuse() ? MEAN_DIRECTION : i).toList();
    Problem flat = problem.withOptions(Map.of()).withIncidences(directions);
    return new SliceChoice(
        new Planner(flat, start), start, solver(DEFAULT_NEXT, services), services);
  }

  private static OpticalSolver solver(String id, Services services) {
    if (id.equals(ID)) {
      throw new UnsupportedProblem(
          "option next names " + ID + " itself; name the solver below it, such as " + DEFAULT_NEXT);
    }
    return services
        .solver(id)
        .orElseThrow(
            () ->
                new UnsupportedProblem(
                    "option next names solver "
                        + id
                        + ", which is not loaded; evensun plugins lists those that are"));
  }

  private static void requireTaken(Problem problem, OpticalSolver below) {
    if (!below.traits().diffuse() && problem.incidences().stream().anyMatch(Incidence::diffuse)) {
      throw new UnsupportedProblem(
          "diffuse light is not supported by solver %s; choose another one with the option next"
              .formatted(below.id()));
    }
    Set<String> taken = below.traits().features();
    for (Layer layer : problem.layers()) {
      for (Feature feature : layer.features()) {
        if (!RESOLVED.contains(feature.kind()) && !taken.contains(feature.kind())) {
          throw new UnsupportedProblem(
              "layer \"%s\": %s is not supported by solver %s; choose another one with the option"
                      .formatted(layer.name(), feature.kind(), below.id())
                  + " next");
        }
      }
    }
  }

  private static Map<String, String> handedOn(Problem problem) {
    Map<String, String> options = new HashMap<>(problem.options());
    options.remove("next");
    return options;
  }
}
