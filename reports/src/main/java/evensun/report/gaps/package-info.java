/** The page of a bandgap map: a figure of contours and the numbers in words. */
@NullMarked
package evensun.report.gaps;

import org.jspecify.annotations.NullMarked;
