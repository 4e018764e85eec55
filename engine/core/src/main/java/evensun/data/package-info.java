/** The project's own data files: a header of named facts and columns of numbers. */
@NullMarked
package evensun.data;

import org.jspecify.annotations.NullMarked;
