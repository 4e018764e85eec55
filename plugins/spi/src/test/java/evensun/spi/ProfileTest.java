package evensun.spi;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

class ProfileTest {

  static Stream<Profile> endToEnd() {
    return Stream.of(
        new Profile.Linear(),
        new Profile.Power(0.5),
        new Profile.Power(3),
        new Profile.Tanh(0.3, 0.1),
        new Profile.Table(Samples.of(0, 0.2, 1), Samples.of(0, 0.9, 1)),
        new Profile.MothEye(Profile.Shape.PYRAMID, 1),
        new Profile.MothEye(Profile.Shape.PARABOLOID, 1));
  }

  @ParameterizedTest
  @MethodSource("endToEnd")
  void runsFromOneEndToTheOtherAndNeverBack(Profile profile) {
    assertThat(profile.at(0)).isZero();
    assertThat(profile.at(1)).isCloseTo(1, within(1e-15));
    for (int i = 1; i <= 100; i++) {
      assertThat(profile.at(i / 100.0)).isGreaterThanOrEqualTo(profile.at((i - 1) / 100.0));
    }
  }

  @Test
  void solidsOfRevolutionHoldTheirVolume() {
    // A pyramid or cone fills a third of its prism, a paraboloid half of its cylinder (Euclid,
    // Archimedes).
    assertThat(mean(new Profile.MothEye(Profile.Shape.PYRAMID, 1)))
        .isCloseTo(1 / 3.0, within(1e-6));
    assertThat(mean(new Profile.MothEye(Profile.Shape.CONE, Math.PI / 4)))
        .isCloseTo(Math.PI / 12, within(1e-6));
    assertThat(mean(new Profile.MothEye(Profile.Shape.PARABOLOID, 1))).isCloseTo(0.5, within(1e-6));
  }

  @Test
  void aTableMustReachBothFaces() {
    assertThatThrownBy(() -> new Profile.Table(Samples.of(0, 0.5), Samples.of(0, 1)))
        .hasMessageContaining("from 0 to 1");
  }

  private static double mean(Profile profile) {
    int steps = 1000;
    double sum = 0;
    for (int i = 0; i < steps; i++) {
      sum += profile.at((i + 0.5) / steps);
    }
    return sum / steps;
  }
}
