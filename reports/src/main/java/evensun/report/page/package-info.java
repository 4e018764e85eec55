/** The page as data: sections whose headings state what was found. Templates only lay it out. */
@NullMarked
package evensun.report.page;

import org.jspecify.annotations.NullMarked;
