package evensun.run;

import evensun.data.DecimalText;
import evensun.evaluation.Parameter;
import evensun.scenario.Fault;
import evensun.scenario.InputException;
import evensun.scenario.Place;
import evensun.scenario.SearchSpec;
import evensun.search.problem.Variable;
import evensun.stack.ResolvedStack;
import java.util.ArrayList;
import java.util.List;

/**
 * What a search moves: the parameters of the stack with their bounds, in the scenario's order.
 *
 * @param parameters what varies
 * @param variables bounds of each
 */
record Varied(List<Parameter> parameters, List<Variable> variables) {

  Varied {
    parameters = List.copyOf(parameters);
    variables = List.copyOf(variables);
  }

  /**
   * Finds the varied quantities of a search in a stack.
   *
   * @throws InputException with every key that names nothing and every bound out of range
   */
  static Varied of(SearchSpec search, ResolvedStack stack) {
    List<Parameter> parameters = new ArrayList<>();
    List<Variable> variables = new ArrayList<>();
    List<Fault> faults = new ArrayList<>();
    for (SearchSpec.VarySpec vary : search.ranges()) {
      Parameter parameter = Parameter.of(vary.key(), stack).orElse(null);
      if (parameter == null) {
        faults.add(new Fault(vary.place(), notVariable(vary.key(), stack)));
      } else {
        check(vary, parameter, stack, faults);
      }
      if (parameter != null && !vary.isTied()) {
        parameters.add(parameter);
        variables.add(
            new Variable(
                vary.key(),
                parameter.unit(),
                vary.low(),
                vary.high(),
                vary.step(),
                parameter.drawn()));
      }
    }
    if (!faults.isEmpty()) {
      throw new InputException(faults);
    }
    return new Varied(parameters, variables);
  }

  private static String notVariable(String key, ResolvedStack stack) {
    if (key.endsWith(".compositionFraction")) {
      return "\"%s\" cannot vary: the material of that layer has no composition to choose by (evensun materials NAME says which has)"
          .formatted(key);
    }
    if (key.endsWith(".bandgapEv")) {
      return "\"%s\" cannot vary: the material of that layer has no bandgap that can be chosen (evensun materials lists the tunable ones)"
          .formatted(key);
    }
    List<String> layers = stack.layers().stream().map(layer -> layer.name()).toList();
    return "\"%s\" names nothing that can vary; write LAYER.thicknessNm or LAYER.bandgapEv with one of the layers %s"
        .formatted(key, String.join(", ", layers));
  }

  private static void check(
      SearchSpec.VarySpec vary, Parameter parameter, ResolvedStack stack, List<Fault> faults) {
    if (parameter.setsGap()
        && (vary.low() < parameter.materialLow(stack)
            || vary.high() > parameter.materialHigh(stack))) {
      faults.add(
          new Fault(
              vary.place(),
              "\"%s\": the range must lie in %s, the range of the material, but was [%s, %s]%s"
                  .formatted(
                      vary.key(),
                      materialRange(parameter, stack),
                      vary.low(),
                      vary.high(),
                      unit(parameter))));
    }
  }

  /**
   * Checks one value of a bandgap or composition against the range of its material.
   *
   * @throws InputException when it lies outside
   */
  static void checkInTuning(Parameter parameter, double value, ResolvedStack stack, Place place) {
    if (parameter.setsGap()
        && !(value >= parameter.materialLow(stack) && value <= parameter.materialHigh(stack))) {
      throw new InputException(
          place,
          "%s must be in %s, the range of the material, but was %s%s"
              .formatted(parameter.key(), materialRange(parameter, stack), value, unit(parameter)));
    }
  }

  private static String materialRange(Parameter parameter, ResolvedStack stack) {
    return "["
        + DecimalText.of(parameter.materialLow(stack), 5)
        + ", "
        + DecimalText.of(parameter.materialHigh(stack), 5)
        + "]"
        + unit(parameter);
  }

  private static String unit(Parameter parameter) {
    return parameter.unit().isEmpty() ? "" : " " + parameter.unit();
  }

  /** The values as drawn, moved into the bounds. */
  double[] drawn() {
    return variables.stream()
        .mapToDouble(v -> Math.max(v.low(), Math.min(v.high(), v.drawn())))
        .toArray();
  }
}
