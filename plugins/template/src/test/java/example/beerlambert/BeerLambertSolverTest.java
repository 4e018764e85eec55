package example.beerlambert;

import static org.junit.jupiter.api.Assertions.assertEquals;

import evensun.spi.Design;
import evensun.spi.Evaluator;
import evensun.spi.Incidence;
import evensun.spi.Layer;
import evensun.spi.OpticalSolver;
import evensun.spi.Problem;
import evensun.spi.Response;
import evensun.spi.Samples;
import evensun.testkit.Subject;
import evensun.testkit.junit.SolverContract;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;

/** Every law of the contract, and one number that can be checked by hand. */
class BeerLambertSolverTest extends SolverContract {

  @Override
  protected OpticalSolver solver() {
    return new BeerLambertSolver();
  }

  /** Without faces that reflect, absorption is 1 − exp(−4πk·d/λ): Beer and Lambert. */
  @Test
  void aLayerAmongItsLikeAbsorbsByBeerAndLambert() {
    Problem problem =
        new Problem(
            Samples.of(600),
            Samples.of(1),
            List.of(Layer.plain("film", true)),
            0,
            1,
            3,
            0,
            List.of(Incidence.normal()),
            1,
            0.01,
            Map.of());
    Design design = Design.of(problem);
    for (double[] row : design.n) {
      Arrays.fill(row, 1.5);
    }
    double k = 1e-6;
    design.k[2][0] = k;
    design.material[0] = 2;
    design.thicknessNm[0] = 5e7;
    Response response = Response.spectra(1, 1, 1);
    try (Evaluator evaluator =
        solver().prepare(problem, design, Subject.noServices()).newEvaluator()) {
      evaluator.evaluate(design, response);
    }
    double wanted = 1 - Math.exp(-4 * Math.PI * k * 5e7 / 600);
    assertEquals(wanted, response.absorptance[0][0], 1e-6);
  }
}
