package evensun.run;

import evensun.light.Spectrum;
import evensun.material.Material;
import evensun.material.MaterialLibrary;
import evensun.scenario.InputException;
import evensun.scenario.InputFiles;
import evensun.scenario.MaterialSpec;
import evensun.scenario.Place;
import evensun.scenario.Scenario;
import evensun.stack.MaterialSource;
import java.util.LinkedHashMap;
import java.util.Map;

/** The materials of a scenario: its own first, then the library's. */
final class ScenarioMaterials implements MaterialSource {

  private final Scenario scenario;
  private final InputFiles files;
  private final Spectrum spectrum;
  private final Map<String, Material> own = new LinkedHashMap<>();

  ScenarioMaterials(Scenario scenario, InputFiles files, Spectrum spectrum) {
    this.spectrum = spectrum;
    this.scenario = scenario;
    this.files = files;
  }

  @Override
  public Material material(String name, Place place) {
    MaterialSpec spec = scenario.materials().get(name);
    if (spec != null) {
      return own.computeIfAbsent(
          name, n -> OwnTables.material(n, spec, files, spectrum, scenario.grid()));
    }
    MaterialLibrary library = MaterialLibrary.builtIn();
    return library
        .find(name)
        .orElseThrow(
            () ->
                new InputException(
                    place,
                    "material \"%s\" is neither in the scenario nor in the library; the nearest name is %s (evensun materials lists all)"
                        .formatted(name, library.nearest(name))));
  }
}
