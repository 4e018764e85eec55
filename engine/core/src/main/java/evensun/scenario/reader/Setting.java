package evensun.scenario.reader;

import evensun.scenario.InputException;
import evensun.scenario.Place;

/**
 * A value of a scenario that is replaced before it is checked.
 *
 * @param key such as {@code perovskite.thicknessNm}, {@code grid.stepNm} or {@code
 *     solver.options.kernel}
 * @param value as it would be written in the scenario
 * @param place where the replacement stands
 */
public record Setting(String key, String value, Place place) {

  /**
   * A replacement from the command line.
   *
   * @param option name of the option, such as {@code --set}
   * @param text {@code KEY=VALUE}
   * @throws InputException when there is no key or no equals sign
   */
  public static Setting parse(String option, String text) {
    int equals = text.indexOf('=');
    if (equals <= 0) {
      throw new InputException(
          Place.option(option),
          "must be KEY=VALUE, such as perovskite.thicknessNm=500, but was \"" + text + "\"");
    }
    String key = text.substring(0, equals).strip();
    return new Setting(
        key, text.substring(equals + 1).strip(), new Place(option + " " + key, 0, 0, key));
  }
}
