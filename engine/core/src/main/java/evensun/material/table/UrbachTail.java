package evensun.material.table;

import evensun.light.Constants;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * Replaces what an instrument shows below a bandgap: its floor is taken off (fading out over 0.15
 * eV above the gap), and from where ln α then rises more slowly than an Urbach tail, the tail takes
 * its place.
 */
public final class UrbachTail {

  /** Urbach energy of lead-halide perovskites in eV, common practice. */
  public static final double DEFAULT_EV = 0.015;

  private static final double FADE_EV = 0.15;
  private static final double FLOOR_BELOW_EV = 0.10;

  private UrbachTail() {}

  /**
   * A cleaned table.
   *
   * @param table the table, with points added where the tail bends
   * @param floor extinction coefficient of the floor that was taken off
   * @param joinEv where the tail begins, in eV
   */
  public record Cleaned(OpticalTable table, double floor, double joinEv) {}

  /**
   * Cleans a table.
   *
   * @param table a table
   * @param urbachEv Urbach energy in eV, greater than 0
   * @return empty when the table has no bandgap as {@link Bandgap} defines it
   */
  public static Optional<Cleaned> clean(OpticalTable table, double urbachEv) {
    OptionalDouble gap = Bandgap.of(table);
    if (gap.isEmpty()) {
      return Optional.empty();
    }
    double gapEv = gap.getAsDouble();
    double lowEv = Constants.HC_EV_NM / table.toNm();
    double floor =
        lowEv < gapEv - 0.06
            ? table.kAt(Constants.HC_EV_NM / Math.max(lowEv, gapEv - FLOOR_BELOW_EV))
            : 0;
    OpticalTable lowered = lowered(table, floor, gapEv);
    double joinEv = join(lowered, gapEv, urbachEv);
    return Optional.of(new Cleaned(withTail(lowered, joinEv, urbachEv), floor, joinEv));
  }

  private static OpticalTable lowered(OpticalTable table, double floor, double gapEv) {
    double[] nm = table.wavelengthNm();
    double[] k = table.k();
    for (int i = 0; i < nm.length; i++) {
      double x = Math.min(Math.max((gapEv + FADE_EV - Constants.HC_EV_NM / nm[i]) / FADE_EV, 0), 1);
      k[i] = Math.max(0, k[i] - floor * x * x * (3 - 2 * x));
    }
    return OpticalTable.of(nm, table.n(), k);
  }

  private static double join(OpticalTable table, double gapEv, double urbachEv) {
    for (double ev = gapEv - 0.004; ev > gapEv - 0.3; ev -= 0.001) {
      double below = table.alphaPerCmAt(Constants.HC_EV_NM / (ev - 0.005));
      double above = table.alphaPerCmAt(Constants.HC_EV_NM / (ev + 0.005));
      if (below <= 0 || Math.log(above / below) / 0.01 > 1 / urbachEv) {
        return ev;
      }
    }
    return gapEv - 0.004;
  }

  private static OpticalTable withTail(OpticalTable table, double joinEv, double urbachEv) {
    double joinNm = Constants.HC_EV_NM / joinEv;
    double alphaPerCm = table.alphaPerCmAt(joinNm);
    java.util.TreeSet<Double> nodes = new java.util.TreeSet<>();
    for (double nm : table.wavelengthNm()) {
      nodes.add(nm);
    }
    for (int i = 0; i <= 60; i++) {
      double nm = Constants.HC_EV_NM / (joinEv - i * urbachEv / 3);
      if (nm > table.fromNm() && nm < table.toNm()) {
        nodes.add(nm);
      }
    }
    double[] nm = nodes.stream().mapToDouble(Double::doubleValue).toArray();
    double[] n = new double[nm.length];
    double[] k = new double[nm.length];
    for (int i = 0; i < nm.length; i++) {
      n[i] = table.nAt(nm[i]);
      double tail = alphaPerCm * Math.exp((Constants.HC_EV_NM / nm[i] - joinEv) / urbachEv);
      k[i] = nm[i] <= joinNm ? table.kAt(nm[i]) : tail * nm[i] / (4e7 * Math.PI);
    }
    return OpticalTable.of(nm, n, k);
  }
}
