package evensun.scenario;

import evensun.light.SkyConditions;
import evensun.light.SpectrumReader;
import evensun.spi.Incidence;
import evensun.spi.Polarisation;
import evensun.spi.Side;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * The light as the scenario describes it.
 *
 * @param spectrum name of a built-in spectrum, {@code clear-sky} or {@code blackbody}; empty when a
 *     table is given
 * @param table path of a spectrum table relative to the scenario, if given
 * @param quantity what the table's second column is, where the scenario says so
 * @param sky the sky of {@code clear-sky}
 * @param temperatureK the temperature of {@code blackbody} in K
 * @param irradianceWPerM2 irradiance the spectrum is scaled to as a whole, in W m⁻²
 * @param concentrationSuns factor the spectrum is scaled by
 * @param angleDeg angle of incidence to the normal in the incident medium, degrees, in [0, 90)
 * @param polarisation polarisation
 * @param diffuse whether light comes from every direction of the half space alike (Lambertian)
 * @param place where it stands
 */
public record LightSpec(
    String spectrum,
    Optional<String> table,
    Optional<SpectrumReader.Quantity> quantity,
    Optional<SkyConditions> sky,
    OptionalDouble temperatureK,
    OptionalDouble irradianceWPerM2,
    OptionalDouble concentrationSuns,
    double angleDeg,
    Polarisation polarisation,
    boolean diffuse,
    Place place) {

  /** Spectrum name of the clear-sky model. */
  public static final String CLEAR_SKY = "clear-sky";

  /** Spectrum name of thermal radiation. */
  public static final String BLACKBODY = "blackbody";

  /** A spectrum by name or table, as it is. */
  public LightSpec(
      String spectrum,
      Optional<String> table,
      double angleDeg,
      Polarisation polarisation,
      Place place) {
    this(
        spectrum,
        table,
        Optional.empty(),
        Optional.empty(),
        OptionalDouble.empty(),
        OptionalDouble.empty(),
        OptionalDouble.empty(),
        angleDeg,
        polarisation,
        false,
        place);
  }

  /** Where the light comes from, as solvers see it. */
  public Incidence incidence() {
    return new Incidence(angleDeg, polarisation, Side.FRONT, diffuse);
  }
}
