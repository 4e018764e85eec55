package evensun.run;

import evensun.light.Spectra;
import evensun.light.Spectrum;
import evensun.scenario.InputException;
import evensun.scenario.InputFiles;
import evensun.scenario.LightSpec;
import evensun.scenario.Scenario;

/** The light of a scenario: a built-in spectrum or a table of its own. */
final class ScenarioLight {

  private ScenarioLight() {}

  static Spectrum spectrum(Scenario scenario, InputFiles files) {
    LightSpec light = scenario.light();
    if (light.table().isPresent()) {
      return OwnTables.spectrum(light.table().get(), scenario.grid(), files, light.place());
    }
    return Spectra.find(light.spectrum())
        .orElseThrow(
            () ->
                new InputException(
                    light.place(),
                    "spectrum must be one of %s, or {table: FILE}, but was \"%s\""
                        .formatted(String.join(", ", Spectra.names()), light.spectrum())));
  }
}
