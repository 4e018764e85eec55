package evensun.evaluation;

import evensun.search.problem.Variable;
import java.util.List;
import org.jspecify.annotations.Nullable;

/**
 * The parts of an aim with their derivatives by what varies: the currents where their smallest is
 * wanted, else the aim itself. The solver differentiates its sums by thicknesses; what an aim makes
 * of the sums, and what gaps and fractions do, is differentiated by differences. Belongs to one
 * thread.
 */
final class Derivatives {

  /** Step of the differences by bandgap in eV, and by fractions. */
  private static final double STEP = 1e-4;

  /** Step of the differences by currents and sums, relative to them. */
  private static final double RELATIVE_STEP = 1e-4;

  private final Aim aim;
  private final Bench bench;
  private final List<Parameter> parameters;
  private final List<Variable> variables;
  private final List<Tie> ties;
  private final Reading reading;
  private final double[] byThickness;
  private final double[][] bySum;
  private final double[] upper;
  private final double[] lower;

  private Derivatives(
      Aim aim, Bench bench, List<Parameter> parameters, List<Variable> variables, int parts) {
    this.aim = aim;
    this.bench = bench;
    this.parameters = parameters;
    this.variables = variables;
    ties = Tie.of(bench.model().stack());
    reading = new Reading(bench);
    byThickness = new double[bench.sumCount() * layers()];
    bySum = new double[parts][bench.sumCount()];
    upper = new double[parts];
    lower = new double[parts];
  }

  /** Null where the solver offers no derivatives or the aim has no use for them. */
  static @Nullable Derivatives of(
      Aim aim, Bench bench, List<Parameter> parameters, List<Variable> variables) {
    if (!bench.hasGradient() || !(aim.isSmallestCurrent() || aim.isSmooth())) {
      return null;
    }
    int subcells = bench.model().stack().subcells().size();
    int parts = aim.isSmallestCurrent() ? subcells : 1;
    return new Derivatives(aim, bench, parameters, variables, parts);
  }

  int partCount() {
    return bySum.length;
  }

  private int layers() {
    return bench.model().problem().layerCount();
  }

  /**
   * Parts and derivatives of the present design of the bench.
   *
   * @param values [v] the design
   * @param parts [part] in the unit of the aim
   * @param gradient [part][v]
   */
  void take(double[] values, double[] parts, double[][] gradient) {
    reading.take(byThickness);
    parts(parts);
    bySums();
    for (int v = 0; v < values.length; v++) {
      if (parameters.get(v).kind() == Parameter.Kind.THICKNESS) {
        byThickness(v, gradient);
      } else {
        byDifference(values[v], v, gradient);
      }
    }
  }

  private void parts(double[] into) {
    if (aim.isSmallestCurrent()) {
      System.arraycopy(reading.photocurrentMaPerCm2(), 0, into, 0, into.length);
    } else {
      into[0] = aim.value(reading);
    }
  }

  /** Fills {@link #bySum} by central differences. */
  private void bySums() {
    for (int i = 0; i < reading.sums().length; i++) {
      double here = reading.sums()[i];
      double step = RELATIVE_STEP * Math.abs(here);
      reading.set(i, here + step);
      parts(upper);
      reading.set(i, here - step);
      parts(lower);
      reading.set(i, here);
      for (int p = 0; p < bySum.length; p++) {
        bySum[p][i] = step > 0 ? (upper[p] - lower[p]) / (2 * step) : 0;
      }
    }
  }

  private void byThickness(int v, double[][] gradient) {
    for (int p = 0; p < bySum.length; p++) {
      gradient[p][v] = byLayer(p, parameters.get(v).index());
      for (Tie tie : ties) {
        if (tie.leader().key().equals(parameters.get(v).key())) {
          gradient[p][v] += tie.ratio() * byLayer(p, tie.follower().index());
        }
      }
    }
  }

  private double byLayer(int part, int layer) {
    double sum = 0;
    for (int i = 0; i < bySum[part].length; i++) {
      sum += bySum[part][i] * byThickness[i * layers() + layer];
    }
    return sum;
  }

  /** Central difference, one-sided at a bound. */
  private void byDifference(double value, int v, double[][] gradient) {
    Variable variable = variables.get(v);
    double up = Math.min(value + STEP, variable.high());
    double down = Math.max(value - STEP, variable.low());
    bench.set(parameters.get(v), up);
    reading.take();
    parts(upper);
    bench.set(parameters.get(v), down);
    reading.take();
    parts(lower);
    bench.set(parameters.get(v), value);
    for (int p = 0; p < bySum.length; p++) {
      gradient[p][v] = up > down ? (upper[p] - lower[p]) / (up - down) : 0;
    }
  }
}
