package evensun.search.refine;

/**
 * Functions of a point in a box: the smallest of the first ones is to be made as large as possible
 * while the others stay at or above zero.
 */
public interface MaxMinModel {

  /** Number of coordinates. */
  int size();

  /** Number of functions whose smallest counts. */
  int wanted();

  /** Number of functions that must not be negative. */
  int kept();

  /**
   * The functions and their derivatives.
   *
   * @param point [coordinate] within the box
   * @param rows [function] out, those wanted first
   * @param gradient [function][coordinate] out
   * @return whether they could be computed
   */
  boolean at(double[] point, double[] rows, double[][] gradient);
}
