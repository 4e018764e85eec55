/** The report package. */
@NullMarked
package evensun.report;

import org.jspecify.annotations.NullMarked;
