package evensun.run;

import evensun.data.DecimalText;
import evensun.data.TableFormatException;
import evensun.light.Blackbody;
import evensun.light.ClearSky;
import evensun.light.Spectra;
import evensun.light.Spectrum;
import evensun.light.SpectrumReader;
import evensun.scenario.GridSpec;
import evensun.scenario.InputException;
import evensun.scenario.InputFiles;
import evensun.scenario.LightSpec;
import evensun.scenario.Place;
import evensun.scenario.Scenario;

/** The light of a scenario: built in, modelled, or a table of its own, scaled when it says so. */
public final class ScenarioLight {

  private ScenarioLight() {}

  static Spectrum spectrum(Scenario scenario, InputFiles files) {
    LightSpec light = scenario.light();
    Spectrum spectrum = spectrum(light, files);
    if (light.sky().isPresent() || light.table().isPresent()) {
      requireGrid(spectrum, scenario.grid(), light.place());
    }
    return spectrum;
  }

  /**
   * A light as described.
   *
   * @throws InputException when there is no such light
   */
  public static Spectrum spectrum(LightSpec light, InputFiles files) {
    Spectrum spectrum = unscaled(light, files);
    if (light.irradianceWPerM2().isPresent()) {
      double wanted = light.irradianceWPerM2().getAsDouble();
      return spectrum.times(
          wanted / spectrum.totalWPerM2(), "scaled to " + shown(wanted) + " W m⁻²");
    }
    return light.concentrationSuns().isPresent()
        ? spectrum.times(
            light.concentrationSuns().getAsDouble(),
            "concentrated " + shown(light.concentrationSuns().getAsDouble()) + " times")
        : spectrum;
  }

  private static Spectrum unscaled(LightSpec light, InputFiles files) {
    if (light.table().isPresent()) {
      return table(light, files);
    }
    if (light.sky().isPresent()) {
      return ClearSky.of(light.sky().get());
    }
    if (light.temperatureK().isPresent()) {
      return Blackbody.at(light.temperatureK().getAsDouble())
          .times(Blackbody.SUN_DILUTION, "as far away as the sun");
    }
    return Spectra.find(light.spectrum())
        .orElseThrow(
            () ->
                new InputException(
                    light.place(),
                    "spectrum must be one of %s, clear-sky, blackbody, or {table: FILE}, but was \"%s\""
                        .formatted(String.join(", ", Spectra.names()), light.spectrum())));
  }

  private static Spectrum table(LightSpec light, InputFiles files) {
    String path = light.table().orElseThrow();
    try {
      return SpectrumReader.read(path, files.text(path, light.place()), light.quantity());
    } catch (TableFormatException e) {
      throw new InputException(new Place(path, e.line(), 1, ""), e.getMessage());
    }
  }

  private static void requireGrid(Spectrum spectrum, GridSpec grid, Place place) {
    if (spectrum.fromNm() > grid.fromNm() || spectrum.toNm() < grid.toNm()) {
      throw new InputException(
          place,
          "the spectrum covers %s to %s nm but the grid runs from %s to %s nm; shorten the grid"
              .formatted(
                  shown(spectrum.fromNm()),
                  shown(spectrum.toNm()),
                  shown(grid.fromNm()),
                  shown(grid.toNm())));
    }
    if (grid.toNm() > grid.fromNm()
        && spectrum.photonCurrentMaPerCm2(grid.fromNm(), grid.toNm()) <= 0) {
      throw new InputException(
          place,
          "the spectrum holds no light between %s and %s nm"
              .formatted(shown(grid.fromNm()), shown(grid.toNm())));
    }
  }

  private static String shown(double value) {
    return DecimalText.of(value, 7);
  }
}
