package evensun.spi;

/**
 * Something a user should know about a result.
 *
 * @param code stable name in kebab-case, explained by {@code evensun explain CODE}
 * @param severity how much it matters
 * @param where what it is about: a layer, a material, a wavelength range
 * @param message one sentence with values and units, and what to do where there is something to do
 */
public record Finding(String code, Severity severity, String where, String message) {}
