package evensun.effectivemedium;

import evensun.spi.DepthProfile;
import evensun.spi.Design;
import evensun.spi.EffectiveIndex;
import evensun.spi.EvaluationFailed;
import evensun.spi.Feature;
import evensun.spi.Gradient;
import evensun.spi.Grading;
import evensun.spi.Layer;
import evensun.spi.Mixture;
import evensun.spi.OpticalSolver;
import evensun.spi.PreparedSolver;
import evensun.spi.Problem;
import evensun.spi.Roughness;
import evensun.spi.Services;
import evensun.spi.Traits;
import evensun.spi.UnsupportedProblem;
import java.util.HashMap;
import java.util.Map;
import java.util.Optional;
import java.util.Set;

/**
 * Mixed, graded and rough layers as plain ones, for the solver below.
 *
 * <p>Option {@code next}: id of the solver below, {@code transfer-matrix} unless set. All other
 * options go to it, and so do features of kinds that this solver does not know.
 */
public final class EffectiveMediumSolver implements OpticalSolver {

  /** Kinds of features that this solver resolves. */
  static final Set<String> RESOLVED = Set.of(Mixture.KIND, Grading.KIND, Roughness.KIND);

  private static final String ID = "effective-medium";
  private static final String DEFAULT_NEXT = "transfer-matrix";

  /** For the service loader. */
  public EffectiveMediumSolver() {}

  @Override
  public String id() {
    return ID;
  }

  @Override
  public Traits traits() {
    return new Traits(
        Set.of(Mixture.KIND, Grading.KIND, Roughness.KIND, "texture"),
        Set.of(Gradient.class, DepthProfile.class, EffectiveIndex.class),
        true,
        true,
        false);
  }

  @Override
  public PreparedSolver prepare(Problem problem, Design start, Services services) {
    String next = problem.options().getOrDefault("next", DEFAULT_NEXT);
    OpticalSolver below = solver(next, services);
    requireFeatures(problem, below);
    try {
      return prepare(problem.withOptions(handedOn(problem)), start, below, services);
    } catch (EvaluationFailed e) {
      throw new UnsupportedProblem(e.getMessage());
    }
  }

  private static PreparedSolver prepare(
      Problem problem, Design start, OpticalSolver below, Services services) {
    Planner planner = new Planner(problem, start);
    OpticalSolver judge = judge(planner, below, services);
    SliceChoice choice = new SliceChoice(planner, start, judge, services);
    Chain chain = Chain.of(planner.plan(choice.count()), start, below, services);
    return new PreparedChain(
        chain,
        planner.hasGrading() ? Optional.of(choice) : Optional.empty(),
        planner.tolerance(),
        below.traits().features().contains(Roughness.KIND));
  }

  /** The solver that slices are chosen with: noise would hide what finer slices change. */
  private static OpticalSolver judge(Planner planner, OpticalSolver below, Services services) {
    if (!planner.hasGrading() || !below.traits().statistical()) {
      return below;
    }
    return solver(DEFAULT_NEXT, services);
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

  private static void requireFeatures(Problem problem, OpticalSolver below) {
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
