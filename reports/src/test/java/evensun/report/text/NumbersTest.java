package evensun.report.text;

import static org.assertj.core.api.Assertions.assertThat;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import java.util.Locale;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Spelling of numbers; each expectation was worked out by hand. */
class NumbersTest {

  @ParameterizedTest
  @CsvSource({"19.305, 2, 19.31", "-0.004, 2, 0.00", "-1.5, 1, −1.5", "2.5, 0, 3", "NaN, 2, –"})
  void fixedRoundsHalfUpAndKnowsNoNegativeZero(double value, int decimals, String text) {
    assertThat(Numbers.fixed(value, decimals)).isEqualTo(text);
  }

  /** Outside witness: exact decimal arithmetic of the JDK. */
  @Test
  void fixedIsExactDecimalRoundingEverywhere() {
    java.util.Random random = new java.util.Random(5);
    for (int i = 0; i < 20_000; i++) {
      int decimals = random.nextInt(6);
      double size = Math.pow(10, random.nextInt(9) - 4);
      // every other one ends in a 5, where rounding is decided
      double value = (random.nextDouble() - 0.5) * size;
      value = i % 2 == 0 ? value : Math.rint(value * 1000) / 1000 + 0.0005;
      BigDecimal exact = BigDecimal.valueOf(value).setScale(decimals, RoundingMode.HALF_UP);
      String text = exact.toPlainString().replace('-', '\u2212');
      assertThat(Numbers.fixed(value, decimals)).isEqualTo(text);
    }
  }

  /** Outside witness: exact decimal arithmetic of the JDK. */
  @Test
  void powersOfTenAreExactDecimalRoundingEverywhere() {
    java.util.Random random = new java.util.Random(5);
    for (int i = 0; i < 20_000; i++) {
      int digits = 1 + random.nextInt(4);
      // every third one is close to a tie or to a power of ten
      int lead = i % 3 == 0 ? random.nextInt(100) * 10 + 95 : random.nextInt(1_000_000);
      int exponent = random.nextInt(60) - 30;
      double value = Double.parseDouble(Math.max(1, lead) + "e" + exponent);
      if (value >= 1e-3 && value < 1e6) {
        continue;
      }
      BigDecimal exact = BigDecimal.valueOf(value).round(new MathContext(digits));
      String[] shown = Numbers.significant(-value, digits).substring(1).split(" × 10", -1);
      String power = "e" + plain(shown[1]);
      assertThat(new BigDecimal(shown[0] + power)).as(value + "").isEqualByComparingTo(exact);
      assertThat(Double.parseDouble(shown[0])).isGreaterThanOrEqualTo(1).isLessThan(10);
    }
  }

  private static String plain(String superscript) {
    StringBuilder text = new StringBuilder();
    superscript.chars().forEach(c -> text.append("⁻⁰¹²³⁴⁵⁶⁷⁸⁹".indexOf(c) - 1));
    return text.toString().replace("-1", "-");
  }

  @ParameterizedTest
  @CsvSource({"0.31, ± 0.31", "0.0123, ± 0.012", "0.0004, ± <0.001", "0, ''"})
  void anErrorIsNeverRoundedToNothing(double error, String text) {
    assertThat(Numbers.plusMinus(error).replace('\u00a0', ' ').strip()).isEqualTo(text);
  }

  @ParameterizedTest
  @CsvSource({"0.012, +0.01", "-0.012, −0.01", "0.001, 0.00", "-0.001, 0.00", "0, 0.00"})
  void aSignStandsOnlyBeforeWhatIsNotZero(double value, String text) {
    assertThat(Numbers.signed(value, 2)).isEqualTo(text);
  }

  @ParameterizedTest
  @CsvSource({
    "0, 4, 0",
    "12345, 3, 12300",
    "0.000012345, 3, 1.23 × 10⁻⁵",
    "4.2e21, 3, 4.2 × 10²¹",
    "-3e-7, 2, −3 × 10⁻⁷",
    "0.12349, 3, 0.123"
  })
  void significantDigits(double value, int digits, String text) {
    assertThat(Numbers.significant(value, digits)).isEqualTo(text);
  }

  @ParameterizedTest
  @CsvSource({"431.24, 431.2 nm", "180000, 180 µm", "3000000, 3 mm", "40, 40 nm"})
  void thicknessesAreSaidAsPeopleSayThem(double nm, String text) {
    assertThat(Numbers.thickness(nm).replace('\u00a0', ' ')).isEqualTo(text);
  }

  @Test
  void theLocaleChangesNothing() {
    Locale before = Locale.getDefault();
    try {
      Locale.setDefault(Locale.GERMANY);
      assertThat(Numbers.ma(1234.5)).isEqualTo("1234.50\u00a0mA\u00a0cm⁻²");
    } finally {
      Locale.setDefault(before);
    }
  }
}
