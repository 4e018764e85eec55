package evensun.raytrace;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import evensun.spi.Feature;
import evensun.spi.Incidence;
import evensun.spi.Polarisation;
import evensun.spi.Response;
import evensun.spi.Scatter;
import evensun.spi.Side;
import evensun.transfermatrix.TransferMatrixSolver;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Witness: the incoherent transfer-matrix method, a solver of its own. */
class FlatLimitTest {

  private static final Incidence[] LIGHT = {
    new Incidence(0, Polarisation.UNPOLARISED, Side.FRONT),
    new Incidence(35, Polarisation.S, Side.FRONT),
    new Incidence(35, Polarisation.P, Side.FRONT),
    new Incidence(70, Polarisation.UNPOLARISED, Side.FRONT)
  };

  private static Stacks stack(Feature... features) {
    return Stacks.grid(400, 1150, 50)
        .film("coating", Stacks.constant(1.9, 0.01), 70, features)
        .thick("wafer", Stacks.silicon(), 20)
        .film("spacer", Stacks.constant(1.45, 0), 90)
        .exit(Stacks.table("silver"))
        .light(LIGHT);
  }

  @Test
  void flatFacesGiveTheIncoherentTransferMatrix() {
    assertSame(stack().solve(), stack().solve(new TransferMatrixSolver()), 1e-12);
  }

  /** A scatterer that scatters nothing: the same stack, but followed by rays. */
  @Test
  void raysBetweenFlatFacesGiveTheIncoherentTransferMatrix() {
    Response rays = stack(new Scatter(1, 1, Side.FRONT)).rays(4096).solve();
    Response waves = stack().solve(new TransferMatrixSolver());
    for (int i = 0; i < waves.absorptance.length; i++) {
      for (int w = 0; w < waves.absorptance[i].length; w++) {
        double allowed = 1e-6 + 5 * rays.absorptanceStandardError[i][w];
        assertThat(rays.absorptance[i][w]).isCloseTo(waves.absorptance[i][w], within(allowed));
      }
    }
    assertSame(rays, waves, 3e-3);
  }

  @ParameterizedTest
  @ValueSource(booleans = {false, true})
  void diffuseLightIsTheMeanOverDirections(boolean rays) {
    Stacks flat = rays ? stack(new Scatter(1, 1, Side.FRONT)).rays(16384) : stack();
    flat.light(new Incidence(0, Polarisation.UNPOLARISED, Side.FRONT, true));
    Response diffuse = flat.solve();
    int steps = 400;
    Incidence[] all = new Incidence[steps];
    for (int i = 0; i < steps; i++) {
      double squaredSine = (i + 0.5) / steps;
      double angleDeg = Math.toDegrees(Math.asin(Math.sqrt(squaredSine)));
      all[i] = new Incidence(angleDeg, Polarisation.UNPOLARISED, Side.FRONT);
    }
    Response each = stack().light(all).solve(new TransferMatrixSolver());
    for (int w = 0; w < diffuse.reflectance[0].length; w++) {
      double sum = 0;
      for (int i = 0; i < steps; i++) {
        sum += each.reflectance[i][w];
      }
      // The midpoint rule over sin²θ is good to about 1e-5 here; rays add their noise.
      assertThat(diffuse.reflectance[0][w]).isCloseTo(sum / steps, within(rays ? 4e-3 : 1e-4));
    }
  }

  private static void assertSame(Response is, Response wanted, double tolerance) {
    for (int i = 0; i < LIGHT.length; i++) {
      assertThat(is.reflectance[i]).containsExactly(wanted.reflectance[i], within(tolerance));
      assertThat(is.transmittance[i]).containsExactly(wanted.transmittance[i], within(tolerance));
    }
    for (int c = 0; c < wanted.absorptance.length; c++) {
      assertThat(is.absorptance[c]).containsExactly(wanted.absorptance[c], within(tolerance));
    }
  }
}
