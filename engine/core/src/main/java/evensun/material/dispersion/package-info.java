/** Dispersion models: terms of a dielectric function, each a published formula. */
@NullMarked
package evensun.material.dispersion;

import org.jspecify.annotations.NullMarked;
