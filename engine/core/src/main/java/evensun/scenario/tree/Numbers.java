package evensun.scenario.tree;

import evensun.scenario.tree.Node.Scalar;
import java.util.Locale;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** Reads numbers and says what is wrong with those that are none. */
public final class Numbers {

  private static final String PLAIN = "[+-]?(?:\\d+\\.?\\d*|\\.\\d+)(?:[eE][+-]?\\d+)?";
  private static final Pattern NUMBER = Pattern.compile(PLAIN);
  private static final Pattern COMMA = Pattern.compile("[+-]?\\d+,\\d+");
  private static final Pattern WITH_UNIT = Pattern.compile("(" + PLAIN + ")\\s*(\\p{L}+|%|°|Å)");
  private static final Pattern NOT_FINITE =
      Pattern.compile("[+-]?\\.?(nan|inf|infinity)", Pattern.CASE_INSENSITIVE);
  private static final Map<String, Double> LENGTHS_NM =
      Map.of("µm", 1e3, "um", 1e3, "μm", 1e3, "mm", 1e6, "Å", 0.1, "m", 1e9, "cm", 1e7);

  private static final double HC_OVER_Q_EV_NM = 1239.841984;

  private Numbers() {}

  /** The number that a plain text stands for, or empty; infinite where it is too large. */
  public static OptionalDouble parse(String text) {
    return NUMBER.matcher(text).matches()
        ? OptionalDouble.of(Double.parseDouble(text))
        : OptionalDouble.empty();
  }

  /** Why a value is no number inside an interval, as the end of a sentence; empty when it is. */
  static String complaint(Node node, Interval in) {
    if (!(node instanceof Scalar scalar)) {
      return "must be a number in " + in + " but was " + node.described();
    }
    if (scalar.isNothing()) {
      return "has no value; it must be a number in " + in;
    }
    OptionalDouble number = parse(scalar.text());
    if (scalar.quoted() && number.isPresent()) {
      return "must be a number but was the text " + scalar.described() + "; remove the quotes";
    }
    if (number.isEmpty()) {
      return noNumber(scalar, in);
    }
    double value = number.getAsDouble();
    return in.contains(value)
        ? ""
        : "must be in " + in + " but was " + Shown.plain(scalar.text()) + otherUnit(value, in);
  }

  /** Says so when the number would fit in the unit that people use beside the wanted one. */
  private static String otherUnit(double value, Interval in) {
    if ("nm".equals(in.unit()) && value > 0 && value < in.low() && in.contains(value * 1000)) {
      return "; in micrometres? write " + Shown.number(roundOff(value * 1000));
    }
    if ("eV".equals(in.unit()) && in.contains(HC_OVER_Q_EV_NM / value)) {
      String ev = String.format(Locale.ROOT, "%.3f", HC_OVER_Q_EV_NM / value);
      return "; as a wavelength in nm? write " + ev;
    }
    return "";
  }

  private static String noNumber(Scalar scalar, Interval in) {
    String text = scalar.text().strip();
    if (COMMA.matcher(text).matches()) {
      return "must be a number with a decimal point but was "
          + Shown.plain(text)
          + "; write "
          + Shown.plain(text.replace(',', '.'));
    }
    if (NOT_FINITE.matcher(text).matches()) {
      return "must be a number in " + in + " but was " + Shown.plain(text);
    }
    String minus = text.replace('\u2212', '-').replace('\u2013', '-');
    if (!minus.equals(text) && parse(minus).isPresent()) {
      return "has a typographic minus sign; write " + Shown.plain(minus);
    }
    Matcher unit = WITH_UNIT.matcher(text);
    if (unit.matches()) {
      return "must be a number without a unit but was "
          + scalar.described()
          + "; write "
          + converted(unit.group(1), unit.group(2), in.unit());
    }
    return "must be a number in " + in + " but was " + scalar.described();
  }

  private static String converted(String number, String from, String to) {
    Double factor = LENGTHS_NM.get(from);
    if ("nm".equals(to) && factor != null) {
      return Shown.number(roundOff(Double.parseDouble(number) * factor)) + " (nm)";
    }
    boolean same = to.isEmpty() || to.toLowerCase(Locale.ROOT).startsWith(sameAs(from));
    return same ? number : "the value in " + to;
  }

  private static String sameAs(String unit) {
    return "°".equals(unit) ? "deg" : unit.toLowerCase(Locale.ROOT);
  }

  /** Takes away the last digits, which conversion leaves as noise. */
  private static double roundOff(double value) {
    return Double.parseDouble(String.format(Locale.ROOT, "%.9g", value));
  }
}
