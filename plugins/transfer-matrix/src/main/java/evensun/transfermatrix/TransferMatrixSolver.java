package evensun.transfermatrix;

import evensun.spi.DepthProfile;
import evensun.spi.Design;
import evensun.spi.Gradient;
import evensun.spi.Layer;
import evensun.spi.OpticalSolver;
import evensun.spi.PreparedSolver;
import evensun.spi.Problem;
import evensun.spi.Services;
import evensun.spi.Traits;
import evensun.spi.UnsupportedProblem;
import java.util.Set;

/**
 * Flat stacks: waves in coherent layers, intensities across incoherent ones.
 *
 * <p>Takes one option, {@code kernel}: {@code fast} (the default) or {@code reference}, a plain
 * twin for a second opinion. The two differ in the last bits of a result. A wave of complex index
 * is taken to have the real tangential index n·sin θ of the medium it comes from.
 *
 * <p>Light that comes from an absorbing medium obeys R = |r|², T = Re(η_t)|1 + r|²/Re(η_i); what
 * the incident and the reflected wave share is booked to an incoherent layer, and to nothing where
 * that medium is a half-space.
 */
public final class TransferMatrixSolver implements OpticalSolver {

  /** For the service loader. */
  public TransferMatrixSolver() {}

  @Override
  public String id() {
    return "transfer-matrix";
  }

  @Override
  public Traits traits() {
    return new Traits(Set.of(), Set.of(Gradient.class, DepthProfile.class), true, true, false);
  }

  @Override
  public PreparedSolver prepare(Problem problem, Design start, Services services) {
    for (Layer layer : problem.layers()) {
      refuseFeatures(layer);
    }
    return new PreparedTransferMatrix(problem, Options.of(problem.options()));
  }

  private static void refuseFeatures(Layer layer) {
    if (!layer.features().isEmpty()) {
      throw new UnsupportedProblem(
          "layer \"%s\" has a %s, but solver transfer-matrix takes flat, uniform, pure layers;"
                  .formatted(layer.name(), layer.features().get(0).kind())
              + " name a solver that takes it, or leave solver out so that one is chosen");
    }
  }
}
