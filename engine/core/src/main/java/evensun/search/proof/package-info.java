/** Looks at a found design: how free its values are, what steps cost, whether a grid beats it. */
@NullMarked
package evensun.search.proof;

import org.jspecify.annotations.NullMarked;
