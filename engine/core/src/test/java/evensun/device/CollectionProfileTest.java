package evensun.device;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import evensun.result.DepthLayer;
import evensun.scenario.DiodeSpec.CollectingFace;
import java.util.List;
import java.util.function.DoubleUnaryOperator;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class CollectionProfileTest {

  private static DepthLayer layer(double thicknessNm, DoubleUnaryOperator generation) {
    List<Double> depth =
        IntStream.rangeClosed(0, 2000).mapToObj(i -> thicknessNm * i / 2000).toList();
    return new DepthLayer(
        "absorber", depth, depth.stream().map(generation::applyAsDouble).toList());
  }

  /** Witness: the closed form for even generation, tanh(d/L)/(d/L), whichever face collects. */
  @ParameterizedTest
  @ValueSource(doubles = {20, 300, 1000, 1e5})
  void evenGenerationHasAClosedForm(double lengthNm) {
    double ratio = 600 / lengthNm;
    for (CollectingFace face : CollectingFace.values()) {
      assertThat(CollectionProfile.fraction(List.of(layer(600, z -> 1)), lengthNm, face))
          .isCloseTo(Math.tanh(ratio) / ratio, within(1e-4));
    }
  }

  @Test
  void carriersNearTheCollectingFaceAreCollected() {
    List<DepthLayer> steep = List.of(layer(600, z -> Math.exp(-z / 50)));
    double front = CollectionProfile.fraction(steep, 200, CollectingFace.FRONT);
    double rear = CollectionProfile.fraction(steep, 200, CollectingFace.REAR);
    assertThat(front).isBetween(0.7, 1.0);
    assertThat(rear).isLessThan(0.3);
  }

  /** Witness: two halves of one absorber are the absorber. */
  @Test
  void touchingLayersCountAsOne() {
    List<DepthLayer> halves = List.of(layer(300, z -> 1), layer(300, z -> 1));
    assertThat(CollectionProfile.fraction(halves, 250, CollectingFace.REAR))
        .isCloseTo(
            CollectionProfile.fraction(List.of(layer(600, z -> 1)), 250, CollectingFace.REAR),
            within(1e-6));
  }

  @Test
  void veryShortLengthsDoNotOverflow() {
    assertThat(CollectionProfile.probability(0, 1e7, 1, CollectingFace.FRONT)).isEqualTo(1);
    assertThat(CollectionProfile.probability(0, 1e7, 1, CollectingFace.REAR)).isEqualTo(0);
  }
}
