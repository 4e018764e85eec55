package evensun.cli;

import evensun.scenario.InputException;
import evensun.scenario.Place;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** Numbers for junctions on the command line: one for all, or {@code NAME=VALUE} for some. */
final class JunctionValues {

  private final String option;
  private final List<String> names;

  JunctionValues(String option, List<String> names) {
    this.option = option;
    this.names = names;
  }

  /**
   * Reads values.
   *
   * @param texts as written; commas part several
   * @param allowOneForAll whether a plain number stands for every junction
   * @return by name of the junction; only those that were given
   */
  Map<String, Double> read(List<String> texts, boolean allowOneForAll) {
    Map<String, Double> values = new LinkedHashMap<>();
    for (String text : texts) {
      for (String part : text.split(",", -1)) {
        one(part.strip(), allowOneForAll, values);
      }
    }
    return values;
  }

  private void one(String part, boolean allowOneForAll, Map<String, Double> values) {
    int equals = part.indexOf('=');
    if (equals < 0 && allowOneForAll) {
      double value = number(part, part);
      names.forEach(name -> values.put(name, value));
      return;
    }
    String name = equals < 0 ? part : part.substring(0, equals).strip();
    if (equals < 0 || !names.contains(name)) {
      throw wrong(
          "must be %s=VALUE with a junction of %s but was \"%s\""
              .formatted(names.get(names.size() - 1), String.join(", ", names), part));
    }
    double value = number(part.substring(equals + 1).strip(), part);
    if (values.put(name, value) != null && !allowOneForAll) {
      throw wrong("names " + name + " twice; keep one");
    }
  }

  private double number(String text, String part) {
    try {
      return Double.parseDouble(text);
    } catch (NumberFormatException e) {
      throw wrong("must be a number with a decimal point but was \"" + part + "\"");
    }
  }

  private InputException wrong(String message) {
    return new InputException(Place.option(option), message);
  }
}
