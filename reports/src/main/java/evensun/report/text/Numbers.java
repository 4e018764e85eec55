package evensun.report.text;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import org.jspecify.annotations.Nullable;

/** Numbers for people: a full stop, a true minus sign, a space before the unit, no locale. */
public final class Numbers {

  /** What current densities are shown in. */
  public static final String MA = "mA cm⁻²";

  private static final String NBSP = "\u00a0";
  private static final char MINUS = '\u2212';
  private static final double MICROMETRE_FROM_NM = 10_000;
  private static final double MILLIMETRE_FROM_NM = 1_000_000;

  private static final long[] POWERS = {1, 10, 100, 1000, 10_000};

  /** Below it a scaled number is known to better than {@link #TIE}. */
  private static final double FAST_BELOW = 1e5;

  private static final double TIE = 1e-6;

  /** Powers of ten that a double holds exactly. */
  private static final double[] TENS = {
    1, 1e1, 1e2, 1e3, 1e4, 1e5, 1e6, 1e7, 1e8, 1e9, 1e10, 1e11, 1e12, 1e13, 1e14, 1e15, 1e16, 1e17,
    1e18, 1e19, 1e20, 1e21, 1e22
  };

  private static final int MOST_EXACT_POWER = TENS.length - 1;

  private Numbers() {}

  /** With so many decimals, rounded half up; never a negative zero. */
  public static String fixed(double value, int decimals) {
    if (!Double.isFinite(value)) {
      return "–";
    }
    return decimals < POWERS.length && Math.abs(value) < FAST_BELOW
        ? fast(value, decimals)
        : exact(value, decimals);
  }

  /** A page holds thousands of numbers; only those close to a tie need exact arithmetic. */
  private static String fast(double value, int decimals) {
    double scaled = Math.abs(value) * POWERS[decimals];
    long down = (long) scaled;
    if (isNearTie(scaled)) {
      return exact(value, decimals);
    }
    long digits = scaled - down > 0.5 ? down + 1 : down;
    StringBuilder text = new StringBuilder();
    if (value < 0 && digits != 0) {
      text.append(MINUS);
    }
    text.append(digits / POWERS[decimals]);
    if (decimals > 0) {
      String part = Long.toString(digits % POWERS[decimals]);
      text.append('.').append("0".repeat(decimals - part.length())).append(part);
    }
    return text.toString();
  }

  private static String exact(double value, int decimals) {
    BigDecimal rounded = BigDecimal.valueOf(value).setScale(decimals, RoundingMode.HALF_UP);
    return rounded.signum() < 0
        ? MINUS + rounded.negate().toPlainString()
        : rounded.toPlainString();
  }

  /** As {@link #fixed}, with a plus sign where the value is positive. */
  public static String signed(double value, int decimals) {
    String text = fixed(value, decimals);
    boolean zero = text.chars().noneMatch(c -> c >= '1' && c <= '9');
    return value > 0 && !zero ? "+" + text : text;
  }

  /** As {@link #fixed}, without trailing zeros. */
  public static String trimmed(double value, int decimals) {
    return trimZeros(fixed(value, decimals));
  }

  private static String trimZeros(String text) {
    if (text.indexOf('.') < 0) {
      return text;
    }
    int end = text.length();
    while (text.charAt(end - 1) == '0') {
      end--;
    }
    return text.substring(0, text.charAt(end - 1) == '.' ? end - 1 : end);
  }

  /** With so many significant digits, as a power of ten where it is very large or very small. */
  public static String significant(double value, int digits) {
    double size = Math.abs(value);
    if (size != 0 && (size < 1e-3 || size >= 1e6) && Double.isFinite(value)) {
      return scientific(value, digits);
    }
    if (value == Math.rint(value) && size < POWERS[Math.min(digits, POWERS.length - 1)]) {
      return fixed(value, 0);
    }
    BigDecimal rounded = BigDecimal.valueOf(value).round(new MathContext(digits));
    return trimmed(rounded.doubleValue(), Math.max(0, rounded.scale()));
  }

  private static String scientific(double value, int digits) {
    int exponent = (int) Math.floor(Math.log10(Math.abs(value)));
    if (Math.abs(exponent) > MOST_EXACT_POWER || digits > POWERS.length) {
      return exactScientific(value, digits);
    }
    double scaled = exponent < 0 ? value * TENS[-exponent] : value / TENS[exponent];
    String mantissa = fixed(scaled, digits - 1);
    boolean ten = mantissa.startsWith("10") || mantissa.startsWith(MINUS + "10");
    return ten || isNearTie(Math.abs(scaled) * POWERS[digits - 1])
        ? exactScientific(value, digits)
        : trimZeros(mantissa) + " × " + powerOfTen(exponent);
  }

