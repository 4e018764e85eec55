/** The electrical side: diodes, connections, power, detailed balance. */
@NullMarked
package evensun.device;

import org.jspecify.annotations.NullMarked;
