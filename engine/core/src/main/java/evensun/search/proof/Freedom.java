package evensun.search.proof;

/**
 * How much freedom a found value leaves.
 *
 * @param key key of the variable
 * @param found value found
 * @param low lower end of the range that is equally good when all other variables are chosen anew
 * @param high upper end of that range
 * @param lowIsBound whether the range ends at the lower bound of the variable, not by the loss
 * @param highIsBound the same for the upper bound
 * @param bound {@code low} or {@code high} when the found value stands on that bound, else empty
 * @param gainPerUnit what moving that bound outward by one unit of the variable would add to the
 *     first aim, from how the best value changes near the bound; 0 where no bound is active
 */
public record Freedom(
    String key,
    double found,
    double low,
    double high,
    boolean lowIsBound,
    boolean highIsBound,
    String bound,
    double gainPerUnit) {}
