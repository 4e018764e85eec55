package evensun.search;

/**
 * How far a search is.
 *
 * @param phase what it does: {@code search}, {@code refine} or {@code proof}
 * @param round from 0
 * @param generation generations so far over all rounds
 * @param evaluations evaluations so far
 * @param best best first aim so far, minus infinity before the first
 * @param elapsedSeconds time since the search or its continuation began
 * @param leftSeconds estimate of the time left, at most; NaN while unknown
 */
public record Progress(
    String phase,
    int round,
    int generation,
    int evaluations,
    double best,
    double elapsedSeconds,
    double leftSeconds) {}
