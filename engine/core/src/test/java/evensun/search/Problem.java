package evensun.search;

import evensun.search.problem.Objective;
import evensun.search.problem.Variable;
import evensun.search.problem.Verdict;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.atomic.AtomicInteger;
import java.util.function.Function;

/** Objectives for tests, made of plain functions; counts its evaluations. */
public record Problem(
    List<Variable> variables,
    List<String> aims,
    List<String> limits,
    double tieResolution,
    Function<double[], Verdict> judge,
    AtomicInteger calls)
    implements Objective {

  /** A number made of numbers. */
  public interface Value {
    double at(double[] x);
  }

  public static Problem of(Value value, Variable... variables) {
    return judged(x -> Verdict.of(value.at(x), 0), variables);
  }

  public static Problem judged(Function<double[], Verdict> judge, Variable... variables) {
    return new Problem(
        List.of(variables), List.of("aim"), List.of(), 0, judge, new AtomicInteger());
  }

  public Problem withTieResolution(double resolution) {
    return new Problem(variables, aims, limits, resolution, judge, calls);
  }

  public Problem withLimits(String... names) {
    return new Problem(variables, aims, List.of(names), tieResolution, judge, calls);
  }

  public Problem withAims(String... names) {
    return new Problem(variables, List.of(names), limits, tieResolution, judge, calls);
  }

  public static Variable variable(String key, double low, double high) {
    return new Variable(key, "", low, high, 0, low);
  }

  public static Variable[] box(int count, double low, double high) {
    List<Variable> variables = new ArrayList<>();
    for (int i = 0; i < count; i++) {
      variables.add(variable("x" + i, low, high));
    }
    return variables.toArray(Variable[]::new);
  }

  @Override
  public Worker newWorker() {
    return values -> {
      calls.incrementAndGet();
      return judge.apply(values);
    };
  }
}
