/** The cli package. */
@NullMarked
package evensun.cli;

import org.jspecify.annotations.NullMarked;
