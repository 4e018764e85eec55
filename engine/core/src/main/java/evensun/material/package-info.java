/** Optical constants: the built-in library, tables of the user's own, dispersion models, checks. */
@NullMarked
package evensun.material;

import org.jspecify.annotations.NullMarked;
