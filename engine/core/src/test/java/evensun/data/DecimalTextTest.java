package evensun.data;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;

class DecimalTextTest {

  // By hand.
  @Test
  void writesNumbersWithoutExponentAndTrailingZeros() {
    assertThat(DecimalText.of(1200, 6)).isEqualTo("1200");
    assertThat(DecimalText.of(100_000, 6)).isEqualTo("100000");
    assertThat(DecimalText.of(1_000_000, 6)).isEqualTo("1000000");
    assertThat(DecimalText.of(300.125, 6)).isEqualTo("300.125");
    assertThat(DecimalText.of(0.000123456, 3)).isEqualTo("0.000123");
    assertThat(DecimalText.of(0, 3)).isEqualTo("0");
    assertThat(DecimalText.of(Double.NaN, 3)).isEqualTo("NaN");
  }
}
