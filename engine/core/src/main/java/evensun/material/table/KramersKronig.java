package evensun.material.table;

import evensun.light.Constants;
import java.util.Optional;
import org.apache.commons.math3.linear.Array2DRowRealMatrix;
import org.apache.commons.math3.linear.ArrayRealVector;
import org.apache.commons.math3.linear.DecompositionSolver;
import org.apache.commons.math3.linear.QRDecomposition;

/**
 * Whether n and k of a table belong together: ε₁ must be 1 + (2/π) P∫ x ε₂(x)/(x² − E²) dx.
 *
 * <p>ε₂ inside the table is taken as straight between its points. What lies outside is unknown; its
 * share is smooth inside and is fitted by a constant, three poles above, one pole below the table
 * and free carriers; what then remains cannot be explained by absorption outside.
 */
public final class KramersKronig {

  private static final int SAMPLES = 160;

  /** Part of the range at each end, in energy, where the unknown outside hides everything. */
  private static final double MARGIN = 0.06;

  private KramersKronig() {}

  /**
   * What remains unexplained.
   *
   * @param rms root mean square in n
   * @param largest largest absolute value in n
   * @param atNm where it is largest, in nm
   */
  public record Residual(double rms, double largest, double atNm) {}

  /** The residual of a table, or empty when it has fewer than 12 points or spans too little. */
  public static Optional<Residual> of(OpticalTable table) {
    double lowEv = Constants.HC_EV_NM / table.toNm();
    double highEv = Constants.HC_EV_NM / table.fromNm();
    if (table.size() < 12 || highEv < 1.3 * lowEv) {
      return Optional.empty();
    }
    double[] node = new double[table.size() + 2];
    double[] loss = new double[node.length];
    points(table, node, loss);
    double margin = MARGIN * (highEv - lowEv);
    double[] at = new double[SAMPLES];
    double[] unexplained = new double[SAMPLES];
    for (int i = 0; i < SAMPLES; i++) {
      at[i] = lowEv + margin + (highEv - lowEv - 2 * margin) * (i + 0.5) / SAMPLES;
      double nm = Constants.HC_EV_NM / at[i];
      double n = table.nAt(nm);
      double k = table.kAt(nm);
      unexplained[i] = n * n - k * k - transform(node, loss, at[i]);
    }
    return Optional.of(residual(table, at, unexplained, lowEv, highEv));
  }

  /** ε₂ at rising energies, falling to 0 at half the lowest and twice the highest energy. */
  private static void points(OpticalTable table, double[] node, double[] loss) {
    double[] nm = table.wavelengthNm();
    double[] n = table.n();
    double[] k = table.k();
    int last = nm.length - 1;
    for (int i = 0; i <= last; i++) {
      node[i + 1] = Constants.HC_EV_NM / nm[last - i];
      loss[i + 1] = 2 * n[last - i] * k[last - i];
    }
    node[0] = 0.5 * node[1];
    node[last + 2] = 2 * node[last + 1];
  }

  /** 1 + (1/π) P∫ ε₂(x) [1/(x − E) + 1/(x + E)] dx for straight pieces, in closed form. */
  static double transform(double[] node, double[] loss, double ev) {
    double sum = 0;
    for (int i = 0; i + 1 < node.length; i++) {
      double a = node[i];
      double b = node[i + 1];
      double slope = (loss[i + 1] - loss[i]) / (b - a);
      sum += 2 * slope * (b - a);
      sum += (loss[i] + slope * (ev - a)) * log(b - ev, a - ev);
      sum += (loss[i] - slope * (ev + a)) * Math.log((b + ev) / (a + ev));
    }
    return 1 + sum / Math.PI;
  }

  private static double log(double upper, double lower) {
    return Math.log(Math.max(Math.abs(upper), 1e-12) / Math.max(Math.abs(lower), 1e-12));
  }

  private static Residual residual(
      OpticalTable table, double[] at, double[] unexplained, double lowEv, double highEv) {
    double[][] basis = new double[at.length][];
    for (int i = 0; i < at.length; i++) {
      double square = at[i] * at[i];
      basis[i] =
          new double[] {
            1,
            1 / (1.1 * highEv * highEv - square),
            1 / (2 * highEv * highEv - square),
            1 / (8 * highEv * highEv - square),
            1 / (square - 0.7 * lowEv * lowEv),
            1 / square
          };
    }
    Array2DRowRealMatrix matrix = new Array2DRowRealMatrix(basis, false);
    DecompositionSolver solver = new QRDecomposition(matrix, 1e-12).getSolver();
    if (!solver.isNonSingular()) {
      return new Residual(0, 0, table.fromNm());
    }
    double[] fitted =
        matrix.operate(solver.solve(new ArrayRealVector(unexplained, false))).toArray();
    double squares = 0;
    double largest = 0;
    double where = at[0];
    for (int i = 0; i < at.length; i++) {
      double nm = Constants.HC_EV_NM / at[i];
      double difference = inIndex(table, nm, unexplained[i] - fitted[i]);
      squares += difference * difference;
      if (Math.abs(difference) > largest) {
        largest = Math.abs(difference);
        where = at[i];
      }
    }
    return new Residual(Math.sqrt(squares / at.length), largest, Constants.HC_EV_NM / where);
  }

  /** What n would change by if ε₁ were explained. */
  private static double inIndex(OpticalTable table, double nm, double difference) {
    double n = table.nAt(nm);
    double k = table.kAt(nm);
    double real = n * n - k * k - difference;
    double imaginary = 2 * n * k;
    return n - Math.sqrt(0.5 * (Math.hypot(real, imaginary) + real));
  }
}
