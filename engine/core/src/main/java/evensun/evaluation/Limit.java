package evensun.evaluation;

import evensun.stack.ResolvedStack;
import evensun.stack.ResolvedSubcell;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.stream.IntStream;

/**
 * A limit on a quantity of a design.
 *
 * @param text as people read it
 * @param quantity what is limited
 * @param of indices of subcells, or of layers for a thickness
 * @param bound the limit, in the unit of the quantity
 * @param upper whether it is an upper limit
 */
public record Limit(String text, Quantity quantity, List<Integer> of, double bound, boolean upper) {

  /** What can be limited. */
  public enum Quantity {
    /** Largest minus smallest current of all subcells, in mA cm⁻². */
    MISMATCH("mismatchMaPerCm2", "mA cm⁻²"),
    /** The current that is nearest to breaking the limit, in mA cm⁻². */
    PHOTOCURRENT("photocurrentMaPerCm2", "mA cm⁻²"),
    /** Sum of thicknesses, in nm. */
    THICKNESS("thicknessNm", "nm"),
    /** The gap that is nearest to breaking the limit, in eV. */
    BANDGAP("bandgapEv", "eV");

    private final String key;
    private final String unit;

    Quantity(String key, String unit) {
      this.key = key;
      this.unit = unit;
    }

    static Quantity of(String key) {
      for (Quantity quantity : values()) {
        if (quantity.key.equals(key)) {
          return quantity;
        }
      }
      throw new IllegalArgumentException("no such quantity: " + key);
    }
  }

  public Limit {
    of = List.copyOf(of);
  }

  /**
   * A limit on a quantity of a stack.
   *
   * @param key name of the quantity in scenarios
   * @param names subcells, or layers of a thickness; empty for all
   */
  public static Limit of(
      String key, List<String> names, double bound, boolean upper, ResolvedStack stack) {
    Quantity quantity = Quantity.of(key);
    List<String> known =
        quantity == Quantity.THICKNESS
            ? stack.layers().stream().map(layer -> layer.name()).toList()
            : stack.subcells().stream().map(ResolvedSubcell::name).toList();
    List<Integer> indices = new ArrayList<>();
    (names.isEmpty() ? known : names).forEach(name -> indices.add(known.indexOf(name)));
    return new Limit(text(quantity, names, bound, upper), quantity, indices, bound, upper);
  }

  private static String text(Quantity quantity, List<String> names, double bound, boolean upper) {
    String of = names.isEmpty() ? "" : " of " + String.join(", ", names);
    String number = bound == Math.rint(bound) ? String.valueOf((long) bound) : "" + bound;
    return String.format(
        Locale.ROOT, "%s%s %s %s %s", quantity.key, of, upper ? "≤" : "≥", number, quantity.unit);
  }

  /**
   * Value of the quantity.
   *
   * @param thicknessNm [layer]
   * @param photocurrentMaPerCm2 [subcell]
   * @param bandgapEv [subcell]
   */
  public double value(double[] thicknessNm, double[] photocurrentMaPerCm2, double[] bandgapEv) {
    return switch (quantity) {
      case MISMATCH -> largest(photocurrentMaPerCm2) - smallest(photocurrentMaPerCm2);
      case PHOTOCURRENT -> upper ? largest(photocurrentMaPerCm2) : smallest(photocurrentMaPerCm2);
      case BANDGAP -> upper ? largest(bandgapEv) : smallest(bandgapEv);
      case THICKNESS -> of.stream().mapToDouble(i -> thicknessNm[i]).sum();
    };
  }

  private double largest(double[] row) {
    return indices().mapToDouble(i -> row[i]).max().orElseThrow();
  }

  private double smallest(double[] row) {
    return indices().mapToDouble(i -> row[i]).min().orElseThrow();
  }

  private IntStream indices() {
    return of.stream().mapToInt(i -> i);
  }

  /** How far a value is from the limit, as a fraction of the limit; negative when it is broken. */
  public double slack(double value) {
    double scale = Math.max(1e-6, Math.abs(bound));
    return (upper ? bound - value : value - bound) / scale;
  }
}
