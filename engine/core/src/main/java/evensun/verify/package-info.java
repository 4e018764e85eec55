/** Published values against values computed on this machine, for {@code evensun verify}. */
@NullMarked
package evensun.verify;

import org.jspecify.annotations.NullMarked;
