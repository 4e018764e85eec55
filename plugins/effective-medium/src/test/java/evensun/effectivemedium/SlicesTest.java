package evensun.effectivemedium;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import evensun.spi.Profile;
import evensun.spi.Samples;
import java.util.stream.Stream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

class SlicesTest {

  static Stream<Profile> profiles() {
    return Stream.of(
        new Profile.Linear(),
        new Profile.Power(0.3),
        new Profile.Power(4),
        new Profile.Tanh(0.5, 0.02),
        new Profile.MothEye(Profile.Shape.CONE, Math.PI / 4),
        new Profile.Table(Samples.of(0, 0.5, 0.5001, 1), Samples.of(0.2, 0.2, 0.8, 0.8)),
        new Profile.Table(Samples.of(0, 1), Samples.of(0.4, 0.4)));
  }

  @ParameterizedTest
  @MethodSource("profiles")
  void fillTheLayerAndKeepTheAmounts(Profile profile) {
    // Law: the amount of the lower end is the integral of its share, by the midpoint rule.
    Slices slices = Slices.of(profile, 16);
    double depth = 0;
    double amount = 0;
    for (int i = 0; i < slices.count(); i++) {
      assertThat(slices.width(i)).isPositive();
      depth += slices.width(i);
      amount += slices.width(i) * slices.share(i);
    }
    double integral = 0;
    for (int i = 0; i < 100_000; i++) {
      integral += profile.at((i + 0.5) / 100_000) / 100_000;
    }
    assertThat(depth).isCloseTo(1, within(1e-14));
    assertThat(amount).isCloseTo(integral, within(2e-5));
  }

  @ParameterizedTest
  @MethodSource("profiles")
  void areFinerWhereTheProfileIsSteeper(Profile profile) {
    // By construction, a slice covers 2/N of depth plus change at most: no slice jumps.
    Slices slices = Slices.of(profile, 64);
    for (int i = 1; i < slices.count(); i++) {
      assertThat(Math.abs(slices.share(i) - slices.share(i - 1))).isLessThan(0.05);
    }
  }
}
