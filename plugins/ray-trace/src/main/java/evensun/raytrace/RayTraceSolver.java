package evensun.raytrace;

import evensun.spi.DepthProfile;
import evensun.spi.Design;
import evensun.spi.Feature;
import evensun.spi.IdealFace;
import evensun.spi.Layer;
import evensun.spi.OpticalSolver;
import evensun.spi.PreparedSolver;
import evensun.spi.Problem;
import evensun.spi.RaySection;
import evensun.spi.ReflectanceParts;
import evensun.spi.Roughness;
import evensun.spi.Scatter;
import evensun.spi.Services;
import evensun.spi.Texture;
import evensun.spi.Traits;
import evensun.spi.UnsupportedProblem;
import java.util.Set;

/**
 * Geometrical optics in three dimensions for boundaries shaped above the wavelength, with the thin
 * films on every facet from the {@code transfer-matrix} solver.
 *
 * <p>Intensities in s and p are carried along every ray and turned into the plane of incidence of
 * each facet; the phase between s and p is not followed. Stacks of planes alone are handed to
 * {@code transfer-matrix}. Option {@code rays}: rays per wavelength.
 */
public final class RayTraceSolver implements OpticalSolver {

  private static final Set<String> FEATURES =
      Set.of(Texture.KIND, Scatter.KIND, IdealFace.KIND, Roughness.KIND);

  /** For the service loader. */
  public RayTraceSolver() {}

  @Override
  public String id() {
    return "ray-trace";
  }

  @Override
  public Traits traits() {
    return new Traits(
        FEATURES,
        Set.of(DepthProfile.class, ReflectanceParts.class, RaySection.class),
        true,
        true,
        true,
        true);
  }

  @Override
  public PreparedSolver prepare(Problem problem, Design start, Services services) {
    Options options = Options.of(problem.options());
    problem.layers().forEach(RayTraceSolver::refuseFeatures);
    Roughnesses.requireCoarse(problem, start);
    Device device = new Device(problem, new boolean[problem.layerCount()]);
    return device.isFlat()
        ? new FlatStack(problem, start, services)
        : new PreparedRayTrace(problem, start, options, services);
  }

  private static void refuseFeatures(Layer layer) {
    for (Feature feature : layer.features()) {
      if (!FEATURES.contains(feature.kind())) {
        throw new UnsupportedProblem(
            "layer \"%s\" has a %s, which solver ray-trace does not take; leave solver out so that one is chosen, or name effective-medium with the option next: ray-trace"
                .formatted(layer.name(), feature.kind()));
      }
    }
  }
}
