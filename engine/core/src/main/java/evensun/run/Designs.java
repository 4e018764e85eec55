package evensun.run;

import evensun.search.problem.Candidate;
import evensun.search.problem.Variable;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.function.Function;

/**
 * What the values of a candidate mean to people: numbers by key, and which alternative of each
 * choice. What a design does not have, such as the thickness of a layer left out, is not told.
 *
 * @param variables what was searched, numbers and choices
 * @param present keys that mean something in a design
 */
record Designs(List<Variable> variables, Function<Candidate, Set<String>> present) {

  Designs {
    variables = List.copyOf(variables);
  }

  /** Whether a variable means something in a design. */
  boolean has(Candidate candidate, int variable) {
    return present.apply(candidate).contains(variables.get(variable).key());
  }

  /** The numbers of a design by key. */
  Map<String, Double> values(Candidate candidate) {
    Map<String, Double> values = new LinkedHashMap<>();
    Set<String> keys = present.apply(candidate);
    for (int v = 0; v < variables.size(); v++) {
      Variable variable = variables.get(v);
      if (!variable.isChoice() && keys.contains(variable.key())) {
        values.put(variable.key(), candidate.values().get(v));
      }
    }
    return values;
  }

  /** The alternatives of a design by the key of their choice. */
  Map<String, String> choices(Candidate candidate) {
    Map<String, String> choices = new LinkedHashMap<>();
    Set<String> keys = present.apply(candidate);
    for (int v = 0; v < variables.size(); v++) {
      Variable variable = variables.get(v);
      if (variable.isChoice() && keys.contains(variable.key())) {
        choices.put(variable.key(), name(variable, candidate.values().get(v)));
      }
    }
    return choices;
  }

  /** The alternatives as drawn. */
  Map<String, String> drawnChoices() {
    Map<String, String> choices = new LinkedHashMap<>();
    variables.stream()
        .filter(Variable::isChoice)
        .forEach(v -> choices.put(v.key(), name(v, v.drawn())));
    return choices;
  }

  /** The alternative that a value stands for. */
  static String name(Variable choice, double value) {
    return choice.choices().get((int) Math.round(value));
  }
}
