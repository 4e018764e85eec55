/** The genetic algorithm: one generation after the other, for one aim or for several. */
@NullMarked
package evensun.search.population;

import org.jspecify.annotations.NullMarked;
