package evensun.scenario.reader;

import evensun.scenario.Fault;
import evensun.scenario.InputException;
import evensun.scenario.LightSpec;
import evensun.scenario.Place;
import evensun.scenario.Source;
import evensun.scenario.tree.Faults;
import evensun.scenario.tree.Fields;
import evensun.scenario.tree.Node.Mapping;
import evensun.scenario.tree.TreeReader;
import java.nio.file.Path;
import java.util.List;

/** Reads a light given by options, by the rules of the section {@code light} of a scenario. */
public final class LightReader {

  private LightReader() {}

  /**
   * The light of a named spectrum.
   *
   * @param option name of the option that holds the keys, such as {@code --light}
   * @param spectrum name of the spectrum
   * @param settings further keys of the section with their values
   * @throws InputException with everything that is wrong
   */
  public static LightSpec read(String option, String spectrum, List<Setting> settings) {
    StringBuilder text = new StringBuilder("light:\n  spectrum: " + spectrum + "\n");
    settings.forEach(s -> text.append("  " + s.key() + ": " + s.value() + "\n"));
    Faults faults = new Faults();
    try {
      var root = TreeReader.read(new Source(option, Path.of(""), text.toString()), faults);
      LightSpec light = LightBinder.bind(new Fields("", (Mapping) root, faults));
      faults.throwIfAny();
      return light;
    } catch (InputException e) {
      Place place = Place.option(option);
      throw new InputException(
          e.faults().stream().map(f -> new Fault(place, f.message())).toList());
    }
  }
}
