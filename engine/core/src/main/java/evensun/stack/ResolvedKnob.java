package evensun.stack;

import evensun.spi.Knob;

/**
 * A number of a feature that the scenario's search moves.
 *
 * @param key as in the scenario, such as {@code scaffold/absorber.fraction}
 * @param knob its place in a design, with its range
 * @param drawn value as drawn
 */
public record ResolvedKnob(String key, Knob knob, double drawn) {}
