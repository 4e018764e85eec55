/** Which bandgaps to aim at, before any optics. */
@NullMarked
package evensun.device.gaps;

import org.jspecify.annotations.NullMarked;
