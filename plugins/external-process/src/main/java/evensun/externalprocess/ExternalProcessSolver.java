package evensun.externalprocess;

import evensun.spi.Design;
import evensun.spi.Layer;
import evensun.spi.OpticalSolver;
import evensun.spi.PreparedSolver;
import evensun.spi.Problem;
import evensun.spi.Services;
import evensun.spi.Traits;
import evensun.spi.UnsupportedProblem;
import java.util.Set;

/** Hands problems to a program of the user's; see the package for what is said and answered. */
public final class ExternalProcessSolver implements OpticalSolver {

  private final ProgramPool pool = new ProgramPool();

  /** For the service loader. */
  public ExternalProcessSolver() {}

  @Override
  public String id() {
    return "external-process";
  }

  /** Everything that is flat; a program refuses for itself what it cannot take. */
  @Override
  public Traits traits() {
    return new Traits(Set.of(), Set.of(), true, true, false);
  }

  @Override
  public PreparedSolver prepare(Problem problem, Design start, Services services) {
    for (Layer layer : problem.layers()) {
      if (!layer.features().isEmpty()) {
        throw new UnsupportedProblem(
            "layer \"%s\" has a %s, but solver external-process takes flat, uniform, pure layers;"
                    .formatted(layer.name(), layer.features().get(0).kind())
                + " leave that out or name another solver");
      }
    }
    return PreparedProgram.of(problem, start, Options.of(problem.options()), pool);
  }
}
