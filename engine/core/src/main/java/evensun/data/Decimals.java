package evensun.data;

/** Reads decimal numbers of few digits fast; the result is that of {@link Double#parseDouble}. */
final class Decimals {

  private static final double[] POWER = {
    1e0, 1e1, 1e2, 1e3, 1e4, 1e5, 1e6, 1e7, 1e8, 1e9, 1e10, 1e11, 1e12, 1e13, 1e14, 1e15, 1e16,
    1e17, 1e18, 1e19, 1e20, 1e21, 1e22
  };

  private Decimals() {}

  /** The number between two positions of a text. */
  static double parse(String text, int from, int to) {
    int at = from;
    boolean negative = at < to && text.charAt(at) == '-';
    if (negative) {
      at++;
    }
    long digits = 0;
    int count = 0;
    int scale = 0;
    boolean point = false;
    for (; at < to; at++) {
      char c = text.charAt(at);
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
    // Up to 15 digits and a power of ten up to 22 are exact, so that one division rounds correctly.
    if (at < to || count == 0 || count > 15) {
      return Double.parseDouble(text.substring(from, to));
    }
    double value = digits / POWER[scale];
    return negative ? -value : value;
  }
}
