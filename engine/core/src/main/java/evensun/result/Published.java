package evensun.result;

/**
 * A published value beside the one this program computes.
 *
 * @param what what it is
 * @param unit its unit, empty for a pure number
 * @param published the published value
 * @param computed the computed value
 * @param tolerance how far they may differ
 * @param source where it is published
 * @param agrees whether they do agree
 */
public record Published(
    String what,
    String unit,
    double published,
    double computed,
    double tolerance,
    String source,
    boolean agrees) {}
