package evensun.evaluation;

import evensun.search.problem.Objective;
import evensun.search.problem.Variable;
import evensun.search.problem.Verdict;
import evensun.spi.EvaluationFailed;
import java.util.List;
import java.util.stream.Stream;
import org.jspecify.annotations.Nullable;

/** A stack as the search sees it: numbers in, the aims out. */
public final class StackObjective implements Objective {

  /** Matched currents closer than this do not decide a bandgap, in mA cm⁻². */
  public static final double GAP_TIE_MA_PER_CM2 = 0.02;

  private final Model model;
  private final List<Parameter> parameters;
  private final List<Variable> variables;
  private final List<Aim> aims;
  private final List<Limit> limits;

  /** An objective without limits. */
  public StackObjective(
      Model model, List<Parameter> parameters, List<Variable> variables, Aim aim) {
    this(model, parameters, variables, List.of(aim), List.of());
  }

  /**
   * An objective.
   *
   * @param model the stack
   * @param parameters what may vary
   * @param variables their bounds, in the same order
   * @param aims what is wanted, the first of them first
   * @param limits what every design must keep
   */
  public StackObjective(
      Model model,
      List<Parameter> parameters,
      List<Variable> variables,
      List<Aim> aims,
      List<Limit> limits) {
    this.limits = List.copyOf(limits);
    this.model = model;
    this.parameters = List.copyOf(parameters);
    this.variables = List.copyOf(variables);
    this.aims = List.copyOf(aims);
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
    return aims.stream().map(Aim::name).toList();
  }

  @Override
  public List<String> limits() {
    return limits.stream().map(Limit::text).toList();
  }

  @Override
  public double tieResolution() {
    return isSmallestCurrent() && aims.size() == 1 && variesGap() ? GAP_TIE_MA_PER_CM2 : 0;
  }

  private boolean isSmallestCurrent() {
    return aims.get(0).isSmallestCurrent();
  }

  @Override
  public Worker newWorker() {
    return new StackWorker();
  }

  private Bench newBench() {
    return model.newBench(
        Stream.concat(
                aims.stream().flatMap(a -> a.lightSums().stream()),
                limits.stream().flatMap(l -> l.lightSums().stream()))
            .toList());
  }

  private final class StackWorker implements Worker {

    private final Bench bench = newBench();
    private final Reading reading = new Reading(bench);
    private final List<Aim> own = aims.stream().map(Aim::forAnotherThread).toList();
    private final List<Limit> kept = limits.stream().map(Limit::forAnotherThread).toList();
    private final @Nullable Derivatives derivatives =
        Derivatives.of(own.get(0), bench, parameters, variables);

    @Override
    public Verdict judge(double[] design) {
      try {
        set(design);
        reading.take();
        List<Double> values = own.stream().map(a -> a.value(reading)).toList();
        return values.stream().allMatch(Double::isFinite)
            ? Verdict.under(slacks(), values, tieBreak())
            : Verdict.failed("the solver returned a current that is no number");
      } catch (EvaluationFailed e) {
        return Verdict.failed(String.valueOf(e.getMessage()));
      }
    }

    private List<Double> slacks() {
      return kept.stream().map(limit -> limit.slack(limit.value(reading))).toList();
    }

    private void set(double[] values) {
      for (int i = 0; i < values.length; i++) {
        bench.set(parameters.get(i), values[i]);
      }
    }

    private double tieBreak() {
      double sum = 0;
      for (double gap : reading.bandgapEv()) {
        sum += gap;
      }
      return sum;
    }

    @Override
    public int partCount() {
      return derivatives == null ? 0 : derivatives.partCount();
    }

    @Override
    public boolean parts(double[] values, double[] parts, double[][] gradient) {
      if (derivatives == null) {
        return false;
      }
      try {
        set(values);
        derivatives.take(values, parts, gradient);
        return true;
      } catch (EvaluationFailed e) {
        return false;
      }
    }

    @Override
    public void close() {
      bench.close();
    }
  }
}
