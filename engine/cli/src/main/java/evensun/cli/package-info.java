/** The command line: one class per command, and the only place that writes to standard streams. */
@NullMarked
package evensun.cli;

import org.jspecify.annotations.NullMarked;
