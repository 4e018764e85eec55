package evensun.raytrace;

import static org.assertj.core.api.Assertions.assertThat;

import evensun.spi.IdealFace;
import evensun.spi.Response;
import evensun.spi.Side;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class LambertianLimitTest {

  /**
   * Photocurrents of ideal light trapping in silicon under AM1.5G, 300 to 1200 nm in 1 nm steps,
   * computed from A = (1 − T²)/(1 − T²(1 − 1/n²)), T = 2E₃(αW), and from the weak-absorption form
   * α/(α + 1/(4n²W)) (Tiedje, Yablonovitch, Cody and Brooks, IEEE Trans. Electron Devices 31, 711
   * (1984)).
   */
  @ParameterizedTest
  @CsvSource({
    "10, 40.117, 39.773",
    "50, 42.740, 42.525",
    "100, 43.537, 43.359",
    "180, 44.079, 43.926"
  })
  void idealFacesGiveTheLambertianCurrents(double um, double exact, double weak) {
    Stacks stack =
        Stacks.grid(300, 1200, 1)
            .thick(
                "wafer", Stacks.silicon(), um, new IdealFace(Side.FRONT), new IdealFace(Side.REAR));
    Response response = stack.solve();
    assertThat(Math.abs(response.sum[0] - exact)).isLessThan(3 * response.sumStandardError[0]);
    assertThat(response.sumStandardError[0]).isBetween(1e-6, 0.02);
    assertThat(Math.abs(response.sum[0] - weak)).isLessThan(0.01 * weak);
  }
}
