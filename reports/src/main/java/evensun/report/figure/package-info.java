/** Drawings as plain shapes: geometry is worked out here, colours come from the style sheet. */
@NullMarked
package evensun.report.figure;

import org.jspecify.annotations.NullMarked;
