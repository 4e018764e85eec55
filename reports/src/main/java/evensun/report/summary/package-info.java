/** The closing summary: the decision in a few lines, as text and as Markdown. */
@NullMarked
package evensun.report.summary;

import org.jspecify.annotations.NullMarked;
