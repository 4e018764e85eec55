/** The scenario file: reading it, checking it, and the records it becomes. No optics in here. */
@NullMarked
package evensun.scenario;

import org.jspecify.annotations.NullMarked;
