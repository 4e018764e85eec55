package evensun.data;

import java.nio.charset.StandardCharsets;

/**
 * Reads rows of decimal numbers from bytes, one number after the other and without making text of
 * them; each is that of {@link Double#parseDouble}.
 */
final class Decimals {

  private static final double[] POWER = {
    1e0, 1e1, 1e2, 1e3, 1e4, 1e5, 1e6, 1e7, 1e8, 1e9, 1e10, 1e11, 1e12, 1e13, 1e14, 1e15, 1e16,
    1e17, 1e18, 1e19, 1e20, 1e21, 1e22
  };

  /** Digits beyond these leave the range in which a double is exact. */
  private static final int EXACT_DIGITS = 15;

  private final byte[] bytes;
  private int at;

  /**
   * Numbers parted by one character each.
   *
   * @param bytes ASCII
   * @param from where the first number starts
   */
  Decimals(byte[] bytes, int from) {
    this.bytes = bytes;
    this.at = from;
  }

  /** The next number; its separator is passed over. */
  double next() {
    int from = at;
    boolean negative = at < bytes.length && bytes[at] == '-';
    if (negative) {
      at++;
    }
    long digits = 0;
    int count = 0;
    int scale = 0;
    boolean point = false;
    for (; at < bytes.length; at++) {
      int c = bytes[at];
      if (c >= '0' && c <= '9') {
        digits = digits * 10 + (c - '0');
        count++;
        scale += point ? 1 : 0;
      } else if (c == '.' && !point) {
        point = true;
      } else {
        break;
      }
    }
    scale -= at < bytes.length && bytes[at] == 'e' ? exponent() : 0;
    boolean whole = at >= bytes.length || isSeparator(bytes[at]);
    // Up to 15 digits and a power of ten up to 22 are exact, so that one operation rounds
    // correctly.
    if (!whole || count == 0 || count > EXACT_DIGITS || Math.abs(scale) >= POWER.length) {
      return byTheLibrary(from);
    }
    at++;
    double value = scale >= 0 ? digits / POWER[scale] : digits * POWER[-scale];
    return negative ? -value : value;
  }

  private static boolean isSeparator(int c) {
    return c == ',' || c == '\n' || c == '\r';
  }

  private int exponent() {
    at++;
    boolean negative = at < bytes.length && bytes[at] == '-';
    if (negative) {
      at++;
    }
    int value = 0;
    for (; at < bytes.length && bytes[at] >= '0' && bytes[at] <= '9'; at++) {
      value = Math.min(value * 10 + (bytes[at] - '0'), 10_000);
    }
    return negative ? -value : value;
  }

  private double byTheLibrary(int from) {
    at = from;
    while (at < bytes.length && !isSeparator(bytes[at])) {
      at++;
    }
    double value =
        Double.parseDouble(new String(bytes, from, at - from, StandardCharsets.US_ASCII));
    at++;
    return value;
  }
}
