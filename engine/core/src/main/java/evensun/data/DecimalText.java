package evensun.data;

import java.math.BigDecimal;
import java.math.MathContext;

/** Numbers as people write them: no exponent, no trailing zeros. */
public final class DecimalText {

  private DecimalText() {}

  /**
   * A number in words of digits.
   *
   * @param value a finite number; others are written as Java does
   * @param digits significant digits
   */
  public static String of(double value, int digits) {
    if (!Double.isFinite(value)) {
      return String.valueOf(value);
    }
    return value == 0
        ? "0"
        : new BigDecimal(value).round(new MathContext(digits)).stripTrailingZeros().toPlainString();
  }
}
