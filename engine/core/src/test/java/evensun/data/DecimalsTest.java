package evensun.data;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Locale;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class DecimalsTest {

  // The standard library's own reader of numbers.
  @ParameterizedTest
  @ValueSource(
      strings = {
        "0",
        "-0.5",
        "123456789012345",
        "1234567890123456",
        "3.84e-05",
        "1e-14",
        ".25",
        "7."
      })
  void readsWhatTheStandardLibraryReads(String text) {
    assertThat(Decimals.parse("x" + text + ",", 1, 1 + text.length()))
        .isEqualTo(Double.parseDouble(text));
  }

  @Test
  void agreesBitForBitOnManyNumbers() {
    SplittableRandom random = new SplittableRandom(5);
    for (int i = 0; i < 20_000; i++) {
      String text =
          String.format(
              Locale.ROOT, "%." + random.nextInt(1, 12) + "g", random.nextDouble() * 4000);
      assertThat(Decimals.parse(text, 0, text.length())).isEqualTo(Double.parseDouble(text));
    }
  }
}
