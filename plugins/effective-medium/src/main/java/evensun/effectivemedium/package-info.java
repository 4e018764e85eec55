/**
 * A solver that turns mixed, graded and rough layers into plain ones and hands the stack on to the
 * solver below it.
 *
 * <p>{@link evensun.effectivemedium.Plan} says which plain layers stand for which layer, once per
 * search; {@link evensun.effectivemedium.Fit} computes their optical constants and thicknesses for
 * one design; the chained evaluator hands the plain design on and books what comes back to the
 * channels of the layers as drawn.
 */
package evensun.effectivemedium;
