package evensun.cli;

import evensun.material.table.TableHints;
import evensun.material.table.TableHints.Extinction;
import evensun.material.table.TableHints.WavelengthUnit;
import evensun.scenario.InputException;
import evensun.scenario.Place;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.Optional;
import java.util.function.Function;
import picocli.CommandLine.Option;

/** What a person says about the form of a table, with the words of the scenario. */
final class TableForm {

  @Option(
      names = "--extinction-table",
      paramLabel = "FILE",
      description = "A second file with k or the absorption coefficient, for --check.")
  Path extinctionTable;

  @Option(
      names = "--wavelength-unit",
      paramLabel = "nm|um|eV",
      description = "Unit of the first column, for --check, where the file does not say it.")
  String wavelengthUnit;

  @Option(
      names = "--extinction",
      paramLabel = "k|alpha-per-cm|alpha-per-m|alpha-per-um",
      description = "What stands beside n, for --check, where the file does not say it.")
  String extinction;

  TableHints hints() {
    return new TableHints(
        choice("--wavelength-unit", wavelengthUnit, WavelengthUnit.values(), WavelengthUnit::key),
        choice("--extinction", extinction, Extinction.values(), Extinction::key));
  }

  private static <T> Optional<T> choice(
      String option, String text, T[] values, Function<T, String> key) {
    if (text == null) {
      return Optional.empty();
    }
    return Optional.of(
        Arrays.stream(values)
            .filter(value -> key.apply(value).equals(text))
            .findFirst()
            .orElseThrow(
                () ->
                    new InputException(
                        Place.option(option),
                        "must be one of "
                            + String.join(", ", Arrays.stream(values).map(key).toList())
                            + " but was "
                            + text)));
  }
}
