/** One evaluation: from a scenario and a solver to currents, losses and the records of a result. */
@NullMarked
package evensun.evaluation;

import org.jspecify.annotations.NullMarked;
