/** Tables of n and k: reading, interpolation, bandgap, cleaning, examination. */
@NullMarked
package evensun.material.table;

import org.jspecify.annotations.NullMarked;
