package evensun.cli;

import evensun.scenario.InputException;
import evensun.scenario.Place;
import evensun.scenario.Scenario;
import evensun.scenario.Source;
import evensun.scenario.reader.ScenarioReader;
import evensun.scenario.reader.Setting;
import evensun.scenario.reader.Sources;
import java.io.InputStream;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.util.List;

/** Reads the scenario that a command names: a file, or standard input for {@code -}. */
final class ScenarioInput {

  private static final String STANDARD_INPUT = "<standard input>";

  private ScenarioInput() {}

  static Scenario read(String argument, List<String> settings, InputStream in) {
    List<Setting> parsed = settings.stream().map(text -> Setting.parse("--set", text)).toList();
    return ScenarioReader.read(source(argument, in), parsed);
  }

  static Source source(String argument, InputStream in) {
    if (argument.equals("-")) {
      return Sources.open(STANDARD_INPUT, Path.of("").toAbsolutePath(), in);
    }
    if (argument.isBlank()) {
      throw new InputException(
          Place.of("SCENARIO"), "names no file; write a scenario's file, or - for standard input");
    }
    try {
      return ScenarioReader.source(Path.of(argument));
    } catch (InvalidPathException e) {
      throw new InputException(Place.of("SCENARIO"), "is not the name of a file: " + e.getReason());
    }
  }

  /** Name for a run's folder: the scenario's file name without its ending. */
  static String runName(Scenario scenario) {
    if (scenario.source().name().startsWith("<")) {
      return "scenario";
    }
    String name = Path.of(scenario.source().name()).getFileName().toString();
    return name.replaceFirst("\\.(ya?ml|json)$", "");
  }
}
