package evensun.search;

/**
 * One generation.
 *
 * @param generation from 1, over all rounds
 * @param round from 0
 * @param evaluations evaluations so far
 * @param best best first aim so far among designs that keep all limits, minus infinity before the
 *     first
 * @param roundBest the same within the round
 * @param mean mean first aim of the designs of the generation that could be evaluated, NaN for none
 */
public record GenerationRecord(
    int generation, int round, int evaluations, double best, double roundBest, double mean) {}
