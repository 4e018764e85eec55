package evensun.result;

/**
 * A hazard or limit that applies.
 *
 * @param about material or process
 * @param text one or two sentences
 */
public record Caution(String about, String text) {}
