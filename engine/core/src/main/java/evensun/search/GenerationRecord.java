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
 * @param frontGain by how much the front of a search for several aims got ahead, in parts of its
 *     range; 0 for a single aim
 */
public record GenerationRecord(
    int generation,
    int round,
    int evaluations,
    double best,
    double roundBest,
    double mean,
    double frontGain) {}
