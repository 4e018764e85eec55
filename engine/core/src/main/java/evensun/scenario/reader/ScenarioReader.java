package evensun.scenario.reader;

import evensun.scenario.Scenario;
import evensun.scenario.Source;
import java.nio.file.Path;
import java.util.List;

/** Reads scenarios. All methods are safe for threads. */
public final class ScenarioReader {

  private ScenarioReader() {}

  /**
   * Reads a scenario file.
   *
   * @param file the file; messages name it as given here
   * @throws evensun.scenario.InputException with everything that is wrong with it
   */
  public static Scenario read(Path file) {
    return read(Sources.open(file));
  }

  /**
   * The text of a scenario file, unread.
   *
   * @throws evensun.scenario.InputException when the file cannot be read
   */
  public static Source source(Path file) {
    return Sources.open(file);
  }

  /**
   * Reads a scenario that is in memory already.
   *
   * @throws evensun.scenario.InputException with everything that is wrong with it
   */
  public static Scenario read(Source source) {
    return read(source, List.of());
  }

  /**
   * Reads a scenario with some of its values replaced; they are checked like written ones.
   *
   * @param settings replacements, applied in this order
   * @throws evensun.scenario.InputException with everything that is wrong with it
   */
  public static Scenario read(Source source, List<Setting> settings) {
    return open(source).bind(settings);
  }

  /**
   * Parses a scenario once, to be bound many times with different settings.
   *
   * @throws evensun.scenario.InputException when the syntax is broken
   */
  public static Draft open(Source source) {
    return Draft.of(source);
  }
}
