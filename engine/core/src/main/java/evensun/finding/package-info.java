/** What findings mean to a reader. The texts are resources, one file for each code. */
@NullMarked
package evensun.finding;

import org.jspecify.annotations.NullMarked;
