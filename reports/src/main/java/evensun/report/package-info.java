/** What others call: a run's results in, an HTML page or a closing summary out. */
@NullMarked
package evensun.report;

import org.jspecify.annotations.NullMarked;
