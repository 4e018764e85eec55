package evensun.evaluation;

import evensun.result.Sensitivity;
import evensun.result.WhatIf;
import evensun.search.problem.Variable;
import evensun.spi.EvaluationFailed;
import evensun.stack.ResolvedSubcell;
import java.util.ArrayList;
import java.util.Collections;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.jspecify.annotations.Nullable;

/** What happens around a design when one quantity moves and the others stay. */
public final class Neighbourhood implements AutoCloseable {

  private static final int CURVE_POINTS = 41;
  private static final double THICKNESS_STEP_NM = 1;
  private static final double GAP_STEP_EV = 0.01;
  private static final double KNOB_STEP = 0.01;
  private static final double THICKNESS_TOLERANCE = 0.05;

  private final Bench bench;
  private final Reading reading;
  private final List<Parameter> parameters;
  private final List<Variable> variables;
  private final double[] centre;
  private final Aim aim;
  private final @Nullable Aim efficiency;
  private final List<ResolvedSubcell> subcells;
  private final Map<String, String> failures = new LinkedHashMap<>();

  /**
   * The surroundings of a design.
   *
   * @param model the stack
   * @param parameters what varies
   * @param variables its bounds, in the same order
   * @param centre [parameter] the design
   * @param aim what is wanted
   * @param efficiency efficiency, where the device has one
   */
  public Neighbourhood(
      Model model,
      List<Parameter> parameters,
      List<Variable> variables,
      double[] centre,
      Aim aim,
      @Nullable Aim efficiency) {
    this.bench = model.newBench(lightSums(aim, efficiency));
    this.reading = new Reading(bench);
    this.parameters = List.copyOf(parameters);
    this.variables = List.copyOf(variables);
    this.centre = centre.clone();
    this.aim = aim;
    this.efficiency = efficiency;
    this.subcells = model.stack().subcells();
  }

  private static List<LightSum> lightSums(Aim aim, @Nullable Aim efficiency) {
    List<LightSum> sums = new ArrayList<>(aim.lightSums());
    if (efficiency != null) {
      sums.addAll(efficiency.lightSums());
    }
    return sums;
  }

  /**
   * What a small change of each quantity does, the largest effect first; without those that lead to
   * a design which cannot be evaluated.
   */
  public List<Sensitivity> sensitivities() {
    Point here = at(0, centre[0]);
    List<Sensitivity> all = new ArrayList<>();
    for (int v = 0; v < parameters.size(); v++) {
      try {
        all.add(sensitivity(v, here));
      } catch (EvaluationFailed e) {
        failures.putIfAbsent(parameters.get(v).key(), e.getMessage());
      }
    }
    all.sort(Comparator.comparingDouble(s -> aim.shown(s.toleranceAimChange())));
    return all;
  }

  /** Why designs around this one could not be evaluated so far, by the key of what was moved. */
  public Map<String, String> failures() {
    return Collections.unmodifiableMap(failures);
  }

  /**
   * The aim and the currents against each quantity between its bounds, where they can be evaluated.
   */
  public List<WhatIf> curves() {
    List<WhatIf> curves = new ArrayList<>();
    for (int v = 0; v < parameters.size(); v++) {
      WhatIf curve = curve(v);
      if (curve.value().size() > 1) {
        curves.add(curve);
      }
    }
    return curves;
  }

  private Sensitivity sensitivity(int v, Point here) {
    Parameter parameter = parameters.get(v);
    double step = step(parameter);
    Point up = at(v, centre[v] + step);
    Point down = at(v, Math.max(0, centre[v] - step));
    double tolerance = tolerance(parameter, centre[v]);
    double worse =
        Math.min(
            at(v, centre[v] + tolerance).aim(), at(v, Math.max(0, centre[v] - tolerance)).aim());
    Map<String, Double> currents = new LinkedHashMap<>();
    for (int s = 0; s < subcells.size(); s++) {
      currents.put(subcells.get(s).name(), up.currents()[s] - here.currents()[s]);
    }
    return new Sensitivity(
        parameter.key(),
        parameter.unit(),
        step,
        aim.shown(up.aim() - here.aim()),
        aim.shown(down.aim() - here.aim()),
        currents,
        efficiency == null ? null : up.efficiency() - here.efficiency(),
        tolerance,
        aim.shown(worse - here.aim()));
  }

  private static double step(Parameter parameter) {
    return switch (parameter.kind()) {
      case THICKNESS -> THICKNESS_STEP_NM;
      case BANDGAP -> GAP_STEP_EV;
      case COMPOSITION, KNOB -> KNOB_STEP;
    };
  }

  private static double tolerance(Parameter parameter, double value) {
    return parameter.kind() == Parameter.Kind.THICKNESS
        ? THICKNESS_TOLERANCE * value
        : step(parameter);
  }

  private WhatIf curve(int v) {
    Variable variable = variables.get(v);
    List<Double> values = new ArrayList<>();
    List<Double> aims = new ArrayList<>();
    Map<String, List<Double>> currents = new LinkedHashMap<>();
    subcells.forEach(subcell -> currents.put(subcell.name(), new ArrayList<>()));
    for (int i = 0; i < CURVE_POINTS; i++) {
      double value = variable.low() + (variable.high() - variable.low()) * i / (CURVE_POINTS - 1);
      Point point;
      try {
        point = at(v, value);
      } catch (EvaluationFailed e) {
        failures.putIfAbsent(variable.key(), e.getMessage());
        continue;
      }
      values.add(value);
      aims.add(aim.shown(point.aim()));
      for (int s = 0; s < subcells.size(); s++) {
        currents.get(subcells.get(s).name()).add(point.currents()[s]);
      }
    }
    return new WhatIf(variable.key(), variable.unit(), values, aims, currents);
  }

  private Point at(int moved, double value) {
    for (int v = 0; v < centre.length; v++) {
      bench.set(parameters.get(v), v == moved ? clamp(v, value) : centre[v]);
    }
    reading.take();
    double percent = efficiency == null ? 0 : efficiency.value(reading);
    return new Point(aim.value(reading), percent, reading.photocurrentMaPerCm2().clone());
  }

  /** A bandgap cannot leave the range of its material, a knob not its own. */
  private double clamp(int v, double value) {
    Parameter parameter = parameters.get(v);
    if (parameter.kind() == Parameter.Kind.THICKNESS) {
      return value;
    }
    if (parameter.setsGap()) {
      var stack = bench.model().stack();
      double inside = Math.min(parameter.materialHigh(stack), value);
      return Math.max(parameter.materialLow(stack), inside);
    }
    return Math.max(variables.get(v).low(), Math.min(variables.get(v).high(), value));
  }

  @Override
  public void close() {
    bench.close();
  }

  @SuppressWarnings("ArrayRecordComponent") // never leaves this class
  private record Point(double aim, double efficiency, double[] currents) {}
}
