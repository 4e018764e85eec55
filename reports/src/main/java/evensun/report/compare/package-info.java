/** Several results side by side, differences first. */
@NullMarked
package evensun.report.compare;

import org.jspecify.annotations.NullMarked;
