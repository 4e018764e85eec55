package evensun.effectivemedium;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;

class HazeTest {

  @Test
  void smallRoughnessScattersWithItsSquare() {
    // Limit: (4 pi sigma n cos/lambda)^2 and (2 pi sigma (n1 - n2)/lambda)^2, here
    // (4 pi/600)^2 = 4.38649e-4 and (2 pi 0.5/600)^2 = 2.74156e-5 by hand.
    assertThat(Haze.reflected(1, 600, 1)).isCloseTo(4.38649e-4, within(2e-7));
    assertThat(Haze.transmitted(1, 600, 1, 1.5)).isCloseTo(2.74156e-5, within(1e-9));
    assertThat(Haze.reflected(2e-3, 600, 1) / Haze.reflected(1e-3, 600, 1))
        .isCloseTo(4, within(1e-6));
  }

  @Test
  void largeRoughnessScattersEverything() {
    // Limit.
    assertThat(Haze.reflected(300, 600, 1)).isCloseTo(1, within(1e-12));
    assertThat(Haze.transmitted(1000, 600, 1, 2)).isCloseTo(1, within(1e-12));
  }

  @Test
  void aFaceBetweenEqualMediaScattersNothingForward() {
    // Limit: no phase difference.
    assertThat(Haze.transmitted(100, 600, 1.5, 1.5)).isZero();
  }

  @Test
  void obliqueLightMeetsASmootherFace() {
    // Snell's law by hand: from air at 60 degrees into 1.5, n cos = sqrt(2.25 - 0.75).
    assertThat(Haze.nCos(1.5, Math.sin(Math.PI / 3))).isCloseTo(Math.sqrt(1.5), within(1e-15));
    assertThat(Haze.reflected(20, 600, Haze.nCos(1, 0.8))).isLessThan(Haze.reflected(20, 600, 1));
  }
}
