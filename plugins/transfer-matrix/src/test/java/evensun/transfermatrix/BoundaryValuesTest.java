package evensun.transfermatrix;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import evensun.spi.Polarisation;
import evensun.spi.Response;
import java.util.SplittableRandom;
import org.assertj.core.data.Offset;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class BoundaryValuesTest {

  private static final Offset<Double> AGREEMENT = within(1e-10);
  private static final double WELL_CONDITIONED = 1e5;

  // Witness: the same boundary values as one linear system, solved by Commons Math.
  @ParameterizedTest
  @ValueSource(strings = {"fast", "reference"})
  void agreesWithOneLinearSystem(String kernel) {
    SplittableRandom random = new SplittableRandom(20240607);
    int compared = 0;
    for (int trial = 0; trial < 300; trial++) {
      Sample sample =
          Sample.random(random, 1 + random.nextInt(20), 300 + 900 * random.nextDouble());
      double angleDeg = 85 * random.nextDouble();
      for (boolean p : new boolean[] {false, true}) {
        BoundaryValues expected = new BoundaryValues(sample, 0, angleDeg, p);
        if (expected.condition < WELL_CONDITIONED) {
          compare(sample, kernel, angleDeg, p, expected);
          compared++;
        }
      }
    }
    assertThat(compared).isGreaterThanOrEqualTo(400);
  }

  private static void compare(
      Sample sample, String kernel, double angleDeg, boolean p, BoundaryValues expected) {
    Response found = sample.solve(kernel, Sample.at(angleDeg, p ? Polarisation.P : Polarisation.S));
    assertThat(found.reflectance[0][0]).isCloseTo(expected.reflectance, AGREEMENT);
    assertThat(found.transmittance[0][0]).isCloseTo(expected.transmittance, AGREEMENT);
    for (int l = 0; l < sample.layers(); l++) {
      assertThat(found.absorptance[l][0]).isCloseTo(expected.absorptance[l], AGREEMENT);
    }
  }
}
