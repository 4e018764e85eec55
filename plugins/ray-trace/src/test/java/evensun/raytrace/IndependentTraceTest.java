package evensun.raytrace;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import evensun.spi.Response;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * Bare {111} pyramids of 10 µm on 180 µm of silicon with silver behind.
 *
 * <p>Witness: an independent calculation, a plain Monte Carlo trace in another language that
 * carries the complex field along every ray, chooses between reflection and transmission by lot and
 * draws the place in the period anew at the rear; n and k as below, standard error 2e-4.
 */
class IndependentTraceTest {

  @ParameterizedTest
  @CsvSource({
    // nm, n and k of silicon, n and k of silver, reflectance, absorptance of silicon, of silver
    "1000, 3.57191, 0.000510556, 0.133427, 6.75114, 0.11458, 0.87978, 0.00565",
    "1100, 3.542, 3.064e-5, 0.160563, 7.48681, 0.44616, 0.48336, 0.07049",
  })
  void pyramidsTrapLightAsIndependentlyTraced(
      double nm,
      double n,
      double k,
      double silverN,
      double silverK,
      double reflected,
      double silicon,
      double silver) {
    Response response =
        Stacks.at(nm)
            .thick("wafer", Stacks.constant(n, k), 180, PyramidTest.pyramids(10))
            .exit(Stacks.constant(silverN, silverK))
            .rays(16384)
            .solve();
    // The phase between s and p is not followed here, which is worth up to some 1e-3.
    assertThat(response.reflectance[0][0]).isCloseTo(reflected, within(3e-3));
    assertThat(response.absorptance[0][0]).isCloseTo(silicon, within(3e-3));
    assertThat(response.transmittance[0][0]).isCloseTo(silver, within(2e-3));
  }
}
