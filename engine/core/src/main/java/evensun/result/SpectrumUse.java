package evensun.result;

/**
 * The light as used.
 *
 * @param name name of the spectrum
 * @param source where its numbers come from
 * @param totalWPerM2 irradiance of the whole spectrum in W m⁻²
 * @param angleDeg angle of incidence in degrees
 * @param polarisation polarisation
 */
public record SpectrumUse(
    String name, String source, double totalWPerM2, double angleDeg, String polarisation) {}
