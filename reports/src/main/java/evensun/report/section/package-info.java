/**
 * What each section of the page says about a result: one class per section, absent where there is
 * no data.
 */
@NullMarked
package evensun.report.section;

import org.jspecify.annotations.NullMarked;