  private static boolean isNearTie(double scaled) {
    return Math.abs(scaled - Math.floor(scaled) - 0.5) < TIE;
  }

  private static String exactScientific(double value, int digits) {
    BigDecimal rounded = BigDecimal.valueOf(value).round(new MathContext(digits));
    int exponent = rounded.precision() - rounded.scale() - 1;
    String mantissa = trimmed(rounded.movePointLeft(exponent).doubleValue(), digits - 1);
    return mantissa + " × " + powerOfTen(exponent);
  }

  /** Ten to a power, such as {@code 10²¹}. */
  public static String powerOfTen(int exponent) {
    return "10" + superscript(exponent);
  }

  private static String superscript(int number) {
    StringBuilder text = new StringBuilder();
    for (char c : Integer.toString(number).toCharArray()) {
      text.append(c == '-' ? '⁻' : "⁰¹²³⁴⁵⁶⁷⁸⁹".charAt(c - '0'));
    }
    return text.toString();
  }

  /** A current density with its unit. */
  public static String ma(double maPerCm2) {
    return withUnit(fixed(maPerCm2, 2), MA);
  }

  /** A current density with one standard error, where it has one, and its unit. */
  public static String ma(double maPerCm2, @Nullable Double standardError) {
    return withUnit(fixed(maPerCm2, 2) + plusMinus(standardError), MA);
  }

  /** Such as {@code " ± 0.02"}; empty without an error. Small errors get a third decimal. */
  public static String plusMinus(@Nullable Double standardError) {
    if (standardError == null || !(standardError > 0)) {
      return "";
    }
    String value = standardError < 0.02 ? standardError(standardError) : fixed(standardError, 2);
    return NBSP + "±" + NBSP + value;
  }

  /** A change of a current density with its unit. */
  public static String maChange(double maPerCm2) {
    return withUnit(signed(maPerCm2, 2), MA);
  }

  /** A standard error to three decimals; empty where there is none. */
  public static String standardError(@Nullable Double maPerCm2) {
    if (maPerCm2 == null) {
      return "";
    }
    return maPerCm2 < 5e-4 ? "<0.001" : fixed(maPerCm2, 3);
  }

  /** A thickness with its unit, in µm from 10 µm, in mm from 1 mm. */
  public static String thickness(double nm) {
    if (nm >= MILLIMETRE_FROM_NM) {
      return trimmed(nm / 1e6, 2) + NBSP + "mm";
    }
    return nm >= MICROMETRE_FROM_NM
        ? trimmed(nm / 1000, 2) + NBSP + "µm"
        : trimmed(nm, 1) + NBSP + "nm";
  }

  /** A value in its unit, as precise as the unit is deposited or graded. */
  public static String quantity(double value, String unit) {
    return switch (unit) {
      case "nm" -> thickness(value);
      case "eV" -> withUnit(fixed(value, 3), unit);
      case "deg", "°" -> trimmed(value, 1) + "°";
      case MA -> ma(value);
      case "%" -> withUnit(fixed(value, 2), unit);
      case "" -> fraction(value);
      default -> withUnit(significant(value, 4), unit);
    };
  }

  /** A number without a unit, as exact as a fraction can be made. */
  private static String fraction(double value) {
    return Math.abs(value) < 0.01 ? significant(value, 3) : trimmed(value, 3);
  }

  /** The bare number of {@link #quantity}, for a column that names the unit. */
  public static String bare(double value, String unit) {
    return switch (unit) {
      case "nm" -> trimmed(value, 1);
      case "eV" -> fixed(value, 3);
      case "%", MA -> fixed(value, 2);
      case "" -> fraction(value);
      default -> significant(value, 4);
    };
  }

  /** A range of bare numbers, kept on one line. */
  public static String range(double low, double high, String unit) {
    return bare(low, unit) + NBSP + "to" + NBSP + bare(high, unit);
  }

  /** A change of a value in its unit. */
  public static String change(double value, String unit) {
    return switch (unit) {
      case "nm" -> (value > 0 ? "+" : "") + withUnit(trimmed(value, 1), unit);
      case "eV" -> withUnit(signed(value, 3), unit);
      case "%", MA -> withUnit(signed(value, 2), unit);
      default -> (value > 0 ? "+" : "") + withUnit(significant(value, 4), unit);
    };
  }

  /** A number text and its unit, kept on one line. */
  public static String withUnit(String number, String unit) {
    return unit.isEmpty() ? number : number + NBSP + unit.replace(" ", NBSP);
  }

  /** A count with its noun, plural by adding s. */
  public static String count(int number, String noun) {
    return number + " " + noun + (number == 1 ? "" : "s");
  }
}
