package evensun.raytrace;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.Arrays;
import java.util.Locale;

/** Numbers in sentences. */
final class Words {

  private static final MathContext DIGITS = new MathContext(4);

  private Words() {}

  /** A sentence; numbers get four digits at most and no zeros at their end. */
  static String of(String sentence, Object... values) {
    Object[] texts =
        Arrays.stream(values).map(v -> v instanceof Double d ? number(d) : v).toArray();
    return String.format(Locale.ROOT, sentence, texts);
  }

  private static String number(double value) {
    if (!Double.isFinite(value)) {
      return Double.toString(value);
    }
    BigDecimal rounded = new BigDecimal(value, DIGITS).stripTrailingZeros();
    boolean plain = value == 0 || Math.abs(value) >= 1e-4 && Math.abs(value) < 1e9;
    return plain ? rounded.toPlainString() : rounded.toString();
  }
}
