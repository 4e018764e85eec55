package evensun.material.table;

import evensun.light.Constants;
import java.util.OptionalDouble;
import java.util.function.DoubleUnaryOperator;

/**
 * The bandgap of an absorber, one definition everywhere: the photon energy where the absorption
 * coefficient of the cleaned table rises steepest, at its edge.
 *
 * <p>The edge is where α passes 10⁴ cm⁻¹ for good (0.2 eV); the slope is taken over ±10 meV, its
 * maximum sought from 0.25 eV below to 0.12 eV above that point, so that the stronger rises at
 * higher critical points do not count. An edge without such a maximum (indirect, amorphous, or a
 * floor of absorption above 10⁴ cm⁻¹) has no gap in this sense.
 */
public final class Bandgap {

  private static final double STEP_EV = 0.001;
  private static final int HALF_WINDOW = 10;
  private static final double EDGE_PER_CM = 1e4;
  private static final int LASTING = 200;
  private static final int BELOW = 250;
  private static final int ABOVE = 120;

  private Bandgap() {}

  /** The bandgap of a table in eV, or empty when its edge has no steepest point. */
  public static OptionalDouble of(OpticalTable table) {
    if (table.size() < 3) {
      return OptionalDouble.empty();
    }
    return of(
        ev -> table.alphaPerCmAt(Constants.HC_EV_NM / ev),
        Constants.HC_EV_NM / table.toNm(),
        Constants.HC_EV_NM / table.fromNm());
  }

  /**
   * The bandgap of an absorption curve.
   *
   * @param alphaPerCm absorption coefficient in cm⁻¹ of the photon energy in eV
   * @param lowEv smallest energy it is known at, in eV
   * @param highEv largest energy it is known at, in eV
   * @return in eV, or empty when the edge has no steepest point
   */
  public static OptionalDouble of(DoubleUnaryOperator alphaPerCm, double lowEv, double highEv) {
    double[] alpha = new double[(int) ((highEv - lowEv) / STEP_EV) + 1];
    int edge = edge(alphaPerCm, lowEv, alpha);
    return edge < 0
        ? OptionalDouble.empty()
        : steepest(
            alpha,
            lowEv,
            Math.max(HALF_WINDOW, edge - BELOW),
            Math.min(alpha.length - HALF_WINDOW - 1, edge + ABOVE));
  }

  /** Where α passes the edge for good, or −1; fills α as far as this takes. */
  private static int edge(DoubleUnaryOperator alphaPerCm, double lowEv, double[] alpha) {
    int since = -1;
    for (int i = 0; i < alpha.length; i++) {
      alpha[i] = alphaPerCm.applyAsDouble(lowEv + i * STEP_EV);
      if (alpha[i] < EDGE_PER_CM) {
        since = -1;
      } else if (since < 0) {
        since = i;
      }
      boolean lasting = since >= 0 && (i - since >= LASTING - 1 || i == alpha.length - 1);
      if (lasting) {
        return since == 0 ? -1 : since;
      }
    }
    return -1;
  }

  private static OptionalDouble steepest(double[] alpha, double lowEv, int from, int to) {
    int best = from;
    for (int i = from; i <= to; i++) {
      if (slope(alpha, i) > slope(alpha, best)) {
        best = i;
      }
    }
    if (best <= from || best >= to) {
      return OptionalDouble.empty();
    }
    double left = slope(alpha, best - 1);
    double right = slope(alpha, best + 1);
    double curvature = left - 2 * slope(alpha, best) + right;
    double shift = curvature < 0 ? 0.5 * (left - right) / curvature : 0;
    return OptionalDouble.of(lowEv + (best + shift) * STEP_EV);
  }

  private static double slope(double[] alpha, int i) {
    return alpha[i + HALF_WINDOW] - alpha[i - HALF_WINDOW];
  }
}
