package evensun.report.text;

import java.util.Locale;

/** Keys of varied quantities, such as {@code perovskite.thicknessNm}, in words. */
public final class Keys {

  private Keys() {}

  /** The layer, or {@code layer/component}, a key belongs to; the whole key if it has no dot. */
  public static String layer(String key) {
    int dot = key.lastIndexOf('.');
    return dot < 0 ? key : key.substring(0, dot).replaceFirst("\\.mixture$", "");
  }

  /** What of the layer varies: {@code thickness}, {@code bandgap}, and so on. */
  public static String property(String key) {
    String name = key.substring(key.lastIndexOf('.') + 1);
    String bare = name.replaceFirst("(Nm|Ev|Deg|K|Percent|MaPerCm2)$", "");
    return bare.equals("present") ? "presence" : spaced(bare.isEmpty() ? name : bare);
  }

  /** Layer and property: {@code perovskite thickness}. */
  public static String words(String key) {
    return key.indexOf('.') < 0 ? property(key) : layer(key) + " " + property(key);
  }

  /** The unit in which a key's name ends, as in results; empty for a fraction. */
  public static String unit(String key) {
    if (isThickness(key)) {
      return "nm";
    }
    if (isBandgap(key)) {
      return "eV";
    }
    return key.endsWith("AngleDeg") ? "°" : "";
  }

  /** Whether a key names a thickness. */
  public static boolean isThickness(String key) {
    return key.endsWith(".thicknessNm");
  }

  /** Whether a key names a bandgap. */
  public static boolean isBandgap(String key) {
    return key.endsWith(".bandgapEv");
  }

  /** An aim in words: its name, or the quantity and what it is of. */
  public static String aim(String aim) {
    boolean quantity = aim.indexOf('.') >= 0 || aim.indexOf('-') < 0;
    return quantity ? words(aim) : aim.replace('-', ' ');
  }

  private static String spaced(String camelCase) {
    return camelCase.replaceAll("([a-z])([A-Z])", "$1 $2").toLowerCase(Locale.ROOT);
  }
}
