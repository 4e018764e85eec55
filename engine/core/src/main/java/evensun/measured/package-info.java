/** Measured curves of a device, to be laid over what was predicted. Nothing is fitted. */
@NullMarked
package evensun.measured;

import org.jspecify.annotations.NullMarked;
