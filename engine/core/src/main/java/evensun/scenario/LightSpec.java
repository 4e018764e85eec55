package evensun.scenario;

import evensun.spi.Polarisation;
import java.util.Optional;

/**
 * The light as the scenario describes it.
 *
 * @param spectrum name of a built-in spectrum, empty when a table is given
 * @param table path of a spectrum table relative to the scenario, if given
 * @param angleDeg angle of incidence to the normal in the incident medium, degrees, in [0, 90)
 * @param polarisation polarisation
 * @param place where it stands
 */
public record LightSpec(
    String spectrum,
    Optional<String> table,
    double angleDeg,
    Polarisation polarisation,
    Place place) {}
