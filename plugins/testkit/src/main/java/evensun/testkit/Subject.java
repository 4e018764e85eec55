package evensun.testkit;

import evensun.spi.Evaluator;
import evensun.spi.OpticalSolver;
import evensun.spi.PreparedSolver;
import evensun.spi.Problem;
import evensun.spi.Response;
import evensun.spi.Services;
import java.util.Arrays;
import java.util.HashMap;
import java.util.Map;
import java.util.Optional;

/**
 * The solver on trial.
 *
 * @param solver the solver
 * @param services what the host would offer it
 * @param options what a scenario would say under {@code solver.options}
 */
public record Subject(OpticalSolver solver, Services services, Map<String, String> options) {

  public Subject {
    options = Map.copyOf(options);
  }

  /** A solver without options. */
  public Subject(OpticalSolver solver, Services services) {
    this(solver, services, Map.of());
  }

  /** A solver that needs no other. */
  public static Subject alone(OpticalSolver solver) {
    return new Subject(solver, noServices());
  }

  /** Services without any other solver, never cancelled. */
  public static Services noServices() {
    return with();
  }

  /** Services with some other solvers, never cancelled. */
  public static Services with(OpticalSolver... others) {
    return new Services() {
      @Override
      public Optional<OpticalSolver> solver(String id) {
        for (OpticalSolver other : others) {
          if (other.id().equals(id)) {
            return Optional.of(other);
          }
        }
        return Optional.empty();
      }

      @Override
      public boolean cancelled() {
        return false;
      }
    };
  }

  /** Prepares for one case. */
  PreparedSolver prepare(StackCase stack) {
    return prepare(stack.problem(), stack);
  }

  /** Prepares, evaluates once and releases everything. */
  Answer answer(StackCase stack) {
    return answer(stack.problem(), stack);
  }

  /** As above, for a problem about the stack of a case. */
  Answer answer(Problem problem, StackCase stack) {
    try (PreparedSolver prepared = prepare(problem, stack);
        Evaluator evaluator = prepared.newEvaluator()) {
      Response response = spectra(prepared, stack);
      evaluator.evaluate(stack.design(), response);
      return answer(prepared, response, stack);
    }
  }

  /** A response that wants every spectrum, and errors where there may be some. */
  Response spectra(PreparedSolver prepared, StackCase stack) {
    int channels = prepared.channels().size();
    int wavelengths = stack.wavelengthCount();
    Response response = Response.spectra(1, channels, wavelengths);
    if (solver.traits().statistical()) {
      response.absorptanceStandardError = new double[channels][wavelengths];
      askForErrors(response, channels, wavelengths);
    }
    return response;
  }

  /**
   * Only sums tell the error of what is transmitted, and of what is reflected, the rest: one sum of
   * each per wavelength.
   */
  private static void askForErrors(Response response, int channels, int wavelengths) {
    int sums = 2 * wavelengths;
    response.weight = new double[sums * channels][];
    response.transmittanceWeight = new double[sums][];
    response.sum = new double[sums];
    response.sumStandardError = new double[sums];
    for (int w = 0; w < wavelengths; w++) {
      double[] here = new double[wavelengths];
      here[w] = 1;
      response.transmittanceWeight[w] = here;
      response.transmittanceWeight[wavelengths + w] = here;
      int first = (wavelengths + w) * channels;
      Arrays.fill(response.weight, first, first + channels, here);
    }
  }

  /** What stands in a response, by layer. */
  Answer answer(PreparedSolver prepared, Response response, StackCase stack) {
    return Answer.of(response, prepared.channels(), stack.layerCount(), stack.wavelengthCount());
  }

  /** Whether the solver claims the case; refusing what it does not claim is its right. */
  boolean claims(StackCase stack) {
    boolean thick = stack.layers().stream().anyMatch(layer -> !layer.coherent());
    return (solver.traits().oblique() || stack.angleDeg() == 0)
        && (solver.traits().incoherent() || !thick);
  }

  /** Prepares any problem with the first design of a case; its options are added to. */
  PreparedSolver prepare(Problem problem, StackCase start) {
    Map<String, String> all = new HashMap<>(options);
    all.putAll(problem.options());
    return solver.prepare(problem.withOptions(all), start.design(), services);
  }
}
