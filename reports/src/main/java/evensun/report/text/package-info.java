/** How numbers, keys and names are spelled for people, independent of the locale. */
@NullMarked
package evensun.report.text;

import org.jspecify.annotations.NullMarked;
