package evensun.evaluation;

import evensun.search.problem.Objective;
import evensun.search.problem.Variable;
import evensun.search.problem.Verdict;
import evensun.spi.EvaluationFailed;
import java.util.List;

/** A stack as the search sees it: numbers in, the aim out. */
public final class StackObjective implements Objective {

  /** Matched currents closer than this do not decide a bandgap, in mA cm⁻². */
  public static final double GAP_TIE_MA_PER_CM2 = 0.02;

  /** Step of the differences by bandgap in eV, and by fractions. */
  private static final double DIFFERENCE_STEP = 1e-4;

  private final Model model;
  private final List<Parameter> parameters;
  private final List<Variable> variables;
  private final Aim aim;
  private final List<Limit> limits;
  private final List<Tie> ties;

  /** An objective without limits. */
  public StackObjective(
      Model model, List<Parameter> parameters, List<Variable> variables, Aim aim) {
    this(model, parameters, variables, aim, List.of());
  }

  /**
   * An objective.
   *
   * @param model the stack
   * @param parameters what may vary
   * @param variables their bounds, in the same order
   * @param aim what is wanted
   * @param limits what every design must keep
   */
  public StackObjective(
      Model model,
      List<Parameter> parameters,
      List<Variable> variables,
      Aim aim,
      List<Limit> limits) {
    this.limits = List.copyOf(limits);
    this.ties = Tie.of(model.stack());
    this.model = model;
    this.parameters = List.copyOf(parameters);
    this.variables = List.copyOf(variables);
    this.aim = aim;
  }

  /** Whether a bandgap varies. */
  public boolean variesGap() {
    return parameters.stream().anyMatch(Parameter::setsGap);
  }

  @Override
  public List<Variable> variables() {
    return variables;
  }

  @Override
  public List<String> aims() {
    return List.of(aim.name());
  }

  @Override
  public List<String> limits() {
    return limits.stream().map(Limit::text).toList();
  }

  @Override
  public double tieResolution() {
    return aim.isSmallestCurrent() && variesGap() ? GAP_TIE_MA_PER_CM2 : 0;
  }

  @Override
  public Worker newWorker() {
    return new StackWorker();
  }

  private final class StackWorker implements Worker {

    private final Bench bench = model.newBench();
    private final Aim own = aim.forAnotherThread();
    private final int subcells = model.stack().subcells().size();
    private final double[] currents = new double[subcells];
    private final double[] shifted = new double[subcells];
    private final double[] gaps = new double[subcells];
    private final double[] byThickness = new double[subcells * model.problem().layerCount()];

    @Override
    public Verdict judge(double[] values) {
      try {
        set(values);
        bench.currents(currents);
        bench.subcellGaps(gaps);
        double value = own.value(currents, gaps);
        return Double.isFinite(value)
            ? Verdict.under(slacks(), List.of(value), tieBreak())
            : Verdict.failed("the solver returned a current that is no number");
      } catch (EvaluationFailed e) {
        return Verdict.failed(String.valueOf(e.getMessage()));
      }
    }

    private List<Double> slacks() {
      if (limits.isEmpty()) {
        return List.of();
      }
      double[] thicknessNm = bench.design().thicknessNm;
      return limits.stream().map(l -> l.slack(l.value(thicknessNm, currents, gaps))).toList();
    }

    private void set(double[] values) {
      for (int i = 0; i < values.length; i++) {
        bench.set(parameters.get(i), values[i]);
      }
    }

    private double tieBreak() {
      double sum = 0;
      for (double gap : gaps) {
        sum += gap;
      }
      return sum;
    }

    @Override
    public int partCount() {
      return aim.isSmallestCurrent() && bench.hasGradient() ? subcells : 0;
    }

    @Override
    public boolean parts(double[] values, double[] parts, double[][] gradient) {
      if (partCount() == 0) {
        return false;
      }
      try {
        set(values);
        bench.currentsAndGradient(parts, byThickness);
        for (int v = 0; v < values.length; v++) {
          if (parameters.get(v).kind() == Parameter.Kind.THICKNESS) {
            byThickness(v, gradient);
          } else {
            byDifference(values, v, gradient);
          }
        }
        return true;
      } catch (EvaluationFailed e) {
        return false;
      }
    }

    private void byThickness(int v, double[][] gradient) {
      int layers = model.problem().layerCount();
      for (int s = 0; s < subcells; s++) {
        gradient[s][v] = byThickness[s * layers + parameters.get(v).index()];
        for (Tie tie : ties) {
          if (tie.leader().key().equals(parameters.get(v).key())) {
            gradient[s][v] += tie.ratio() * byThickness[s * layers + tie.follower().index()];
          }
        }
      }
    }

    /** Central difference, one-sided at a bound. */
    private void byDifference(double[] values, int v, double[][] gradient) {
      Variable variable = variables.get(v);
      double up = Math.min(values[v] + DIFFERENCE_STEP, variable.high());
      double down = Math.max(values[v] - DIFFERENCE_STEP, variable.low());
      bench.set(parameters.get(v), up);
      bench.currents(currents);
      bench.set(parameters.get(v), down);
      bench.currents(shifted);
      bench.set(parameters.get(v), values[v]);
      for (int s = 0; s < subcells; s++) {
        gradient[s][v] = up > down ? (currents[s] - shifted[s]) / (up - down) : 0;
      }
    }

    @Override
    public void close() {
      bench.close();
    }
  }
}
