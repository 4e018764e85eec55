package evensun.spi;

/**
 * A number worth reporting.
 *
 * @param key stable name in camelCase, ending in the unit where it has one
 * @param label as shown to people
 * @param value the number
 * @param unit as shown to people; empty for a pure number
 */
public record Quantity(String key, String label, double value, String unit) {}
