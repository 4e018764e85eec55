package evensun.data;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.charset.StandardCharsets;
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
        "6.02214076e23",
        "1e22",
        "9007199254740993",
        "4.9e-324",
        ".25",
        "7."
      })
  void readsWhatTheStandardLibraryReads(String text) {
    for (String end : new String[] {"", ",", "\n"}) {
      byte[] bytes = ("x" + text + end + "1").getBytes(StandardCharsets.US_ASCII);
      if (end.isEmpty()) {
        bytes = ("x" + text).getBytes(StandardCharsets.US_ASCII);
      }
      assertThat(new Decimals(bytes, 1).next()).isEqualTo(Double.parseDouble(text));
    }
  }

  @Test
  void readsRowsOneNumberAfterTheOther() {
    Decimals numbers = new Decimals("1,-2.5e-3\n1e400,4\n".getBytes(StandardCharsets.US_ASCII), 0);
    assertThat(numbers.next()).isEqualTo(1);
    assertThat(numbers.next()).isEqualTo(-2.5e-3);
    assertThat(numbers.next()).isInfinite();
    assertThat(numbers.next()).isEqualTo(4);
  }

  @Test
  void agreesBitForBitOnManyNumbers() {
    SplittableRandom random = new SplittableRandom(5);
    for (int i = 0; i < 20_000; i++) {
      String text =
          String.format(
              Locale.ROOT, "%." + random.nextInt(1, 12) + "g", random.nextDouble() * 4000);
      assertThat(new Decimals(text.getBytes(StandardCharsets.US_ASCII), 0).next())
          .isEqualTo(Double.parseDouble(text));
    }
  }
}
