/** The stack with its materials resolved: what a scenario means physically. */
@NullMarked
package evensun.stack;

import org.jspecify.annotations.NullMarked;
