package evensun.spi;

import java.util.List;
import java.util.Map;

/**
 * What stays fixed during a search: the light, the order of the layers, what is asked.
 *
 * @param wavelengthNm [w] vacuum wavelengths in nm, strictly increasing, positive
 * @param incidentMaPerCm2 [w] photon current of the light in the bin of each wavelength, mA cm⁻²,
 *     at least 0; a share A of it that is absorbed is a photocurrent of A times this value
 * @param layers the L finite layers, the light from the front meets layer 0 first
 * @param incidentMaterial index of the medium the light comes from, in [0, M); it does not absorb
 * @param exitMaterial index of the medium behind the last layer, in [0, M); it may absorb
 * @param materialCount M, the number of rows of {@link Design#n} and {@link Design#k}
 * @param knobCount K, the length of {@link Design#knob}
 * @param incidences the I directions and polarisations asked for; weighted sums belong to the first
 * @param seed for whatever a solver draws at random
 * @param wantedErrorMaPerCm2 standard error wanted of a weighted sum by a statistical solver, in mA
 *     cm⁻², greater than 0
 * @param options the scenario's {@code solver.options} for this solver, as text
 */
public record Problem(
    Samples wavelengthNm,
    Samples incidentMaPerCm2,
    List<Layer> layers,
    int incidentMaterial,
    int exitMaterial,
    int materialCount,
    int knobCount,
    List<Incidence> incidences,
    long seed,
    double wantedErrorMaPerCm2,
    Map<String, String> options) {

  /**
   * Checks the shape.
   *
   * @throws IllegalArgumentException naming the component, the rule and the value
   */
  public Problem {
    layers = List.copyOf(layers);
    incidences = List.copyOf(incidences);
    options = Map.copyOf(options);
    require(wavelengthNm.size() > 0, "wavelengthNm must hold at least one wavelength");
    require(
        wavelengthNm.size() == incidentMaPerCm2.size(),
        "incidentMaPerCm2 must have one value per wavelength");
    require(!incidences.isEmpty(), "incidences must hold at least one incidence");
    require(
        incidentMaterial >= 0 && incidentMaterial < materialCount,
        "incidentMaterial must be in [0, " + materialCount + ") but was " + incidentMaterial);
    require(
        exitMaterial >= 0 && exitMaterial < materialCount,
        "exitMaterial must be in [0, " + materialCount + ") but was " + exitMaterial);
    require(knobCount >= 0, "knobCount must be at least 0 but was " + knobCount);
    require(
        wantedErrorMaPerCm2 > 0,
        "wantedErrorMaPerCm2 must be greater than 0 but was " + wantedErrorMaPerCm2);
    double last = 0;
    for (int w = 0; w < wavelengthNm.size(); w++) {
      require(
          wavelengthNm.at(w) > last,
          "wavelengthNm must be positive and increasing but was "
              + wavelengthNm.at(w)
              + " at index "
              + w);
      last = wavelengthNm.at(w);
    }
  }

  private static void require(boolean condition, String message) {
    if (!condition) {
      throw new IllegalArgumentException(message);
    }
  }

  /** W. */
  public int wavelengthCount() {
    return wavelengthNm.size();
  }

  /** L. */
  public int layerCount() {
    return layers.size();
  }

  /** This problem for other incidences, as a table of a coating wants. */
  public Problem withIncidences(List<Incidence> others) {
    return new Problem(
        wavelengthNm,
        incidentMaPerCm2,
        layers,
        incidentMaterial,
        exitMaterial,
        materialCount,
        knobCount,
        others,
        seed,
        wantedErrorMaPerCm2,
        options);
  }

  /**
   * This problem with other layers and media, as a solver that simplifies a stack hands on.
   *
   * @param otherLayers the layers of the simpler stack
   * @param incident index of its incident medium, in [0, materials)
   * @param exit index of its exit medium, in [0, materials)
   * @param materials number of its materials
   */
  public Problem withStack(List<Layer> otherLayers, int incident, int exit, int materials) {
    return new Problem(
        wavelengthNm,
        incidentMaPerCm2,
        otherLayers,
        incident,
        exit,
        materials,
        knobCount,
        incidences,
        seed,
        wantedErrorMaPerCm2,
        options);
  }

  /** This problem with other options, for a solver that hands on to another. */
  public Problem withOptions(Map<String, String> others) {
    return new Problem(
        wavelengthNm,
        incidentMaPerCm2,
        layers,
        incidentMaterial,
        exitMaterial,
        materialCount,
        knobCount,
        incidences,
        seed,
        wantedErrorMaPerCm2,
        others);
  }
}
